import { describe, expect, it } from 'vitest';
import { findKind } from '@shared/engine/index.ts';
import type { EngineCatalogue, ParameterSpec, ParameterValue } from '@shared/engine/types.ts';
import { optionsOf } from '../../src/components/family-editor/options.ts';

const source = 'EN 10365 and EN 10056-1, from memory';
const web = { webThickness: 8.6, flangeThickness: 13.5, rootRadius: 21 };
const catalogue: EngineCatalogue = {
  boltSizes: [],
  boltGrades: [],
  steels: [],
  electrodes: [],
  sections: [
    { shape: 'i', name: 'IPE400', depth: 400, width: 180, ...web, area: 8450, source },
    {
      shape: 'angle',
      name: 'L100x100x10',
      longLeg: 100,
      shortLeg: 100,
      thickness: 10,
      rootRadius: 12,
      area: 1920,
      source,
    },
    { shape: 'flat', name: 'FL100x10', width: 100, thickness: 10, area: 1000, source },
  ],
};

const spec = (kind: string, name: string) =>
  findKind(kind)?.parameters.find((one) => one.name === name) as ParameterSpec;
const names = (kind: string, name: string, narrowed: Readonly<Record<string, ParameterValue>> = {}) =>
  optionsOf(spec(kind, name), catalogue, [], narrowed).map(({ value }) => value);

describe('the sections that may be picked', () => {
  it('are I sections for a beam', () => {
    const offered = names('fin-plate', 'beam_section');
    expect(offered).toContain('IPE400');
    expect(offered).not.toContain('L100x100x10');
    expect(offered).not.toContain('FL100x10');
  });

  it('are angles and flats for a brace, and those of its shape once the brace is chosen', () => {
    const either = names('gusset-plate', 'section');
    expect(either).toContain('L100x100x10');
    expect(either).toContain('FL100x10');
    expect(either).not.toContain('IPE400');
    expect(names('gusset-plate', 'section', { brace: 'flat' })).not.toContain('L100x100x10');
    expect(names('gusset-plate', 'section', { brace: 'single' })).not.toContain('FL100x10');
  });

  it('keep one that is given by its numbers', () => {
    const given = { shape: 'i', depth: 300, width: 150, webThickness: 7, flangeThickness: 11 };
    const offered = optionsOf(spec('fin-plate', 'beam_section'), catalogue, [given]);
    expect(offered.at(-1)?.value).toEqual(given);
  });
});
