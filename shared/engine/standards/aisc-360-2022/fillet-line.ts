import type { FilletPart, FilletSpec, FilletStrength, Rec } from '../basis.ts';
import { nominalShearRupture, nominalTensileRupture } from './connected-elements.ts';
import { directionalIncrease, nominalFillet } from './fillet-weld.ts';
import { type Format, rupture } from './format.ts';

const METAL = 'AISC 360 J2.4(a)';
const BASE = 'AISC 360 J2.4, J4.1(b), J4.2(b)';

/** What a part takes for one fillet, per millimetre: pulled across its thickness, sheared along the weld. N/mm. */
interface PartStrength {
  readonly pull: number;
  readonly shear: number;
}

/**
 * One fillet of a straight line. The weld metal takes its directional increase only where the resultant passes
 * through the middle of the line. The plate between two fillets breaks under pull and shear together as the root of
 * the sum of squares (errs low against J4); a support carries the whole force of the fillet in shear through its
 * thickness.
 */
export class AiscFillet implements FilletStrength {
  readonly hasBaseMetalCheck = true;
  readonly runOut: number;
  private readonly metal: number;
  private readonly parts: readonly PartStrength[];

  constructor(
    private readonly spec: FilletSpec,
    private readonly format: Format,
  ) {
    const { leg, xu, parts } = spec;
    this.metal = format.factor(rupture) * nominalFillet({ w: leg, FEXX: xu, kds: 1 });
    this.parts = parts.map((part) => partStrength(part, format.factor(rupture)));
    this.runOut = 2 * leg;
  }

  metalUtilisation(pull: number, shear: number, rec: Rec): number {
    const force = Math.sqrt(pull * pull + shear * shear);
    const sine = force > 0 ? Math.abs(pull) / force : 0;
    const kds = this.spec.concentric ? directionalIncrease(sine) : 1;
    const strength = this.metal * kds;
    if (rec !== null) this.recordMetal(force, sine, kds, strength, rec);
    return force / strength;
  }

  baseMetalUtilisation(pull: number, shear: number, rec: Rec): number {
    let most = 0;
    for (let index = 0; index < this.parts.length; index++) {
      const part = this.parts[index]!;
      const across = pull / part.pull;
      const along = shear / part.shear;
      most = Math.max(most, Math.sqrt(across * across + along * along));
    }
    if (rec !== null) this.recordBase(most, rec);
    return most;
  }

  private recordMetal(
    force: number,
    sine: number,
    kds: number,
    strength: number,
    rec: NonNullable<Rec>,
  ): void {
    rec.line('f', 'on this millimetre of a unit resultant', '√(f_x² + f_y²)', force, 'N/mm per N', METAL);
    rec.line('F_EXX', 'strength of the weld metal', '', this.spec.xu, 'MPa', METAL);
    if (this.spec.concentric) {
      rec.line('θ', 'resultant to the axis of the weld', 'atan(|f_x|/|f_y|)', Math.asin(sine), 'rad', METAL);
      rec.line('k_ds', 'loaded through its middle', '1.0 + 0.50 sin^1.5 θ', kds, '', METAL);
    } else {
      rec.line('k_ds', 'eccentric, elastic method: no increase', '1.0', kds, '', METAL);
    }
    const formula = `0.60 F_EXX (w/√2) k_ds ${this.format.text(rupture)}`;
    rec.line('r_w', 'weld metal per mm of fillet', formula, strength, 'N/mm', METAL);
  }

  private recordBase(most: number, rec: NonNullable<Rec>): void {
    const given = this.format.text(rupture);
    this.spec.parts.forEach(({ name, fu, thickness, fillets }, index) => {
      const strength = this.parts[index];
      if (strength === undefined) return;
      const share = fillets === 1 ? 't' : `t/${fillets}`;
      rec.line('t', `thickness, ${name}`, '', thickness, 'mm', BASE);
      rec.line('F_u', 'tensile strength', '', fu, 'MPa', BASE);
      if (fillets > 1) rec.line('r_x', 'pull, per mm', `F_u ${share} ${given}`, strength.pull, 'N/mm', BASE);
      rec.line('r_y', 'shear, per mm', `0.60 F_u ${share} ${given}`, strength.shear, 'N/mm', BASE);
    });
    const formula = '√((f_x/r_x)² + (f_y/r_y)²); a support √(f_x² + f_y²)/r_y; the greater';
    rec.line('u', 'share used by a unit resultant', formula, most, 'per N', BASE);
  }
}

function partStrength(part: FilletPart, factor: number): PartStrength {
  const thickness = part.thickness / part.fillets;
  const shear = factor * nominalShearRupture(part.fu, thickness);
  const pull = part.fillets > 1 ? factor * nominalTensileRupture(part.fu, thickness) : shear;
  return { pull, shear };
}
