import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type BasisId, type FieldFault, findKind, type ParameterValues } from '@shared/engine/index.ts';
import { catalogue, EN, plain, SANS } from './support/gusset.ts';

const kind = findKind('gusset-plate');

function faults(values: unknown, basis: string = SANS, factors?: unknown): readonly FieldFault[] {
  const result = kind?.prepare(values as ParameterValues, basis as BasisId, catalogue, factors as object);
  return result === undefined || result.ok ? [] : result.faults;
}

describe('absurd input is a fault of its field', () => {
  it.each([
    ['plate_thickness', -12],
    ['plate_thickness', 1e9],
    ['plate_thickness', NaN],
    ['plate_thickness', Infinity],
    ['plate_thickness', '12'],
    ['plate_thickness', null],
    ['plate_thickness', [12]],
    ['weld_leg', -1],
    ['weld_leg', true],
    ['rows', 1e9],
    ['rows', 2.5],
    ['lines', 3],
    ['outline', 'round'],
    ['outline', 'x'.repeat(2_000_000)],
    ['brace', 4],
    ['plate_steel', 'S999'],
    ['plate_steel', { fy: 355 }],
    ['plate_steel', { fy: 355, fu: 'strong' }],
    ['plate_steel', { fy: 355, fu: 200 }],
    ['plate_steel', { fy: 355, fu: 470, colour: 1 }],
    ['plate_steel', 355],
    ['bolt_size', { d: 20 }],
    ['bolt_size', { d: 20, stressArea: 0 }],
    ['bolt_size', { d: 20, stressArea: 900 }],
    ['bolt_grade', { fyb: 640, fub: NaN }],
    ['electrode', { xu: -1 }],
    ['section', { shape: 'cube' }],
    ['section', { shape: 'angle', longLeg: 80, shortLeg: 100, thickness: 8 }],
    ['section', { shape: 'angle', longLeg: 100, shortLeg: 100, thickness: 60 }],
    ['section', { shape: 'flat', width: 100, thickness: 10, area: 5000 }],
    ['section', { shape: 'flat', width: 100, thickness: 10, area: 800 }],
    ['section', { shape: 'angle', longLeg: 100, shortLeg: 100, thickness: 10, area: 1500 }],
    ['section', 'IPE300'],
    ['section', { shape: 'i', depth: 300, width: 150, webThickness: 7, flangeThickness: 11 }],
    ['section', { shape: 'i', depth: 300, width: 150, webThickness: 7, flangeThickness: 160 }],
  ])('%s', (field, value) => {
    const found = faults({ ...plain, [field]: value });
    expect(found).toHaveLength(1);
    expect(found[0]?.field).toBe(field);
    expect(found[0]?.message.length).toBeGreaterThan(10);
    expect(found[0]?.message.length).toBeLessThan(400);
    expect(JSON.stringify(found[0]?.value ?? null).length).toBeLessThan(200);
  });

  it('says what is accepted', () => {
    expect(faults({ weld_leg: 1000 })[0]?.message).toContain('from 2 to 40 mm; 1000 was given');
    expect(faults({ plate_steel: 'S35' })[0]?.message).toContain('S355');
    expect(faults({ brace: 'pair' })[0]?.message).toContain('back_to_back, star, single, flat');
    expect(faults({ section: 'IPE300' })[0]?.message).toBe(
      'Section: accepted is an angle (shape "angle") or a flat (shape "flat"); "IPE300" is an I section (shape "i")',
    );
    expect(faults({ section: 'L100x100x11' })[0]?.message).not.toContain('IPE');
  });

  it('unknown names are refused, with the nearest known one', () => {
    const [fault] = faults({ plate_thicknes: 12 });
    expect(fault).toMatchObject({ field: 'plate_thicknes', value: 12 });
    expect(fault?.message).toContain('did you mean plate_thickness?');
    expect(faults(JSON.parse('{"__proto__": 1}'))).toHaveLength(1);
    expect(faults({ constructor: 1 })).toHaveLength(1);
  });

  it('every fault is reported, not the first alone', () => {
    const found = faults({ weld_leg: -1, rows: 0, colour: 'red' }, EN, { gammaM2: 0 });
    expect(found.map(({ field }) => field).sort()).toEqual(['colour', 'factors.gammaM2', 'rows', 'weld_leg']);
  });

  it.each([null, undefined, 3, 'text', [], [1]])('parameters that are no object: %j', (values) => {
    expect(faults(values)[0]?.field).toBe('parameters');
  });

  it('a basis or partial factor that there is not', () => {
    expect(faults(plain, 'toString')[0]?.field).toBe('basis');
    expect(faults(plain, EN, { gammaM9: 1 })[0]?.field).toBe('factors.gammaM9');
    expect(faults(plain, EN, [1])[0]?.field).toBe('factors');
    expect(faults(plain, EN, { gammaM0: 1.1 })).toEqual([]);
  });

  it('missing parameters take their defaults, and the defaults are a permitted detail', () => {
    for (const basis of [SANS, EN] as const) {
      const result = kind?.prepare({}, basis, catalogue);
      expect(result?.ok && result.detail.outcome(0, 'tension').status).toBe('capacity');
    }
  });

  it('no JSON at all makes it throw', () => {
    const names = (kind?.parameters ?? []).map(({ name }) => name);
    const anything = fc.dictionary(fc.oneof(fc.constantFrom(...names), fc.string()), fc.jsonValue());
    fc.assert(
      fc.property(fc.oneof(anything, fc.jsonValue()), fc.jsonValue(), (values, factors) => {
        expect(() => faults(values, EN, factors)).not.toThrow();
      }),
      { numRuns: 2000 },
    );
  });
});

describe('partial factors', () => {
  it('a firm sets its own and they divide', () => {
    const at = (gammaM2: number) => {
      const result = kind?.prepare({ ...plain, exposure: 'sheltered' }, EN, catalogue, { gammaM2 });
      const out = new Float64Array(12);
      if (result?.ok === true) result.detail.at(0, 'tension', out);
      return out[3] ?? 0;
    };
    expect(at(1.25) / at(1.5)).toBeCloseTo(1.5 / 1.25, 12);
  });
});
