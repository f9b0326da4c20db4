import type { Basis, FilletStrength } from '../../standards/basis.ts';
import type { Steel } from '../../types.ts';
import type { Resolved } from '../resolved.ts';
import type { Legs } from './legs.ts';

/**
 * Share of the moment of an eccentric toe weld, `3.6/6`, where the legs of a pair bear on the web: they turn about L/6
 * below the top, so that the foot of the weld takes 3.6 V e/L² and not 6 V e/L². AISC Manual, Part 10 (from memory).
 */
const BEARING = 0.6;

/** The weld along the toe of each outstanding leg. N, mm. */
export interface SupportWeld {
  readonly leg: number;
  readonly fillet: FilletStrength;
  /** Counted, of each. */
  readonly length: number;
  /** From the weld to the line of the shear. */
  readonly lever: number;
  /** Moment that counts for the force at the ends, for a shear of 1 N on all cleats. */
  readonly moment: number;
}

/** Reads the weld; a support of no given thickness is taken as thick as the cleats. */
export function supportWeldOf(
  values: Resolved,
  basis: Basis,
  legs: Legs,
  support: Steel,
  supportThickness: number,
  webThickness: number,
): SupportWeld {
  const leg = values.number('weld_leg');
  const { thickness, steel, cleats } = legs;
  const behind = supportThickness || thickness;
  const part = ({ name, fy, fu }: Steel, t: number) => ({ name, fy, fu, thickness: t, fillets: 1 });
  const fillet = basis.fillet({
    leg,
    xu: values.electrode('electrode').xu,
    parts: [part(steel, thickness), part(support, behind)],
    directional: values.choice('weld_method') === 'directional',
    concentric: false,
    matching: values.choice('electrode_match') === 'matching',
  });
  const deducted = values.choice('weld_ends') === 'deducted' ? fillet.runOut : 0;
  // A pair has its shear at the faces of the web, a single cleat in the middle of it.
  const lever = legs.outstandingLeg + (cleats === 1 ? webThickness / 2 : 0);
  const bearing = cleats === 2 && values.choice('toe_weld') === 'bearing';
  return {
    leg,
    fillet,
    length: Math.max(1, legs.height - deducted),
    lever,
    moment: bearing ? BEARING * lever : lever,
  };
}
