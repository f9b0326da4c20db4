import type { Point, Quantities } from '../../types.ts';
import { outlineOf } from './geometry.ts';
import type { GussetModel } from './model.ts';

/** Mass of steel, kg/mm3. */
const DENSITY = 7850e-9;

/** Area of a polygon, mm2. */
function polygonArea(points: readonly Point[]): number {
  return Math.abs(
    points.reduce((sum, point, index) => {
      const next = points[(index + 1) % points.length] ?? point;
      return sum + (point.x * next.y - next.x * point.y) / 2;
    }, 0),
  );
}

/**
 * Mass of the gusset plate alone, holes not deducted, kg: a tapered plate is taken at a load angle of 0 degrees;
 * number of bolts; volume of both fillets as triangles of the leg, mm3.
 */
export function quantitiesOf(m: GussetModel): Quantities {
  return {
    mass: polygonArea(outlineOf(m, 0)) * m.thickness * DENSITY,
    boltCount: m.rows * m.lines,
    weldVolume: m.weldLength * m.weldLeg * m.weldLeg,
  };
}
