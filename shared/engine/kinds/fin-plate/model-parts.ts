import type { Basis, FilletSpec } from '../../standards/basis.ts';
import { weldedParts, type WeldedPlate } from '../parts.ts';
import type { Resolved } from '../resolved.ts';
import { TOLERANCE } from '../rules.ts';
import type { Lines } from '../beam-end/shear-lines.ts';

/** Both fillets of the plate: their strength, counted length, and the leg of a full-strength weld. mm. */
export function weldOf(values: Resolved, basis: Basis, plate: WeldedPlate, height: number, lines: Lines) {
  const weldLeg = values.number('weld_leg');
  const parts = weldedParts(plate);
  const spec = (concentric: boolean): FilletSpec => ({
    leg: weldLeg,
    xu: values.electrode('electrode').xu,
    parts,
    directional: values.choice('weld_method') === 'directional',
    concentric,
    matching: values.choice('electrode_match') === 'matching',
  });
  const fillet = basis.fillet(spec(lines.weldLever <= TOLERANCE));
  const deducted = values.choice('weld_ends') === 'deducted';
  // In the plate at yield across its thickness a fillet has half of it, t f_yd/2 per mm; its use falls as it grows.
  const force = (plate.thickness * basis.yieldStress(plate.plate.fy)) / 2;
  const use = basis.fillet(spec(true)).metalUtilisation(force, 0, null);
  return {
    weldLeg,
    fillet,
    fullStrengthLeg: weldLeg * use,
    countedWeld: Math.max(1, height - (deducted ? fillet.runOut : 0)),
  };
}
