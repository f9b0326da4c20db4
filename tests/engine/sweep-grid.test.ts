import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue, toEngineCatalogue } from '@catalog/index.ts';
import { findKind, toRadians } from '@shared/engine/index.ts';
import {
  expandGrid,
  ordinalOf,
  roundDown,
  RULE_CODE,
  ruleLegend,
  sweepChunk,
  unpackCapacity,
  valuesOfRange,
  variantValues,
  type SweepDefinition,
} from '@shared/engine/sweep/index.ts';
import { formulaReader } from '@shared/expressions/index.ts';

const kind = findKind('gusset-plate')!;
const engineCatalogue = toEngineCatalogue(catalogue);
const limits = { variants: 1_000_000, cells: 20_000_000, angles: 721 };
const definition: SweepDefinition = {
  kind: 'gusset-plate',
  basis: 'en-1993-1-8-2005',
  parameters: {
    plate_thickness: { mode: 'list', values: [10, 12, 15] },
    bolt_size: { mode: 'list', values: ['M20', 'M24'] },
    rows: { mode: 'range', from: 2, to: 5, step: 1 },
    weld_leg: { mode: 'fixed', value: 8 },
  },
  angles: { mode: 'range', from: -80, to: 80, step: 20 },
  senses: ['tension', 'compression'],
  increment: 1,
  factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
};
const gridOf = (given: SweepDefinition) => {
  const result = expandGrid(given, kind, limits, formulaReader(engineCatalogue));
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.grid;
};
const faultsOf = (given: SweepDefinition) => {
  const result = expandGrid(given, kind, limits, formulaReader(engineCatalogue));
  return result.ok ? [] : result.faults.map(({ field, message }) => `${field}: ${message}`);
};

describe('the grid of a sweep', () => {
  it('counts 3 thicknesses, 2 bolts, 4 numbers of rows, 9 angles and 2 senses', () => {
    const grid = gridOf(definition);
    expect(grid.variantCount).toBe(24);
    expect(grid.cellCount).toBe(24 * 9 * 2);
    expect(grid.angles).toEqual([-80, -60, -40, -20, 0, 20, 40, 60, 80]);
  });

  it('names every variant once', () => {
    const grid = gridOf(definition);
    const seen = new Set<string>();
    for (let ordinal = 0; ordinal < grid.variantCount; ordinal++) {
      const values = variantValues(grid, ordinal);
      seen.add(JSON.stringify(values));
      const indices = grid.axes.map((axis) => axis.values.indexOf(values[axis.name]!));
      expect(ordinalOf(grid.axes, indices)).toBe(ordinal);
    }
    expect(seen.size).toBe(24);
  });

  it('keeps the end of a range in spite of float noise', () => {
    expect(valuesOfRange(0, 0.3, 0.1)).toEqual([0, 0.1, 0.2, 0.3]);
    expect(valuesOfRange(40, 70, 7.5)).toEqual([40, 47.5, 55, 62.5, 70]);
  });

  it('refuses a million million cells at once, with the number', () => {
    const range = { mode: 'range', from: 10, to: 500, step: 0.05 } as const;
    const faults = faultsOf({ ...definition, parameters: { pitch: range, gauge: range, first_row: range } });
    expect(faults).toEqual(['parameters: 941,480,149,401 variants; at most 1,000,000. Sweep fewer values.']);
  });

  it('names each fault with its path', () => {
    const parameters = {
      pitch: { mode: 'range', from: 80, to: 60, step: 0 },
      bolt_size: { mode: 'list', values: ['M20', 'M20'] },
      leg: { mode: 'fixed', value: 8 },
    } as const;
    expect(faultsOf({ ...definition, parameters, angles: { mode: 'list', values: [85] } })).toEqual([
      'parameters.pitch.step: The step 0 must be above 0.',
      'parameters.pitch.to: The end 60 must not be below the start 80.',
      'parameters.bolt_size.values.1: "M20" stands in the list twice.',
      'parameters.leg: Gusset plate has no parameter named "leg".',
      'angles: Load angle 85°: Gusset plate covers -80° to 80°.',
    ]);
  });
});

describe('rounding', () => {
  it('is down to the increment and never up', () => {
    expect(roundDown(431_999.9999, 1)).toBe(431);
    expect(roundDown(432_000 - 1e-7, 1)).toBe(432);
    expect(roundDown(432_700, 0.5)).toBe(432.5);
    expect(roundDown(999, 1)).toBe(0);
  });

  it('survives single precision', () => {
    const steps = fc.integer({ min: 0, max: 1_000_000 });
    fc.assert(
      fc.property(steps, fc.constantFrom(0.1, 0.5, 1, 2, 5, 10), (count, increment) => {
        const published = roundDown(count * increment * 1000 + 1e-6, increment);
        expect(unpackCapacity(Math.fround(published), increment)).toBe(published);
      }),
    );
  });
});

describe('a chunk', () => {
  it('holds what the engine says of each cell, rounded down, or the rule that rejects it', () => {
    const grid = gridOf(definition);
    const chunk = sweepChunk(definition, kind, grid, engineCatalogue, 5, 7);
    const legend = ruleLegend(kind);
    let cell = 0;
    for (let ordinal = 5; ordinal < 12; ordinal++) {
      const prepared = kind.prepare(variantValues(grid, ordinal), definition.basis, engineCatalogue);
      if (!prepared.ok) throw new Error('faults');
      for (const sense of grid.senses) {
        for (const angle of grid.angles) {
          const outcome = prepared.detail.outcome(toRadians(angle), sense);
          const code = chunk.governing[cell]!;
          if (outcome.status === 'capacity') {
            expect(chunk.capacities[cell]).toBe(Math.floor(outcome.capacity / 1000));
            expect(code).toBe(outcome.governing);
          } else {
            expect(chunk.capacities[cell]).toBeNaN();
            const rejections = outcome.status === 'not-permitted' ? outcome.rejections : [];
            expect(rejections.map(({ rule }) => rule)).toContain(legend[RULE_CODE - code]!.id);
          }
          cell++;
        }
      }
    }
    expect(cell).toBe(chunk.capacities.length);
  });

  it('is the same whichever chunks the grid is cut into', () => {
    const grid = gridOf(definition);
    const whole = sweepChunk(definition, kind, grid, engineCatalogue, 0, 24);
    const tail = sweepChunk(definition, kind, grid, engineCatalogue, 20, 4);
    const perVariant = grid.senses.length * grid.angles.length;
    expect(tail.capacities).toEqual(whole.capacities.slice(20 * perVariant));
    expect(tail.governing).toEqual(whole.governing.slice(20 * perVariant));
  });
});
