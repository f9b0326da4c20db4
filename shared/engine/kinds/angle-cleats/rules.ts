import type { Rejection } from '../../types.ts';
import { checkBeamEnd } from '../beam-end/rules.ts';
import { noSteel } from '../parts.ts';
import { Rejections } from '../rules.ts';
import type { CleatModel } from './model.ts';
import { type RuleId, ruleOf } from './rule-list.ts';
import { checkSupport } from './rules-support.ts';

const PRACTICE = 'common practice';
const GEOMETRY = 'geometry of the detail';

/** A bolt does not enter a hole that is less than this larger, mm (common practice, from memory). */
const LEAST_HOLE_CLEARANCE = 0.5;

/** Room for a spanner beside a bolt, by bolt diameter, from its centre to a leg (common practice, from memory). */
const SPANNER_ROOM = 1.25;

/** Radius that a nut needs beside its bolt, by bolt diameter: half its width across corners (from memory). */
const NUT_RADIUS = 0.85;

/** Greatest thickness of cleats that let the beam turn, mm: 5/8 in (AISC Manual, Part 10, from memory). */
const DUCTILE = 16;

/** Least length of the cleats by depth of the beam (Steel Buildings in Europe, Part 5, 4.1, from memory). */
const LEAST_LENGTH = 0.6;

/** Every rule of angle cleats: no load angle changes them. */
export function rejectionsOf(m: CleatModel): readonly Rejection[] {
  const found = new Rejections();
  checkStrengths(m, found);
  checkWebBolts(m, found);
  checkWebLeg(m, found);
  checkSupport(m, found);
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
      partAbove: m.legs.endDistance,
      partBelow: m.legs.endDistance,
      fitWaived: m.fitWaived,
    },
    found,
  );
  return found.list;
}

function checkStrengths(m: CleatModel, found: Rejections): void {
  const { steel, thickness } = m.legs;
  const missing = (id: RuleId, at: number) => {
    const rule = ruleOf(id, 'product standard of the steel', 'mm', false);
    found.add(rule, at, 0, `${rule.subject}: the grade has no strength at ${at} mm`);
  };
  if (steel === noSteel) missing('cleat-steel-thickness', thickness);
  else if (m.support === noSteel) missing('support-steel-thickness', m.supportThickness || thickness);
  const missingGrade = (id: RuleId, d: number) => {
    const rule = ruleOf(id, 'product standard of the bolt', 'mm', false);
    found.add(rule, d, 0, `${rule.subject}: it has no strength at a diameter of ${d} mm`);
  };
  if (m.gradeMissing) missingGrade('bolt-grade-size', m.bolt.size.d);
  if (m.bolts?.gradeMissing === true) missingGrade('support-bolt-grade-size', m.bolts.bolt.size.d);
}

function checkWebBolts(m: CleatModel, found: Rejections): void {
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

function checkWebLeg(m: CleatModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { clauses } = detailing;
  const { endDistance, edgeDistance, firstColumn, thickness, section } = m.legs;
  const { d } = m.bolt.size;
  const d0 = m.bolt.holeDiameter;
  const most = detailing.greatestEdge(outerThickness(m), isExposed(m));
  const end = detailing.leastEnd(d, d0, m.finish, m.group.rows);
  found.check(ruleOf('cleat-end-least', clauses.end, 'mm'), endDistance, end);
  found.check(ruleOf('cleat-end-greatest', clauses.edge, 'mm', false), endDistance, most);
  const edge = detailing.leastEnd(d, d0, m.finish, m.group.columns);
  found.check(ruleOf('web-leg-edge-least', clauses.edge, 'mm'), edgeDistance, edge);
  found.check(ruleOf('web-leg-edge-greatest', clauses.edge, 'mm', false), edgeDistance, most);
  const inside = firstColumn - thickness;
  found.check(ruleOf('web-leg-hole', GEOMETRY, 'mm'), inside, d0 / 2);
  if (m.fitWaived) return;
  const flat = inside - section.rootRadius;
  found.check(ruleOf('web-leg-root-clear', PRACTICE, 'mm'), flat, NUT_RADIUS * d);
  found.check(ruleOf('spanner-room', PRACTICE, 'mm'), inside, SPANNER_ROOM * d);
}

function checkPractice(m: CleatModel, found: Rejections): void {
  if (m.practiceWaived) return;
  found.check(ruleOf('ductile-thickness', PRACTICE, 'mm', false), m.legs.thickness, DUCTILE);
  const least = LEAST_LENGTH * m.beam.section.depth;
  found.check(ruleOf('cleat-length-least', PRACTICE, 'mm'), m.height, least);
}

/** The thinner outside part of the lap. */
function outerThickness(m: CleatModel): number {
  const { cleats, thickness } = m.legs;
  return cleats === 2 ? thickness : Math.min(thickness, m.beam.web.thickness);
}

function isExposed(m: CleatModel): boolean {
  return m.values.choice('exposure') === 'exposed';
}
