import { describe, expect, it } from 'vitest';
import { definitionSchema } from '@shared/contracts/definition.ts';
import { findKind } from '@shared/engine/index.ts';
import type { DetailKind } from '@shared/engine/types.ts';
import { countsOf, refusalOf } from '../../src/components/family-editor/counts.ts';
import { differencesOf, merged } from '../../src/components/family-editor/differences.ts';
import {
  draftOf,
  newDraft,
  type FamilyDraft,
  type ParameterDraft,
} from '../../src/components/family-editor/draft.ts';
import { isUsed, readDraft } from '../../src/components/family-editor/read-draft.ts';
import { numberOf } from '../../src/composables/number-text.ts';

const kind = findKind('gusset-plate') as DetailKind;
const settings = { increment: 1, factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 } };
const fresh = (): FamilyDraft => newDraft(kind, 'sans-10162-1-2011', settings);
const parameter = (draft: FamilyDraft, name: string): ParameterDraft => {
  const found = draft.parameters[name];
  if (!found) throw new Error(`No parameter ${name}`);
  return found;
};
const faultsWith = (change: (draft: FamilyDraft) => void): string[] => {
  const draft = fresh();
  change(draft);
  return readDraft(draft, kind).faults.map(({ field, message }) => `${field}: ${message}`);
};

describe('a number as typed', () => {
  it.each([
    ['12', 12],
    [' 1 250,5 ', 1250.5],
    ['−7', -7],
    ['.5', 0.5],
    ['1e3', 1000],
  ])('%s is read', (text, value) => expect(numberOf(text)).toBe(value));
  it.each(['', 'abc', '1,2,3', '12mm', 'Infinity', 'NaN', '1e999', '0x10', '--1'])('%s is not', (text) =>
    expect(numberOf(text)).toBeUndefined(),
  );
});

describe('the form of a family', () => {
  it('starts sound, and gives what the contract asks for', () => {
    const { definition, faults } = readDraft(fresh(), kind);
    expect(faults).toEqual([]);
    expect(definitionSchema.safeParse(definition).error).toBeUndefined();
  });

  it('brings a stored definition back unchanged', () => {
    const draft = fresh();
    Object.assign(parameter(draft, 'plate_thickness'), { mode: 'list', list: ['10', '12'] });
    Object.assign(parameter(draft, 'weld_leg'), { mode: 'range', range: { from: '6', to: '10', step: '2' } });
    Object.assign(parameter(draft, 'plate_steel'), { fixed: { fy: 350, fu: 480 } });
    const { definition } = readDraft(draft, kind);
    expect(definition).not.toBeNull();
    if (!definition) return;
    expect(readDraft(draftOf(definition, kind, { code: '', title: '' }), kind).definition).toEqual(
      definition,
    );
  });

  it('leaves out what the detail does not use', () => {
    const draft = fresh();
    const spec = kind.parameters.find(({ name }) => name === 'projection');
    expect(spec && isUsed(spec, draft)).toBe(false);
    Object.assign(parameter(draft, 'outline'), { mode: 'list', list: ['tapered', 'rectangular'] });
    expect(spec && isUsed(spec, draft)).toBe(true);
    expect(readDraft(draft, kind).settings).toHaveProperty('projection');
  });

  it('names field, value and limit of every fault', () => {
    expect(faultsWith((draft) => (parameter(draft, 'pitch').fixed = '-5'))).toEqual([
      'pitch: Pitch must be a number from 10 to 500 mm; “-5” was given.',
    ]);
    expect(faultsWith((draft) => (parameter(draft, 'rows').fixed = '2.5'))).toEqual([
      'rows: Rows of bolts must be a whole number from 1 to 20; “2.5” was given.',
    ]);
    expect(faultsWith((draft) => (draft.angles.range.step = '0'))[0]).toMatch(/^angles\.step: .*from 0\.25/);
    expect(faultsWith((draft) => (draft.senses = []))).toEqual([
      'senses: Choose tension, compression or both.',
    ]);
  });

  it('refuses an empty list, a value twice, a range that runs backwards and one with too many values', () => {
    const pitch = (change: Partial<ParameterDraft>) =>
      faultsWith((draft) => Object.assign(parameter(draft, 'pitch'), change));
    expect(pitch({ mode: 'list', list: [] })).toEqual(['pitch: Pitch needs at least one value.']);
    expect(pitch({ mode: 'list', list: ['70', '70.0'] })).toEqual(['pitch: Pitch has 70 twice.']);
    expect(pitch({ mode: 'range', range: { from: '80', to: '70', step: '5' } })[0]).toContain(
      'must not be below from, 80',
    );
    expect(pitch({ mode: 'range', range: { from: '10', to: '500', step: '0.001' } })[0]).toContain(
      'at most 500 values',
    );
  });
});

describe('the size of a sweep', () => {
  it('is the product of the values, the angles and the senses', () => {
    const draft = fresh();
    Object.assign(parameter(draft, 'plate_thickness'), { mode: 'list', list: ['10', '12', '16'] });
    Object.assign(parameter(draft, 'weld_leg'), {
      mode: 'range',
      range: { from: '6', to: '10', step: '0.1' },
    });
    Object.assign(draft.angles.range, { from: '-60', to: '60', step: '5' });
    const { settings: read, angles } = readDraft(draft, kind);
    // 3 thicknesses x 41 legs; 25 angles; 2 senses: counted by hand.
    expect(countsOf(read, angles, 2)).toEqual({ variants: 123, angles: 25, cells: 6150 });
  });

  it('is refused above the limits, with both numbers', () => {
    expect(refusalOf({ variants: 1e12, angles: 1, cells: 1e12 })).toContain(
      '1\u202f000\u202f000\u202f000\u202f000 variants',
    );
    expect(refusalOf({ variants: 1, angles: 1, cells: 20_000_001 })).toContain('20\u202f000\u202f000');
    expect(refusalOf({ variants: 1_000_000, angles: 20, cells: 20_000_000 })).toBeNull();
  });
});

describe('two who saved at once', () => {
  it('see what differs, and keep what they choose', () => {
    const [mine, theirs] = [fresh(), fresh()];
    parameter(mine, 'pitch').fixed = '75';
    parameter(theirs, 'pitch').fixed = '80';
    parameter(theirs, 'rows').fixed = '4';
    const rows = differencesOf(mine, theirs, kind);
    expect(rows.map(({ field, mine: own, theirs: other }) => [field, own, other])).toEqual([
      ['rows', '3', '4'],
      ['pitch', '75', '80'],
    ]);
    const result = merged(mine, theirs, new Set(['rows']));
    expect([parameter(result, 'pitch').fixed, parameter(result, 'rows').fixed]).toEqual(['75', '4']);
  });
});
