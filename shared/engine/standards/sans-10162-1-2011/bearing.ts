import type { BearingPly, BearingStrength, Rec } from '../basis.ts';
import { phibr } from './factors.ts';

const CLAUSE = 'SANS 10162-1 13.10';

/**
 * Factored bearing resistance of a ply at one bolt, N: the lesser of `3 phi_br t d f_u` and `phi_br a t f_u`.
 *
 * t thickness, d bolt diameter, a from the bolt's centre to the end or to the next bolt's centre in the
 * direction of the force, mm; f_u of the ply, MPa. `a` may be Infinity where nothing lies ahead.
 * The text speaks of the end distance; the distance to the next bolt is read the same way (errs low).
 * SANS 10162-1:2011, 13.10.
 */
export function bearingResistance(t: number, d: number, fu: number, a: number): number {
  return phibr * t * fu * Math.min(3 * d, a);
}

/** Bearing on one ply, prepared: `bolt` is called in sweeps. */
export class SansBearing implements BearingStrength {
  private readonly t: number;
  private readonly d: number;
  private readonly fu: number;

  constructor(ply: BearingPly) {
    this.t = ply.thickness;
    this.d = ply.size.d;
    this.fu = ply.fu;
  }

  bolt(end: number, pitch: number, _edge: number, _gauge: number, rec: Rec): number {
    const a = Math.min(end, pitch);
    const Br = bearingResistance(this.t, this.d, this.fu, a);
    if (rec !== null) {
      rec.line('a', 'bolt to the end or the next bolt ahead', '', orNone(a), 'mm', CLAUSE);
      rec.line('B_r', 'bearing, one bolt', 'min(3 φ_br t d f_u, φ_br a t f_u), φ_br = 0.67', Br, 'N', CLAUSE);
    }
    return Br;
  }
}

function orNone(value: number): number | string {
  return value === Infinity ? 'none' : value;
}
