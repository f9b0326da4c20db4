import { byComponent } from '../../limit-states/resultant.ts';
import { blocksTogether } from '../../limit-states/upright-block.ts';
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
import { copedSectionCapacity } from '../beam-end/coped-section.ts';
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
import * as cleat from './cleat-limits.ts';
import { geometryOf } from './geometry.ts';
import { recordGiven } from './given.ts';
import { limitStates } from './limit-list.ts';
import type { CleatModel } from './model.ts';
import { notesOf } from './notes.ts';
import { quantitiesOf } from './quantities.ts';
import { rejectionsOf } from './rules.ts';
import { Strengths } from './strengths.ts';
import * as support from './support-limits.ts';

/** The steepest load angle either way, radians. */
const STEEPEST = Math.PI / 2;

/** A component of a unit resultant below this is none: the cosine of 90 degrees is not quite 0. */
const NONE = 1e-12;

const component = (value: number): number => (Math.abs(value) < NONE ? 0 : value);

/** Angle cleats with everything that the load angle does not change worked out. */
export class AngleCleatsDetail implements PreparedDetail {
  readonly limitStates: readonly LimitStateInfo[];
  readonly rejections: readonly Rejection[];
  readonly quantities: Quantities;
  /** Null where a rule is broken: such a detail has no strengths. */
  private readonly strengths: Strengths | null;
  private readonly scratch = new Float64Array(limitStates.length);

  constructor(private readonly model: CleatModel) {
    this.limitStates = limitStates.map(({ id, code, title, part, clause }) => ({
      id,
      code,
      title,
      part,
      clause: model.basis.clauses[clause],
    }));
    this.rejections = rejectionsOf(model);
    this.quantities = quantitiesOf(model);
    this.strengths = this.rejections.length === 0 ? new Strengths(model) : null;
  }

  at(theta: number, sense: Sense, out: Float64Array): number {
    if (sense !== 'tension' || !(Math.abs(theta) <= STEEPEST + 1e-9)) return NOT_COVERED;
    const cos = component(Math.cos(theta));
    if (cos > 0 && !this.model.pullCovered) return NOT_COVERED;
    if (this.strengths === null) return NOT_PERMITTED;
    this.evaluate(this.strengths, cos, component(Math.sin(theta)), out);
    return governing(out, limitStates.length);
  }

  outcome(theta: number, sense: Sense): CellOutcome {
    const index = this.at(theta, sense, this.scratch);
    if (index === NOT_COVERED) return { status: 'not-covered', reason: this.uncovered(theta, sense) };
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
    if (outcome.status === 'capacity' && this.strengths !== null) {
      recordLimitStates(this.limitStates, this.work(this.strengths, cos, sin), rec);
      const { resultLabel } = this.model.basis.info;
      recordResult(this.limitStates[outcome.governing], resultLabel, outcome.capacity, rec);
    } else recordRejections(this.rejections, rec);
    recordNotes(notesOf(this.model), this.model.basis, rec);
    return rec.sections;
  }

  geometry(theta: number): DetailGeometry {
    return geometryOf(this.model, theta);
  }

  private uncovered(theta: number, sense: Sense): string {
    if (sense !== 'tension') return 'A push towards the support is not covered';
    if (!(Math.abs(theta) <= STEEPEST + 1e-9)) return 'The load angle must lie between −90° and 90°';
    return 'A pull on a single welded cleat whose heel may turn is not covered: the weld would have to take the moment';
  }

  /** The hot path: what the angle does not change was worked out before. */
  private evaluate(s: Strengths, cos: number, sin: number, out: Float64Array): void {
    const { model: m } = this;
    out[0] = webBoltShear(m, cos, sin, null);
    out[1] = partBearing(m, m.cleatBearing, cos, sin, null);
    out[2] = webBearing(m, cos, sin, null);
    out[3] = byComponent(s.grossShear, sin);
    out[4] = byComponent(s.netShear, sin);
    out[5] = byComponent(s.tension, cos);
    out[6] = blocksTogether(s.webLegAlong, s.webLegAcross, cos, sin, null);
    out[7] = byComponent(s.outstandingLegBlock, sin);
    out[8] = cleat.sectionAtHeel(m, cos, sin, null);
    out[9] = cleat.sectionAtBolts(m, s.ruptureStress, cos, sin, null);
    out[10] = support.legBendingWithShear(s.legBending, s.grossShear, cos, sin, null);
    out[11] = byComponent(s.supportBoltShear, sin);
    out[12] = support.supportBoltsPulled(m, cos, null);
    out[13] = support.supportBoltsTogether(m, cos, sin, null);
    out[14] = byComponent(s.outstandingLegBearing, sin);
    out[15] = byComponent(s.supportBearing, sin);
    out[16] = support.toeWeld(m, 'metal', cos, sin, null);
    out[17] = support.toeWeld(m, 'base', cos, sin, null);
    out[18] = byComponent(s.web.shearGross, sin);
    out[19] = byComponent(s.web.shearNet, sin);
    out[20] = s.web.block(cos, sin, null);
    out[21] = s.web.pull(cos, sin, null);
    out[22] = copedSection(m, cos, sin, null);
  }

  /** The same functions in the same order, each writing its working. */
  private work(s: Strengths, cos: number, sin: number): readonly ((rec: Rec) => number)[] {
    const { model: m } = this;
    const { basis, beam, group } = m;
    return [
      (r) => webBoltShear(m, cos, sin, r),
      (r) => partBearing(m, m.cleatBearing, cos, sin, r),
      (r) => webBearing(m, cos, sin, r),
      (r) => byComponent(cleat.grossShear(m, r), sin),
      (r) => byComponent(cleat.netShear(m, r), sin),
      (r) => byComponent(cleat.tension(m, r), cos),
      (r) => blocksTogether(cleat.webLegBlockAlong(m, r), cleat.webLegBlockAcross(m, r), cos, sin, r),
      (r) => byComponent(cleat.outstandingLegBlock(m, r), sin),
      (r) => cleat.sectionAtHeel(m, cos, sin, r),
      (r) => cleat.sectionAtBolts(m, s.ruptureStress, cos, sin, r),
      (r) => support.legBendingWithShear(support.legBending(m, r), s.grossShear, cos, sin, r),
      (r) => byComponent(support.supportBoltShear(m, r), sin),
      (r) => support.supportBoltsPulled(m, cos, r),
      (r) => support.supportBoltsTogether(m, cos, sin, r),
      (r) => byComponent(support.outstandingLegBearing(m, r), sin),
      (r) => byComponent(support.supportBearing(m, r), sin),
      (r) => support.toeWeld(m, 'metal', cos, sin, r),
      (r) => support.toeWeld(m, 'base', cos, sin, r),
      (r) => byComponent(webShearGross(basis, beam, r), sin),
      (r) => byComponent(webShearNet(basis, beam, group, r), sin),
      (r) => s.web.block(cos, sin, r),
      (r) => s.web.pull(cos, sin, r),
      (r) => copedSection(m, cos, sin, r),
    ];
  }
}

/** Pull, shear and bending of the beam where its copes begin, N; Infinity where it has none. */
function copedSection(m: CleatModel, cos: number, sin: number, rec: Rec): number {
  if (m.coped === null) return Infinity;
  return copedSectionCapacity(m.beam, m.coped, m.lines.nearest, cos, sin, rec);
}
