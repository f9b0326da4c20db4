import type { Quantities } from '../../types.ts';
import type { FinPlateModel } from './model.ts';

/** Mass of steel, kg/mm3. */
const DENSITY = 7850e-9;

/** Mass of the plate, holes not deducted, kg; number of bolts; both fillets as triangles of the leg, mm3. */
export function quantitiesOf(m: FinPlateModel): Quantities {
  return {
    mass: m.height * m.width * m.thickness * DENSITY,
    boltCount: m.group.rows * m.group.columns,
    weldVolume: m.height * m.weldLeg * m.weldLeg,
  };
}
