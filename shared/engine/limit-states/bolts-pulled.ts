import { rootOfFalling } from '../numeric/falling-root.ts';
import type { Basis, Rec } from '../standards/basis.ts';
import type { StubRows } from './t-stub.ts';

/**
 * Bolts to a support that are sheared and pulled at once, with prying: the bolt keeps less tension beside its shear, and the
 * T-stub carries what bolts of that tension can hold. The capacity R is the root of
 * `pull(T(R v/V_r)) = R t`, which falls with R, bracketed by shear alone and by pull alone.
 */
export class PulledBolts {
  private v = 0;
  private t = 0;
  /** Pull that the stub carries without any shear, N. */
  private readonly most: number;

  /**
   * @param tension tension strength of one bolt, N
   * @param shear shear strength of one bolt, N
   */
  constructor(
    private readonly basis: Basis,
    private readonly stub: Pick<StubRows, 'pull'>,
    private readonly tension: number,
    private readonly shear: number,
  ) {
    this.most = stub.pull(tension, null);
  }

  /** Pull alone, N; Infinity for a push. @param t pull on all bolts for R = 1 N */
  pulled(t: number, rec: Rec): number {
    if (t <= 0) return Infinity;
    if (rec !== null) {
      this.stub.pull(this.tension, rec);
      rec.line('t', 'pull for R = 1', '', t, '', '');
    }
    return this.most / t;
  }

  /**
   * Shear and pull together, N; Infinity where there is no pull, when shear alone governs elsewhere.
   * @param v shear on the worst bolt, @param t pull on all bolts, for R = 1 N
   */
  together(v: number, t: number, rec: Rec): number {
    if (t <= 0) return Infinity;
    this.v = v / this.shear;
    this.t = t;
    const most = this.most / t;
    const high = this.v > 0 ? Math.min(most, 1 / this.v) : most;
    const R = rootOfFalling(this, high);
    if (rec !== null) {
      rec.line('v', 'shear of one bolt over its strength, for R', 'R v/V_r', R * this.v, '', '');
      const left = this.basis.tensionWithShear(this.tension, R * this.v, rec);
      const pull = this.stub.pull(left, rec);
      rec.line('R', 'root of pull(B) = R t', '', pull / t, 'N', '');
    }
    return R;
  }

  /** What is left of the pull at a resultant R, N. */
  at(R: number): number {
    const left = this.basis.tensionWithShear(this.tension, R * this.v, null);
    return this.stub.pull(left, null) - R * this.t;
  }
}
