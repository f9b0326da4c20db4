import { byComponent } from '../../limit-states/resultant.ts';
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
import { geometryOf } from './geometry.ts';
import { recordGiven } from './given.ts';
import * as limits from './limits.ts';
import type { EndPlateModel } from './model.ts';
import { notesOf } from './notes.ts';
import { quantitiesOf } from './quantities.ts';
import { rejectionsOf } from './rules.ts';

/** The steepest load angle either way, radians. */
const STEEPEST = Math.PI / 2;

/** A component of a unit resultant below this is none: the cosine of 90 degrees is not quite 0. */
const NONE = 1e-12;

const component = (value: number): number => (Math.abs(value) < NONE ? 0 : value);

/** An end plate with everything that the load angle does not change worked out. */
export class EndPlateDetail implements PreparedDetail {
  readonly limitStates: readonly LimitStateInfo[];
  readonly rejections: readonly Rejection[];
  readonly quantities: Quantities;
  private readonly sound: boolean;
  private readonly scratch = new Float64Array(limits.limitStates.length);
  /** Strengths against one component, in the order of the limit states; 0 for those that the angle changes. */
  private readonly fixed: Float64Array;

  constructor(private readonly model: EndPlateModel) {
    this.limitStates = limits.limitStates.map(({ id, code, title, part, clause }) => ({
      id,
      code,
      title,
      part,
      clause: model.basis.clauses[clause],
    }));
    this.rejections = rejectionsOf(model);
    this.sound = this.rejections.length === 0;
    this.quantities = quantitiesOf(model);
    this.fixed = Float64Array.of(
      0,
      0,
      limits.plateBending(model, null),
      limits.plateShearGross(model, null),
      limits.plateShearNet(model, null),
      limits.plateBlock(model, null),
      limits.boltShear(model, null),
      0,
      0,
      limits.plateBearing(model, null),
      limits.supportBearing(model, null),
      limits.webShear(model, null),
      limits.webTension(model, null),
    );
  }

  at(theta: number, sense: Sense, out: Float64Array): number {
    if (sense !== 'tension' || !(Math.abs(theta) <= STEEPEST + 1e-9)) return NOT_COVERED;
    if (!this.sound) return NOT_PERMITTED;
    this.evaluate(component(Math.cos(theta)), component(Math.sin(theta)), out);
    return governing(out, limits.limitStates.length);
  }

  outcome(theta: number, sense: Sense): CellOutcome {
    const index = this.at(theta, sense, this.scratch);
    if (index === NOT_COVERED) {
      const reason =
        sense === 'tension'
          ? 'The load angle must lie between −90° and 90°'
          : 'A push towards the support is not covered';
      return { status: 'not-covered', reason };
    }
    if (index === NOT_PERMITTED) return { status: 'not-permitted', rejections: this.rejections };
    return { status: 'capacity', capacity: this.scratch[index] ?? 0, governing: index };
  }

  record(theta: number, sense: Sense): SheetSection[] {
    const rec = new SheetRecorder();
    const outcome = this.outcome(theta, sense);
    if (outcome.status === 'not-covered') {
      recordNotCovered(outcome.reason, rec);
      return rec.sections;
    }
    const cos = component(Math.cos(theta));
    const sin = component(Math.sin(theta));
    recordGiven(this.model, theta, cos, sin, rec);
    if (outcome.status === 'capacity') {
      recordLimitStates(this.limitStates, this.work(cos, sin), rec);
      const { resultLabel } = this.model.basis.info;
      recordResult(this.limitStates[outcome.governing], resultLabel, outcome.capacity, rec);
    } else recordRejections(outcome.rejections, rec);
    recordNotes(notesOf(this.model), this.model.basis, rec);
    return rec.sections;
  }

  geometry(theta: number): DetailGeometry {
    return geometryOf(this.model, theta);
  }

  /** The hot path: what the angle does not change was worked out before. */
  private evaluate(cos: number, sin: number, out: Float64Array): void {
    const { model, fixed } = this;
    out[0] = limits.weldMetal(model, cos, sin, null);
    out[1] = limits.weldBaseMetal(model, cos, sin, null);
    out[2] = byComponent(fixed[2]!, cos);
    out[3] = byComponent(fixed[3]!, sin);
    out[4] = byComponent(fixed[4]!, sin);
    out[5] = byComponent(fixed[5]!, sin);
    out[6] = byComponent(fixed[6]!, sin);
    out[7] = limits.boltsPulled(model, cos, null);
    out[8] = limits.boltsTogether(model, cos, sin, null);
    out[9] = byComponent(fixed[9]!, sin);
    out[10] = byComponent(fixed[10]!, sin);
    out[11] = byComponent(fixed[11]!, sin);
    out[12] = byComponent(fixed[12]!, cos);
    out[13] = limits.webSection(model, cos, sin, null);
  }

  /** The same functions in the same order, each writing its working. */
  private work(cos: number, sin: number): readonly ((rec: Rec) => number)[] {
    const { model } = this;
    return [
      (r) => limits.weldMetal(model, cos, sin, r),
      (r) => limits.weldBaseMetal(model, cos, sin, r),
      (r) => byComponent(limits.plateBending(model, r), cos),
      (r) => byComponent(limits.plateShearGross(model, r), sin),
      (r) => byComponent(limits.plateShearNet(model, r), sin),
      (r) => byComponent(limits.plateBlock(model, r), sin),
      (r) => byComponent(limits.boltShear(model, r), sin),
      (r) => limits.boltsPulled(model, cos, r),
      (r) => limits.boltsTogether(model, cos, sin, r),
      (r) => byComponent(limits.plateBearing(model, r), sin),
      (r) => byComponent(limits.supportBearing(model, r), sin),
      (r) => byComponent(limits.webShear(model, r), sin),
      (r) => byComponent(limits.webTension(model, r), cos),
      (r) => limits.webSection(model, cos, sin, r),
    ];
  }
}
