import { describe, expect, it } from 'vitest';
import { cellIndex, emptyCells, fillCells } from '../../src/components/results/cells.ts';
import { heatOf, heatScale } from '../../src/components/results/heat.ts';
import { cellText, readCell, spokenReading } from '../../src/components/results/reading.ts';
import { darkColors, lightColors } from '../../src/plugins/tokens.ts';
import { contrast, linearOf, luminanceOf } from '../../src/styles/contrast.ts';

/** CIE lightness L* of a luminance, CIE 15:2004. */
const lightness = (luminance: number) => 116 * Math.cbrt(luminance) - 16;
const steps = (dark: boolean) => heatScale(dark).map((hex) => lightness(luminanceOf(linearOf(hex))));

describe.each([
  ['light', false, lightColors['on-surface']],
  ['dark', true, darkColors['on-surface']],
] as const)('the heat map in the %s theme', (_, dark, ink) => {
  it('keeps 4.5 : 1 under its ink (WCAG 2.2, 1.4.3)', () => {
    for (const ground of heatScale(dark)) expect(contrast(ground, ink)).toBeGreaterThanOrEqual(4.5);
  });

  it('changes lightness in one direction by even steps, so that grey shows it too', () => {
    const all = steps(dark);
    const changes = all.slice(1).map((value, at) => value - (all[at] ?? 0));
    const mean = changes.reduce((sum, change) => sum + change, 0) / changes.length;
    for (const change of changes) expect(change / mean).toBeGreaterThan(0.5);
    for (const change of changes) expect(change / mean).toBeLessThan(1.6);
  });

  it('puts the ends of the revision at the ends of the scale', () => {
    const scale = heatScale(dark);
    expect(heatOf(100, 100, 300, dark)).toBe(scale[0]);
    expect(heatOf(300, 100, 300, dark)).toBe(scale.at(-1));
    expect(heatOf(7, 7, 7, dark)).toBe(scale[20]);
  });
});

describe('the cells of a revision', () => {
  const state = (id: string, code: string, title: string) => ({
    id,
    code,
    title,
    part: 'bolt',
    clause: '13.12.1.1',
  });
  const axes = {
    variants: 3,
    senses: ['tension', 'compression'] as ('tension' | 'compression')[],
    angles: [0, 30],
    increment: 0.1,
    limitStates: [state('bolt-shear', 'BS', 'Bolt shear')],
    rules: [
      { rule: 'pitch', title: 'Pitch too small', clause: '22.3.1', cells: 1 },
      { rule: 'edge', title: 'Edge distance too small', clause: '22.3.2', cells: 0 },
    ],
  };
  const cells = emptyCells(axes);
  fillCells(cells, {
    from: 1,
    count: 1,
    capacity: [300.1, 250, 199.9, null],
    governing: [0, 0, 0, -1],
    mass: [4.5],
    boltCount: [3],
    weldVolume: [2000],
  });

  it('stand by variant, sense and angle', () => {
    expect(cellIndex(cells, 1, 1, 0)).toBe(6);
    const reading = readCell(cells, axes, { ordinal: 1, angle: 0 }, 1);
    expect(cellText(reading, 0.1)).toBe('199.9');
    expect(spokenReading(reading, 0.1)).toBe('199.9 kN, Bolt shear (BS) governs');
  });

  it('name the rule where they are rejected, and never show a zero or a blank', () => {
    const reading = readCell(cells, axes, { ordinal: 1, angle: 1 }, 1);
    expect(cellText(reading, 0.1)).toBe('—');
    expect(spokenReading(reading, 0.1)).toBe('not permitted: Pitch too small');
  });

  it('wait while they are not loaded', () => {
    expect(readCell(cells, axes, { ordinal: 2, angle: 0 }, 0).status).toBe('waiting');
  });

  it('come in blocks of at most 20 000 cells of whole variants', () => {
    const large = emptyCells({
      ...axes,
      variants: 100_000,
      angles: Array.from({ length: 25 }, (_, at) => at),
    });
    expect(large.blockSize).toBe(400);
    expect(large.loaded.length).toBe(250);
  });
});
