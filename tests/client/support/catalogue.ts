import type { EngineCatalogue } from '@shared/engine/types.ts';

/** As much reference data as a gusset plate at its defaults needs. */
export const catalogue: EngineCatalogue = {
  boltSizes: [
    { name: 'M20', d: 20, stressArea: 245, hole: { en: 22, sans: 22, csa: 22, aisc: 22 } },
    { name: 'M24', d: 24, stressArea: 353, hole: { en: 26, sans: 26, csa: 27, aisc: 27 } },
  ],
  boltGrades: [
    {
      name: '8.8',
      fyb: 640,
      nominal: 800,
      minimum: [{ dMax: 64, fub: 830 }],
      aisc: [],
      source: 'EN ISO 898-1',
    },
  ],
  steels: [{ name: 'S355', bands: [{ tMax: 40, fy: 355, fu: 490 }], source: 'EN 10025-2' }],
  electrodes: [{ name: 'E70XX', xu: 490, source: 'CSA W59' }],
  sections: [
    {
      shape: 'angle',
      name: 'L100x100x10',
      longLeg: 100,
      shortLeg: 100,
      thickness: 10,
      rootRadius: 12,
      area: 1920,
      source: 'EN 10056-1',
    },
  ],
};
