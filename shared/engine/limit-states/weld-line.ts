import { heightOfLeastPull, pullPerMillimetre, shearPerMillimetre } from '../groups/weld-line.ts';
import type { FilletStrength, Rec } from '../standards/basis.ts';

/** Weld metal, or the base metal along the fusion face. */
export type WeldPart = 'metal' | 'base';

/**
 * Largest resultant that two fillets on one line carry, N, found on the worst millimetre: the two ends and the
 * millimetre of least pull, where a strength that rises with the angle of the force is least.
 * @param n pull, `v` shear, `m` moment about the middle of the weld for a resultant of 1 N
 * @param length counted length of each fillet, mm
 */
export function weldLineCapacity(
  fillet: FilletStrength,
  part: WeldPart,
  n: number,
  v: number,
  m: number,
  length: number,
  rec: Rec,
): number {
  const shear = shearPerMillimetre(v, length);
  const middle = heightOfLeastPull(n, m, length);
  let worst = length / 2;
  let most = utilisation(fillet, part, pullPerMillimetre(n, m, length, worst), shear, null);
  const lower = utilisation(fillet, part, pullPerMillimetre(n, m, length, -length / 2), shear, null);
  if (lower > most) {
    most = lower;
    worst = -length / 2;
  }
  const inside = utilisation(fillet, part, pullPerMillimetre(n, m, length, middle), shear, null);
  if (inside > most) {
    most = inside;
    worst = middle;
  }
  if (rec !== null) recordWorst(fillet, part, n, v, m, length, worst, rec);
  return most > 0 ? 1 / most : Infinity;
}

function utilisation(fillet: FilletStrength, part: WeldPart, pull: number, shear: number, rec: Rec): number {
  return part === 'metal'
    ? fillet.metalUtilisation(pull, shear, rec)
    : fillet.baseMetalUtilisation(pull, shear, rec);
}

function recordWorst(
  fillet: FilletStrength,
  part: WeldPart,
  n: number,
  v: number,
  m: number,
  length: number,
  worst: number,
  rec: NonNullable<Rec>,
): void {
  const pull = pullPerMillimetre(n, m, length, worst);
  const shear = shearPerMillimetre(v, length);
  rec.line('L', 'counted length of each fillet', '', length, 'mm', '');
  rec.line('y_w', 'worst millimetre, from the middle of the weld', '', worst, 'mm', '');
  rec.line('f_x', 'pull of a unit resultant, one fillet', 'N/(2L) + M y/(2 L³/12)', pull, 'N/mm per N', '');
  rec.line('f_y', 'shear of a unit resultant, one fillet', 'V/(2L)', shear, 'N/mm per N', '');
  utilisation(fillet, part, pull, shear, rec);
}
