import type { Quantities } from '../../types.ts';
import type { CleatModel } from './model.ts';

/** Mass of steel, kg/mm3. */
const DENSITY = 7850e-9;

/** Mass of the cleats, holes not deducted, kg; all bolts; toe welds with their returns as triangles of the leg, mm3. */
export function quantitiesOf(m: CleatModel): Quantities {
  const { cleats, section, height, group } = m.legs;
  const leg = m.weld?.leg ?? 0;
  return {
    mass: cleats * section.area * height * DENSITY,
    boltCount: group.rows * group.columns + (m.bolts?.count ?? 0),
    weldVolume: (cleats * (height + 2 * leg) * leg * leg) / 2,
  };
}
