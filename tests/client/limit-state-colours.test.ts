import { describe, expect, it } from 'vitest';
import { darkColors, lightColors } from '../../src/plugins/tokens.ts';
import { contrast } from '../../src/styles/contrast.ts';
import { limitStateColours } from '../../src/styles/limit-states.ts';

const PARTS = ['weld', 'bolt', 'plate', 'member'] as const;
const states = PARTS.flatMap((part) => [1, 2, 3, 4, 5].map((number) => ({ id: `${part}-${number}`, part })));

describe('contrast', () => {
  it('agrees with the examples of WCAG 2.2: black on white is 21, #767676 on white passes 4.5', () => {
    expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 6);
    expect(contrast('#767676', '#ffffff')).toBeGreaterThanOrEqual(4.5);
    expect(contrast('#777777', '#ffffff')).toBeLessThan(4.5);
  });
});

describe.each([
  ['light', lightColors, false],
  ['dark', darkColors, true],
] as const)('limit state colours in the %s theme', (_name, theme, dark) => {
  const colours = limitStateColours(states, dark);

  it('stand out from the sheet by 3 : 1 and carry their code at 4.5 : 1', () => {
    for (const { fill, text } of colours.values()) {
      expect(contrast(fill, theme.surface)).toBeGreaterThanOrEqual(3);
      expect(contrast(fill, text)).toBeGreaterThanOrEqual(4.5);
    }
  });

  it('differ in lightness inside one part', () => {
    for (const part of PARTS) {
      const steps = [1, 2, 3, 4, 5].map((number) => colours.get(`${part}-${number}`)?.fill ?? '');
      expect(new Set(steps).size).toBe(5);
      steps.slice(1).forEach((fill, at) => expect(contrast(fill, steps[at] ?? '')).toBeGreaterThan(1.1));
    }
  });
});

describe.each([
  ['light', lightColors],
  ['dark', darkColors],
] as const)('words in the %s theme', (_name, theme) => {
  it('read at 4.5 : 1 on sheet and vellum', () => {
    for (const ground of [theme.surface, theme.background])
      for (const ink of [
        theme.quiet,
        theme.primary,
        theme.secondary,
        theme.success,
        theme.warning,
        theme.error,
      ])
        expect(contrast(ink, ground), `${ink} on ${ground}`).toBeGreaterThanOrEqual(4.5);
  });

  it('read at 4.5 : 1 on buttons', () => {
    expect(contrast(theme.primary, theme['on-primary'])).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme.error, theme['on-error'])).toBeGreaterThanOrEqual(4.5);
  });
});
