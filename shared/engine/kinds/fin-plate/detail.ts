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
import { webShearGross, webShearNet } from '../beam-end/strengths.ts';
import { partBearing, webBearing, webBoltShear } from '../beam-end/web-bolts.ts';
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
import type { FinPlateModel } from './model.ts';
import { notesOf } from './notes.ts';
import { quantitiesOf } from './quantities.ts';
import { rejectionsOf } from './rules.ts';
import { plateShearGross, plateShearNet, plateTension, Strengths } from './strengths.ts';

/** The steepest load angle either way, radians. */
const STEEPEST = Math.PI / 2;

/** A component of a unit resultant below this is none: the cosine of 90 degrees is not quite 0. */
const NONE = 1e-12;

const component = (value: number): number => (Math.abs(value) < NONE ? 0 : value);

/** A fin plate with everything that the load angle does not change worked out. */
export class FinPlateDetail implements PreparedDetail {
  readonly limitStates: readonly LimitStateInfo[];
  readonly rejections: readonly Rejection[];
  readonly quantities: Quantities;
  private readonly sound: boolean;
  private readonly strengths: Strengths;
  private readonly scratch = new Float64Array(limits.limitStates.length);

  constructor(private readonly model: FinPlateModel) {
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
    this.strengths = new Strengths(model);
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
          : 'A push towards the support is not covered: the plate has no buckling model for it';
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
    const { model, strengths: s } = this;
    out[0] = limits.weldMetal(model, cos, sin, null);
    out[1] = limits.weldBaseMetal(model, cos, sin, null);
    out[2] = limits.plateAtWeld(model, cos, sin, null);
    out[3] = limits.plateAtBolts(model, s, cos, sin, null);
    out[4] = byComponent(s.plateShearGross, sin);
    out[5] = byComponent(s.plateShearNet, sin);
    out[6] = byComponent(s.plateTension, cos);
    out[7] = limits.plateBlock(s, cos, sin, null);
    out[8] = limits.plateStability(model, s, sin, null);
    out[9] = webBoltShear(model, cos, sin, null);
    out[10] = partBearing(model, model.plateBearing, cos, sin, null);
    out[11] = webBearing(model, cos, sin, null);
    out[12] = byComponent(s.web.shearGross, sin);
    out[13] = byComponent(s.web.shearNet, sin);
    out[14] = s.web.block(cos, sin, null);
    out[15] = s.web.pull(cos, sin, null);
    out[16] = limits.copedSection(model, cos, sin, null);
  }

  /** The same functions in the same order, each writing its working. */
  private work(cos: number, sin: number): readonly ((rec: Rec) => number)[] {
    const { model, strengths: s } = this;
    const { basis, beam, group } = model;
    return [
      (r) => limits.weldMetal(model, cos, sin, r),
      (r) => limits.weldBaseMetal(model, cos, sin, r),
      (r) => limits.plateAtWeld(model, cos, sin, r),
      (r) => limits.plateAtBolts(model, s, cos, sin, r),
      (r) => byComponent(plateShearGross(model, r), sin),
      (r) => byComponent(plateShearNet(model, r), sin),
      (r) => byComponent(plateTension(model, r), cos),
      (r) => limits.plateBlock(s, cos, sin, r),
      (r) => limits.plateStability(model, s, sin, r),
      (r) => webBoltShear(model, cos, sin, r),
      (r) => partBearing(model, model.plateBearing, cos, sin, r),
      (r) => webBearing(model, cos, sin, r),
      (r) => byComponent(webShearGross(basis, beam, r), sin),
      (r) => byComponent(webShearNet(basis, beam, group, r), sin),
      (r) => s.web.block(cos, sin, r),
      (r) => s.web.pull(cos, sin, r),
      (r) => limits.copedSection(model, cos, sin, r),
    ];
  }
}
