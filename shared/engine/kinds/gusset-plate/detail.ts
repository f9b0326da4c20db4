import { SheetRecorder } from '../../numeric/recorder.ts';
import type { Rec } from '../../standards/basis.ts';
import {
  type CellOutcome,
  type DetailGeometry,
  type LimitStateInfo,
  NOT_COVERED,
  NOT_PERMITTED,
  type PreparedDetail,
  type Quantities,
  type Rejection,
  type Sense,
  type SheetSection,
} from '../../types.ts';
import {
  governing,
  recordLimitStates,
  recordNotCovered,
  recordNotes,
  recordRejections,
  recordResult,
} from '../detail-sheet.ts';
import { Rejections } from '../rules.ts';
import { geometryOf } from './geometry.ts';
import { recordGiven } from './given.ts';
import * as limits from './limits.ts';
import type { GussetModel } from './model.ts';
import { notes, waivedNote } from './notes.ts';
import { quantitiesOf } from './quantities.ts';
import { AngleRules } from './rules-angle.ts';
import { fixedRejections } from './rules-fixed.ts';
import { GussetView } from './view.ts';

/** The steepest load angle either way, radians. */
export const STEEPEST = (80 * Math.PI) / 180;

/** A gusset plate with everything that the load angle does not change worked out. */
export class GussetDetail implements PreparedDetail {
  readonly limitStates: readonly LimitStateInfo[];
  readonly rejections: readonly Rejection[];
  readonly quantities: Quantities;
  private readonly view: GussetView;
  private readonly rules: AngleRules;
  private readonly sound: boolean;
  private readonly scratch = new Float64Array(limits.limitStates.length);
  private readonly oneBolt: number;
  private readonly boltShear: number;
  private readonly memberBearing: { readonly tension: number; readonly compression: number };
  private readonly memberBlock: number;
  private readonly memberNet: number;
  private readonly memberGross: number;

  constructor(private readonly model: GussetModel) {
    const m = model;
    this.limitStates = limits.limitStates.map(({ id, code, title, part, clause }) => ({
      id,
      code,
      title,
      part,
      clause: m.basis.clauses[clause],
    }));
    this.view = new GussetView(m);
    this.rules = new AngleRules(m);
    this.rejections = fixedRejections(m);
    this.sound = this.rejections.length === 0;
    this.quantities = quantitiesOf(m);
    this.oneBolt = m.basis.boltShear(m.bolt, null);
    this.boltShear = limits.boltShear(m, null);
    this.memberBearing = {
      tension: limits.memberBearing(m, true, this.oneBolt, null),
      compression: limits.memberBearing(m, false, this.oneBolt, null),
    };
    this.memberBlock = limits.memberBlock(m, true, null);
    this.memberNet = limits.memberNet(m, true, null);
    this.memberGross = limits.memberGross(m, null);
  }

  at(theta: number, sense: Sense, out: Float64Array): number {
    if (!(Math.abs(theta) <= STEEPEST + 1e-9)) return NOT_COVERED;
    if (!this.sound) return NOT_PERMITTED;
    this.view.turn(theta, sense === 'tension');
    if (!this.rules.hold(this.view, null)) return NOT_PERMITTED;
    this.evaluate(out);
    return governing(out, limits.limitStates.length);
  }

  outcome(theta: number, sense: Sense): CellOutcome {
    const index = this.at(theta, sense, this.scratch);
    if (index === NOT_COVERED) {
      return { status: 'not-covered', reason: 'The load angle must lie between −80° and 80°' };
    }
    if (index === NOT_PERMITTED) {
      return { status: 'not-permitted', rejections: this.rejectionsAt(theta, sense) };
    }
    return { status: 'capacity', capacity: this.scratch[index] ?? 0, governing: index };
  }

  record(theta: number, sense: Sense): SheetSection[] {
    const rec = new SheetRecorder();
    const outcome = this.outcome(theta, sense);
    if (outcome.status === 'not-covered') {
      recordNotCovered(outcome.reason, rec);
      return rec.sections;
    }
    this.view.turn(theta, sense === 'tension');
    recordGiven(this.model, this.view, theta, rec);
    if (outcome.status === 'capacity') {
      this.recordLimitStates(rec);
      const { info } = this.model.basis;
      recordResult(this.limitStates[outcome.governing], info.resultLabel, outcome.capacity, rec);
    } else recordRejections(outcome.rejections, rec);
    recordNotes(this.model.fitWaived ? [waivedNote, ...notes] : notes, this.model.basis, rec);
    return rec.sections;
  }

  geometry(theta: number): DetailGeometry {
    return geometryOf(this.model, theta);
  }

  private rejectionsAt(theta: number, sense: Sense): readonly Rejection[] {
    const found = new Rejections();
    this.view.turn(theta, sense === 'tension');
    this.rules.hold(this.view, found);
    // The numbers of this angle stand in place of those that hold at every angle.
    const lasting = this.rejections.filter(({ rule }) => !found.list.some((other) => other.rule === rule));
    return [...lasting, ...found.list];
  }

  /** The hot path: what the angle does not change was worked out before. */
  private evaluate(out: Float64Array): void {
    const { model, view, oneBolt } = this;
    const { tension } = view;
    out[0] = limits.weldMetal(model, view, null);
    out[1] = limits.weldBaseMetal(model, view, null);
    out[2] = limits.plateSection(model, view, null);
    out[3] = this.boltShear;
    out[4] = limits.gussetBearing(model, view, oneBolt, null);
    out[5] = model.basis.boltByBolt
      ? limits.sharedBearing(model, view, null)
      : this.memberBearing[tension ? 'tension' : 'compression'];
    out[6] = limits.gussetBlock(model, view, null);
    out[7] = tension ? this.memberBlock : Infinity;
    out[8] = limits.whitmore(model, view, null);
    out[9] = limits.gussetBuckling(model, view, null);
    out[10] = tension ? this.memberNet : Infinity;
    out[11] = this.memberGross;
  }

  /** The same functions, each writing its working under its own heading. */
  private recordLimitStates(rec: NonNullable<Rec>): void {
    const { model, view, oneBolt } = this;
    const { tension } = view;
    const work: readonly ((rec: Rec) => number)[] = [
      (r) => limits.weldMetal(model, view, r),
      (r) => limits.weldBaseMetal(model, view, r),
      (r) => limits.plateSection(model, view, r),
      (r) => limits.boltShear(model, r),
      (r) => limits.gussetBearing(model, view, oneBolt, r),
      (r) =>
        model.basis.boltByBolt
          ? limits.sharedBearing(model, view, r)
          : limits.memberBearing(model, tension, oneBolt, r),
      (r) => limits.gussetBlock(model, view, r),
      (r) => limits.memberBlock(model, tension, r),
      (r) => limits.whitmore(model, view, r),
      (r) => limits.gussetBuckling(model, view, r),
      (r) => limits.memberNet(model, tension, r),
      (r) => limits.memberGross(model, r),
    ];
    recordLimitStates(this.limitStates, work, rec);
  }
}
