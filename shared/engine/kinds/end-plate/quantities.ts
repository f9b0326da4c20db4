import type { Quantities } from '../../types.ts';
import type { EndPlateModel } from './model.ts';

/** Mass of steel, kg/mm3. */
const DENSITY = 7850e-9;

/** Mass of the plate, holes not deducted, kg; number of bolts; both fillets to the web as triangles of the leg, mm3. */
export function quantitiesOf(m: EndPlateModel): Quantities {
  return {
    mass: m.height * m.width * m.thickness * DENSITY,
    boltCount: m.bolts,
    weldVolume: m.weldLength * m.weldLeg * m.weldLeg,
  };
}
