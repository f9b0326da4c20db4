import type { Basis, EdgeFinish } from '../../standards/basis.ts';
import type { Rejections } from '../rules.ts';
import { rulesOf } from '../rules.ts';
import { type BeamEnd, isCoped } from './beam.ts';
import { type BeamRuleId, beamRules } from './rule-list.ts';

const PRACTICE = 'common practice';
const GEOMETRY = 'geometry of the detail';

/** Radius that a nut needs beside its bolt, by bolt diameter: half its width across corners (from memory). */
const NUT_RADIUS = 0.85;

/** Least share of the beam's depth that copes leave: notches to half of the depth (common practice, from memory). */
const LEAST_LEFT = 0.5;

/** What the rules of the beam's end ask of the bolted part and of the family's choices. mm. */
export interface BeamRuleSetting {
  readonly basis: Basis;
  readonly beam: BeamEnd;
  readonly d: number;
  readonly holeDiameter: number;
  readonly rows: number;
  readonly columns: number;
  readonly finish: EdgeFinish;
  /** The thinner outside part of the lap. */
  readonly outerThickness: number;
  readonly exposed: boolean;
  /** Of the plate or cleat, beyond the outer rows of bolts. */
  readonly partAbove: number;
  readonly partBelow: number;
  readonly fitWaived: boolean;
}

const ruleOf = rulesOf<BeamRuleId>(beamRules);

/** Checks the beam's end: its copes, its bolts inside the web, and the bolted part between its fillets. */
export function checkBeamEnd(s: BeamRuleSetting, found: Rejections): void {
  const { beam } = s;
  if (beam.steelMissing) {
    const rule = ruleOf('beam-steel-thickness', 'product standard of the steel', 'mm', false);
    const thickness = beam.web.thickness;
    found.add(rule, thickness, 0, `${rule.subject}: the grade has no strength at ${thickness} mm`);
  }
  checkCopes(beam, found);
  checkWebEnd(s, found);
  checkSide(s, isCoped(beam.top), beam.edges.above, s.partAbove, found);
  checkSide(s, isCoped(beam.bottom), beam.edges.below, s.partBelow, found);
}

function checkCopes(beam: BeamEnd, found: Rejections): void {
  const { depth, flangeThickness, rootRadius } = beam.section;
  for (const cope of [beam.top, beam.bottom]) {
    if (cope.length > 0 !== cope.depth > 0) {
      const message = `Cope: length ${cope.length} mm and depth ${cope.depth} mm; both or neither`;
      found.add(ruleOf('cope-whole', GEOMETRY, 'mm'), Math.min(cope.length, cope.depth), 1, message);
    } else if (isCoped(cope)) {
      found.check(ruleOf('cope-depth-least', GEOMETRY, 'mm'), cope.depth, flangeThickness + rootRadius);
    }
  }
  if (isCoped(beam.top) || isCoped(beam.bottom)) {
    found.check(ruleOf('cope-web-left', PRACTICE, 'mm'), beam.depthLeft, LEAST_LEFT * depth);
  }
}

function checkWebEnd(s: BeamRuleSetting, found: Rejections): void {
  const { detailing } = s.basis;
  const { end, edge } = detailing.clauses;
  const least = detailing.leastEnd(s.d, s.holeDiameter, s.finish, s.columns);
  found.check(ruleOf('web-end-least', end, 'mm'), s.beam.edges.near, least);
  const most = detailing.greatestEdge(s.outerThickness, s.exposed);
  found.check(ruleOf('web-end-greatest', edge, 'mm', false), s.beam.edges.near, most);
}

/** Above or below: a coped edge is a free edge, a flange must leave room for nuts and for the bolted part. */
function checkSide(
  s: BeamRuleSetting,
  coped: boolean,
  toEdge: number,
  partBeyond: number,
  found: Rejections,
): void {
  const { detailing } = s.basis;
  const { flangeThickness, rootRadius } = s.beam.section;
  if (coped) {
    const least = detailing.leastEnd(s.d, s.holeDiameter, s.finish, s.rows);
    found.check(ruleOf('web-edge-least', detailing.clauses.edge, 'mm'), toEdge, least);
    return;
  }
  const clear = toEdge - flangeThickness;
  found.check(ruleOf('web-hole-inside', GEOMETRY, 'mm'), clear, s.holeDiameter / 2);
  if (s.fitWaived) return;
  const flat = clear - rootRadius;
  found.check(ruleOf('web-root-clear', PRACTICE, 'mm'), flat, NUT_RADIUS * s.d);
  found.check(ruleOf('part-inside-web', PRACTICE, 'mm'), flat - partBeyond, 0);
}
