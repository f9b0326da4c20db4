import type { Steel } from '../../types.ts';
import type { FilletSpec, FilletStrength, Rec } from '../basis.ts';

const CLAUSE = 'EN 1993-1-8 4.5.3.2';

/**
 * Correlation factor beta_w of Table 4.1: S235 0.80, S275 0.85, S355 0.90, S420 and S460 1.00.
 *
 * Read from the strengths, MPa, so that a steel given by numbers is placed too; a steel between two rows takes
 * the higher factor (errs low). EN 1993-1-8:2005, Table 4.1.
 */
export function correlationFactor(fy: number, fu: number): number {
  if (fu <= 360 && fy <= 235) return 0.8;
  if (fu <= 430 && fy <= 275) return 0.85;
  return fu <= 510 && fy <= 355 ? 0.9 : 1;
}

/**
 * Utilisation of the throat by the directional method: the greater of
 * `sqrt(sigma_perp^2 + 3(tau_perp^2 + tau_par^2)) / (f_u/(beta_w gamma_M2))` and `sigma_perp / (0.9 f_u/gamma_M2)`.
 *
 * Stresses on the throat and f_u of the weaker part, MPa. EN 1993-1-8:2005, 4.5.3.2(6), equation (4.1).
 */
export function filletDirectional(
  sigmaPerp: number,
  tauPerp: number,
  tauPar: number,
  fu: number,
  betaW: number,
  gammaM2: number,
): number {
  const combined = Math.sqrt(sigmaPerp * sigmaPerp + 3 * (tauPerp * tauPerp + tauPar * tauPar));
  return Math.max((combined * betaW * gammaM2) / fu, (Math.abs(sigmaPerp) * gammaM2) / (0.9 * fu));
}

/**
 * Design shear strength of the weld by the simplified method, MPa: `f_vw,d = f_u/(sqrt(3) beta_w gamma_M2)`;
 * times the throat it is the strength per millimetre whatever the direction. EN 1993-1-8:2005, 4.5.3.3.
 */
export function filletSimplified(fu: number, betaW: number, gammaM2: number): number {
  return fu / (Math.sqrt(3) * betaW * gammaM2);
}

/** One fillet, prepared. The two methods share the geometry of an equal-legged fillet, throat z/sqrt(2). */
export class EnFillet implements FilletStrength {
  readonly hasBaseMetalCheck = false;
  readonly runOut: number;
  private readonly a: number;
  private readonly fu: number;
  private readonly betaW: number;
  private readonly simplified: number;
  private readonly directional: boolean;

  constructor(
    spec: FilletSpec,
    private readonly gammaM2: number,
  ) {
    const weakest = weakestForWelding(spec.parts);
    this.a = spec.leg / Math.SQRT2;
    this.fu = weakest.fu;
    this.betaW = correlationFactor(weakest.fy, weakest.fu);
    this.simplified = filletSimplified(this.fu, this.betaW, gammaM2);
    this.directional = spec.directional;
    this.runOut = 2 * this.a;
  }

  metalUtilisation(pull: number, shear: number, rec: Rec): number {
    if (!this.directional) return this.bySimplified(pull, shear, rec);
    const across = pull / (this.a * Math.SQRT2);
    const along = shear / this.a;
    const utilisation = filletDirectional(across, across, along, this.fu, this.betaW, this.gammaM2);
    if (rec !== null) this.recordDirectional(across, along, rec);
    return utilisation;
  }

  baseMetalUtilisation(): number {
    return 0;
  }

  private bySimplified(pull: number, shear: number, rec: Rec): number {
    const force = Math.sqrt(pull * pull + shear * shear);
    if (rec !== null) {
      const clause = 'EN 1993-1-8 4.5.3.3';
      this.recordGiven(rec);
      rec.line('f', 'on this millimetre of a unit resultant', '√(f_x² + f_y²)', force, 'N/mm per N', clause);
      rec.line('f_vw,d', 'shear strength', 'f_u/(√3 β_w γ_M2)', this.simplified, 'MPa', clause);
    }
    return force / (this.simplified * this.a);
  }

  private recordDirectional(across: number, along: number, rec: NonNullable<Rec>): void {
    this.recordGiven(rec);
    rec.line('σ_⊥ = τ_⊥', 'on the throat of a unit resultant', 'f_x/(a√2)', across, 'MPa per N', CLAUSE);
    rec.line('τ_∥', 'on the throat of a unit resultant', 'f_y/a', along, 'MPa per N', CLAUSE);
    const limit = this.fu / (this.betaW * this.gammaM2);
    rec.line('f_w,d', 'limit of √(σ_⊥² + 3(τ_⊥² + τ_∥²))', 'f_u/(β_w γ_M2)', limit, 'MPa', CLAUSE);
    rec.line('σ_⊥,d', 'limit of σ_⊥', '0.9 f_u/γ_M2', (0.9 * this.fu) / this.gammaM2, 'MPa', CLAUSE);
  }

  private recordGiven(rec: NonNullable<Rec>): void {
    rec.line('a', 'throat', 'z/√2', this.a, 'mm', 'EN 1993-1-8 4.5.2');
    rec.line('f_u', 'of the weaker part joined', '', this.fu, 'MPa', CLAUSE);
    rec.line('β_w', 'correlation factor', '', this.betaW, '', 'EN 1993-1-8 Table 4.1');
  }
}

/** The part with the least f_u/beta_w. */
function weakestForWelding(parts: readonly Steel[]): Steel {
  const strength = (part: Steel) => part.fu / correlationFactor(part.fy, part.fu);
  return parts.reduce((least, part) => (strength(part) < strength(least) ? part : least));
}
