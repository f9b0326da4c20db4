import type { BearingPly, BearingStrength, Rec } from '../basis.ts';
import { phibr } from './factors.ts';

const CLAUSE = 'CSA S16 13.12.1.2(a)';

/**
 * Factored bearing resistance of a ply at one bolt, N: `B_r = 3 phi_br t d F_u`.
 *
 * t thickness, d bolt diameter, mm; F_u of the ply, MPa. It knows no end distance: tear-out is a block without
 * tension, 13.11. Not for long slots across the force, which take 2.4. CSA S16:19, 13.12.1.2(a).
 */
export function bearingResistance(t: number, d: number, Fu: number): number {
  return 3 * phibr * t * d * Fu;
}

/** Bearing on one ply, prepared: the same at every bolt. */
export class CsaBearing implements BearingStrength {
  private readonly Br: number;

  constructor(ply: BearingPly) {
    this.Br = bearingResistance(ply.thickness, ply.size.d, ply.fu);
  }

  bolt(_end: number, _pitch: number, _edge: number, _gauge: number, rec: Rec): number {
    if (rec !== null)
      rec.line('B_r', 'bearing, one bolt', '3 φ_br t d F_u, φ_br = 0.80', this.Br, 'N', CLAUSE);
    return this.Br;
  }
}
