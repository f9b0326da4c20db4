import type { Rejection } from '../../types.ts';
import { checkBeamEnd } from '../beam-end/rules.ts';
import { noSteel } from '../parts.ts';
import { Rejections } from '../rules.ts';
import type { FinPlateModel } from './model.ts';
import { type RuleId, ruleOf } from './rule-list.ts';

const PRACTICE = 'common practice';
const GEOMETRY = 'geometry of the detail';

/** A bolt does not enter a hole that is less than this larger, mm (common practice, from memory). */
const LEAST_HOLE_CLEARANCE = 0.5;

/** Room for a spanner beside a bolt, by bolt diameter, from its centre to a face or a weld (common practice, from memory). */
const SPANNER_ROOM = 1.25;

/** Greatest thickness of the plate by bolt diameter (Steel Buildings in Europe, Part 5, 3.1). */
const DUCTILE = 0.5;

/** Least height of the plate by depth of the beam (Steel Buildings in Europe, Part 5, 3.1). */
const LEAST_HEIGHT = 0.6;

/** Every rule of a fin plate: no load angle changes them. */
export function rejectionsOf(m: FinPlateModel): readonly Rejection[] {
  const found = new Rejections();
  checkStrengths(m, found);
  checkBolts(m, found);
  checkPlateEdges(m, found);
  checkWeld(m, found);
  checkFit(m, found);
  checkPractice(m, found);
  checkBeamEnd(
    {
      basis: m.basis,
      beam: m.beam,
      d: m.bolt.size.d,
      holeDiameter: m.bolt.holeDiameter,
      rows: m.group.rows,
      columns: m.group.columns,
      finish: m.finish,
      outerThickness: outerThickness(m),
      exposed: isExposed(m),
      partAbove: m.endDistance,
      partBelow: m.endDistance,
      fitWaived: m.fitWaived,
    },
    found,
  );
  return found.list;
}

function checkStrengths(m: FinPlateModel, found: Rejections): void {
  const missing = (id: RuleId, thickness: number) => {
    const rule = ruleOf(id, 'product standard of the steel', 'mm', false);
    found.add(rule, thickness, 0, `${rule.subject}: the grade has no strength at ${thickness} mm`);
  };
  if (m.plate === noSteel) missing('plate-steel-thickness', m.thickness);
  else if (m.support === noSteel) missing('support-steel-thickness', m.supportThickness || m.thickness);
  if (m.gradeMissing) {
    const { d } = m.bolt.size;
    const message = `Bolt grade: it has no strength at a diameter of ${d} mm`;
    found.add(ruleOf('bolt-grade-size', 'product standard of the bolt', 'mm', false), d, 0, message);
  }
}

function checkBolts(m: FinPlateModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { rows, columns, pitch, gauge } = m.group;
  const { d } = m.bolt.size;
  const d0 = m.bolt.holeDiameter;
  found.check(ruleOf('bolt-count', PRACTICE, ''), rows * columns, 2);
  found.check(ruleOf('hole-least', detailing.clauses.hole, 'mm'), d0, d + LEAST_HOLE_CLEARANCE);
  found.check(ruleOf('hole-greatest', detailing.clauses.hole, 'mm', false), d0, detailing.greatestHole(d));
  const clause = detailing.clauses.pitch;
  const most = detailing.greatestPitch(outerThickness(m));
  if (rows > 1) {
    found.check(ruleOf('pitch-least', clause, 'mm'), pitch, detailing.leastPitch(d, d0));
    found.check(ruleOf('pitch-greatest', clause, 'mm', false), pitch, most);
  }
  if (columns > 1) {
    found.check(ruleOf('gauge-least', clause, 'mm'), gauge, detailing.leastGauge(d, d0));
    found.check(ruleOf('gauge-greatest', clause, 'mm', false), gauge, most);
  }
}

function checkPlateEdges(m: FinPlateModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { clauses } = detailing;
  const { d } = m.bolt.size;
  const d0 = m.bolt.holeDiameter;
  const most = detailing.greatestEdge(outerThickness(m), isExposed(m));
  const end = detailing.leastEnd(d, d0, m.finish, m.group.rows);
  found.check(ruleOf('plate-end-least', clauses.end, 'mm'), m.endDistance, end);
  found.check(ruleOf('plate-end-greatest', clauses.edge, 'mm', false), m.endDistance, most);
  const edge = detailing.leastEnd(d, d0, m.finish, m.group.columns);
  found.check(ruleOf('plate-edge-least', clauses.edge, 'mm'), m.edgeDistance, edge);
  found.check(ruleOf('plate-edge-greatest', clauses.edge, 'mm', false), m.edgeDistance, most);
}

function checkWeld(m: FinPlateModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { weldSize, weldLength } = detailing.clauses;
  const support = m.supportThickness === 0 ? m.thickness : m.supportThickness;
  const least = detailing.leastWeldLeg(Math.max(m.thickness, support), Math.min(m.thickness, support));
  found.check(ruleOf('weld-leg-least', weldSize, 'mm'), m.weldLeg, least);
  const throat = m.weldLeg / Math.SQRT2;
  found.check(ruleOf('weld-throat-least', weldSize, 'mm'), throat, detailing.leastWeldThroat());
  const length = detailing.leastWeldLength(m.weldLeg);
  found.check(ruleOf('weld-length-least', weldLength, 'mm'), m.countedWeld, length);
  if (m.values.choice('weld_size') === 'as_designed') return;
  found.check(ruleOf('weld-full-strength', PRACTICE, 'mm'), m.weldLeg, m.fullStrengthLeg);
}

function checkFit(m: FinPlateModel, found: Rejections): void {
  const clear = m.weldLeg + m.bolt.holeDiameter / 2;
  found.check(ruleOf('hole-clear-of-weld', GEOMETRY, 'mm'), m.firstColumn, clear);
  if (m.fitWaived) return;
  const room = m.weldLeg + SPANNER_ROOM * m.bolt.size.d;
  found.check(ruleOf('spanner-room', PRACTICE, 'mm'), m.firstColumn, room);
  found.check(ruleOf('beam-clear-of-weld', PRACTICE, 'mm'), m.beam.gap, m.weldLeg);
}

function checkPractice(m: FinPlateModel, found: Rejections): void {
  if (m.practiceWaived) return;
  const thick = DUCTILE * m.bolt.size.d;
  found.check(ruleOf('ductile-thickness', PRACTICE, 'mm', false), m.thickness, thick);
  found.check(ruleOf('plate-height-least', PRACTICE, 'mm'), m.height, LEAST_HEIGHT * m.beam.section.depth);
}

/** The thinner part of the lap. */
function outerThickness(m: FinPlateModel): number {
  return Math.min(m.thickness, m.beam.web.thickness);
}

function isExposed(m: FinPlateModel): boolean {
  return m.values.choice('exposure') === 'exposed';
}
