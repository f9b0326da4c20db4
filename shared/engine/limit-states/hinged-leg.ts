import type { Rec } from '../standards/basis.ts';

const METHOD = 'method of this catalogue';

/** A leg of an angle whose heel may turn, bolted to a support by one column of bolts. mm, MPa. */
export interface HingedLegSpec {
  readonly thickness: number;
  /** Design bending stress. */
  readonly bending: number;
  readonly rows: number;
  readonly pitch: number;
  /** End row to the end of the leg along the column. */
  readonly end: number;
  /** Bolt line to the line of the pull. */
  readonly lever: number;
  /** Bolt line to the free edge. */
  readonly edge: number;
  /** Hole as deducted. */
  readonly deduction: number;
}

/**
 * Pull on a leg whose heel takes no moment: it bends about its bolt line alone, where the toe pries. The lesser of the leg,
 * `¼ t² f_d Σ(l − d_h)/lever`, and the bolts, `n_s B n/(lever + n)` with n = min(edge, 1.25 lever). Each bolt draws on no more
 * of the leg than the lever to either side. Statics of a plate with one yield line, as the T-stub has it with two.
 */
export class HingedLeg {
  private readonly lengths: number;
  private readonly ofLeg: number;
  private readonly prying: number;

  constructor(private readonly spec: HingedLegSpec) {
    const { thickness, bending, rows, pitch, end, lever, edge, deduction } = spec;
    const side = (length: number) => Math.min(length, lever);
    this.lengths = Math.max(0, 2 * side(end) + 2 * (rows - 1) * side(pitch / 2) - rows * deduction);
    this.ofLeg = (0.25 * thickness * thickness * bending * this.lengths) / lever;
    this.prying = Math.min(edge, 1.25 * lever);
  }

  /** @param boltTension tension that each bolt may take, N */
  pull(boltTension: number, rec: Rec): number {
    const { rows, lever, bending } = this.spec;
    const ofBolts = (rows * boltTension * this.prying) / (lever + this.prying);
    if (rec !== null) {
      rec.line('', 'heel', '', 'turns: one yield line, at the bolts', '', METHOD);
      rec.line('Σ(l − d_h)', 'net length of the leg at its bolts', '', this.lengths, 'mm', METHOD);
      rec.line('g', 'bolt line to the line of the pull', '', lever, 'mm', METHOD);
      rec.line('n', 'lever of prying', 'min(e, 1.25 g)', this.prying, 'mm', METHOD);
      rec.line('f_d', 'design bending stress', '', bending, 'MPa', METHOD);
      rec.line('T_l', 'the leg yields at its bolts', '¼ t² f_d Σ(l − d_h)/g', this.ofLeg, 'N', METHOD);
      rec.line('T_b', 'the bolts with prying', 'n_s B n/(g + n)', ofBolts, 'N', METHOD);
    }
    return Math.min(this.ofLeg, ofBolts);
  }
}
