import type { Definition } from '@shared/contracts/definition.ts';

/** A small gusset family: 2 plates x 2 bolts, every 20 degrees; some cells are rejected. */
export const smallDefinition: Definition = {
  schema: 1,
  kind: 'gusset-plate',
  basis: 'sans-10162-1-2011',
  parameters: {
    plate_thickness: { mode: 'list', values: [10, 12] },
    bolt_size: { mode: 'list', values: ['M20', 'M24'] },
    plate_steel: { mode: 'fixed', value: 'S355' },
    weld_leg: { mode: 'fixed', value: 8 },
  },
  angles: { mode: 'range', from: -80, to: 80, step: 20 },
  senses: ['tension', 'compression'],
  increment: 1,
  factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
};

/** About 100 000 cells. */
export const largeDefinition: Definition = {
  ...smallDefinition,
  parameters: {
    plate_thickness: { mode: 'range', from: 8, to: 20, step: 2 },
    weld_leg: { mode: 'list', values: [6, 8, 10] },
    rows: { mode: 'range', from: 2, to: 6, step: 1 },
    pitch: { mode: 'list', values: [65, 70, 75] },
    bolt_size: { mode: 'list', values: ['M20', 'M24'] },
  },
  angles: { mode: 'range', from: -80, to: 80, step: 1 },
  senses: ['tension'],
};
