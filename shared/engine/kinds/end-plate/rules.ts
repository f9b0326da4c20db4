import type { Rejection } from '../../types.ts';
import { noSteel } from '../parts.ts';
import { Rejections } from '../rules.ts';
import type { EndPlateModel } from './model.ts';
import { type RuleId, ruleOf } from './rule-list.ts';

const PRACTICE = 'common practice';
const GEOMETRY = 'geometry of the detail';

/** A bolt does not enter a hole that is less than this larger, mm (common practice, from memory). */
const LEAST_HOLE_CLEARANCE = 0.5;

/** Room for a spanner beside a bolt, by bolt diameter, from its centre to a face or a weld (common practice, from memory). */
const SPANNER_ROOM = 1.25;

/** Usual cross centres of simple end plates, mm: 90 to 140 (common practice, from memory). */
const CROSS_CENTRES = { least: 90, most: 140 };

/** Least height of the plate by depth of the beam (Steel Buildings in Europe, Part 5, 2.1). */
const LEAST_HEIGHT = 0.6;

/** Every rule of an end plate: no load angle changes them. */
export function rejectionsOf(m: EndPlateModel): readonly Rejection[] {
  const found = new Rejections();
  checkStrengths(m, found);
  checkBolts(m, found);
  checkEdges(m, found);
  checkWeld(m, found);
  checkPlace(m, found);
  checkFit(m, found);
  checkPractice(m, found);
  return found.list;
}

function checkStrengths(m: EndPlateModel, found: Rejections): void {
  const missing = (id: RuleId, thickness: number) => {
    const rule = ruleOf(id, 'product standard of the steel', 'mm', false);
    found.add(rule, thickness, 0, `${rule.subject}: the grade has no strength at ${thickness} mm`);
  };
  if (m.plate === noSteel) missing('plate-steel-thickness', m.thickness);
  else if (m.support === noSteel) missing('support-steel-thickness', m.supportThickness || m.thickness);
  if (m.beamSteel === noSteel) missing('beam-steel-thickness', m.section.webThickness);
  if (m.gradeMissing) {
    const { d } = m.bolt.size;
    const message = `Bolt grade: it has no strength at a diameter of ${d} mm`;
    found.add(ruleOf('bolt-grade-size', 'product standard of the bolt', 'mm', false), d, 0, message);
  }
}

function checkBolts(m: EndPlateModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { d } = m.bolt.size;
  const d0 = m.bolt.holeDiameter;
  found.check(ruleOf('hole-least', detailing.clauses.hole, 'mm'), d0, d + LEAST_HOLE_CLEARANCE);
  found.check(ruleOf('hole-greatest', detailing.clauses.hole, 'mm', false), d0, detailing.greatestHole(d));
  const clause = detailing.clauses.pitch;
  found.check(ruleOf('gauge-least', clause, 'mm'), m.crossCentres, detailing.leastGauge(d, d0));
  if (m.group.rows === 1) return;
  found.check(ruleOf('pitch-least', clause, 'mm'), m.group.pitch, detailing.leastPitch(d, d0));
  const most = detailing.greatestPitch(m.thickness);
  found.check(ruleOf('pitch-greatest', clause, 'mm', false), m.group.pitch, most);
}

function checkEdges(m: EndPlateModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { clauses } = detailing;
  const { d } = m.bolt.size;
  const d0 = m.bolt.holeDiameter;
  const most = detailing.greatestEdge(m.thickness, m.values.choice('exposure') === 'exposed');
  const end = detailing.leastEnd(d, d0, m.finish, m.group.rows);
  found.check(ruleOf('plate-end-least', clauses.end, 'mm'), m.endDistance, end);
  found.check(ruleOf('plate-end-greatest', clauses.edge, 'mm', false), m.endDistance, most);
  const edge = detailing.leastEdge(d, d0, m.finish);
  found.check(ruleOf('plate-edge-least', clauses.edge, 'mm'), m.edgeDistance, edge);
  found.check(ruleOf('plate-edge-greatest', clauses.edge, 'mm', false), m.edgeDistance, most);
}

function checkWeld(m: EndPlateModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { weldSize, weldLength } = detailing.clauses;
  const web = m.section.webThickness;
  const least = detailing.leastWeldLeg(Math.max(m.thickness, web), Math.min(m.thickness, web));
  found.check(ruleOf('weld-leg-least', weldSize, 'mm'), m.weldLeg, least);
  const throat = m.weldLeg / Math.SQRT2;
  found.check(ruleOf('weld-throat-least', weldSize, 'mm'), throat, detailing.leastWeldThroat());
  const length = detailing.leastWeldLength(m.weldLeg);
  found.check(ruleOf('weld-length-least', weldLength, 'mm'), m.weldLength, length);
}

/** Where the plate and its bolts stand to the beam. */
function checkPlace(m: EndPlateModel, found: Rejections): void {
  const { depth, flangeThickness, rootRadius } = m.section;
  const above = m.topToRow;
  const below = depth - above - (m.group.rows - 1) * m.group.pitch;
  const inside = flangeThickness + m.bolt.holeDiameter / 2;
  found.check(ruleOf('row-inside-beam', GEOMETRY, 'mm'), Math.min(above, below), inside);
  if (m.flush) {
    found.check(ruleOf('plate-flush', GEOMETRY, 'mm'), m.height, depth);
    return;
  }
  const clear = Math.min(above, below) - m.endDistance;
  found.check(ruleOf('plate-inside-web', GEOMETRY, 'mm'), clear, flangeThickness + rootRadius);
}

function checkFit(m: EndPlateModel, found: Rejections): void {
  const clear = m.weldLeg + m.bolt.holeDiameter / 2;
  found.check(ruleOf('hole-clear-of-weld', GEOMETRY, 'mm'), m.boltToWeb, clear);
  if (m.fitWaived) return;
  const room = SPANNER_ROOM * m.bolt.size.d;
  found.check(ruleOf('spanner-room', PRACTICE, 'mm'), m.boltToWeb, m.weldLeg + room);
  const { depth, flangeThickness } = m.section;
  const below = depth - m.topToRow - (m.group.rows - 1) * m.group.pitch;
  const toFlange = Math.min(m.topToRow, below) - flangeThickness;
  found.check(ruleOf('spanner-room-flange', PRACTICE, 'mm'), toFlange, room);
}

/** A plate that yields before its bolts do: t ≤ d/1.9 √(f_ub/f_y) (Steel Buildings in Europe, Part 5, 2.2). */
function checkPractice(m: EndPlateModel, found: Rejections): void {
  if (m.practiceWaived) return;
  const { d } = m.bolt.size;
  const thick = (d / 1.9) * Math.sqrt(m.bolt.grade.fub / m.plate.fy);
  found.check(ruleOf('ductile-thickness', PRACTICE, 'mm', false), m.thickness, thick);
  const { least, most } = CROSS_CENTRES;
  found.check(ruleOf('gauge-practice-least', PRACTICE, 'mm'), m.crossCentres, least);
  found.check(ruleOf('gauge-practice-greatest', PRACTICE, 'mm', false), m.crossCentres, most);
  found.check(ruleOf('plate-height-least', PRACTICE, 'mm'), m.height, LEAST_HEIGHT * m.section.depth);
}
