import type { Rejection } from '../../types.ts';
import { Rejections } from '../rules.ts';
import type { GussetModel } from './model.ts';
import { type RuleId, ruleOf } from './rule-list.ts';

const PRACTICE = 'common practice';
const GEOMETRY = 'geometry of the detail';

/** Radius that a nut needs beside its bolt, by bolt diameter: half its width across corners (from memory). */
const NUT_RADIUS = 0.85;

/** A bolt does not enter a hole that is less than this larger, mm (common practice, from memory). */
const LEAST_HOLE_CLEARANCE = 0.5;

/** Rules that no load angle changes. */
export function fixedRejections(m: GussetModel): readonly Rejection[] {
  const found = new Rejections();
  checkStrengths(m, found);
  checkArrangement(m, found);
  checkSpacing(m, found);
  checkMemberEdges(m, found);
  if (m.tapered) checkGussetEdges(m, found);
  checkWeld(m, found);
  return found.list;
}

function checkStrengths(m: GussetModel, found: Rejections): void {
  const missing = (id: RuleId, thickness: number) => {
    const rule = ruleOf(id, 'product standard of the steel', 'mm', false);
    found.add(rule, thickness, 0, `${rule.subject}: the grade has no strength at ${thickness} mm`);
  };
  if (m.missing.plate) missing('plate-steel-thickness', m.thickness);
  if (m.missing.support && !m.missing.plate) {
    missing('support-steel-thickness', m.supportThickness || m.thickness);
  }
  if (m.missing.member) missing('member-steel-thickness', m.member.thickness);
  if (m.missing.grade) {
    const { d } = m.bolt.size;
    const message = `Bolt grade: it has no strength at a diameter of ${d} mm`;
    found.add(ruleOf('bolt-grade-size', 'product standard of the bolt', 'mm', false), d, 0, message);
  }
}

function checkArrangement(m: GussetModel, found: Rejections): void {
  const { member, bolt } = m;
  found.check(ruleOf('bolt-count', PRACTICE, ''), m.rows * m.lines, 2);
  if (member.brace === 'star') {
    found.check(ruleOf('star-lines', GEOMETRY, ''), m.lines, 2);
  }
  if (!member.shapeFits) {
    const wanted = member.brace === 'flat' ? 'a flat' : 'an angle';
    const message = `Section of the brace: this arrangement needs ${wanted}, ${member.section.name} is not`;
    found.add(ruleOf('member-shape', GEOMETRY, ''), 0, 1, message);
  }
  const clause = m.basis.detailing.clauses.hole;
  const greatest = m.basis.detailing.greatestHole(bolt.size.d);
  const least = bolt.size.d + LEAST_HOLE_CLEARANCE;
  found.check(ruleOf('hole-least', clause, 'mm'), bolt.holeDiameter, least);
  found.check(ruleOf('hole-greatest', clause, 'mm', false), bolt.holeDiameter, greatest);
}

function checkSpacing(m: GussetModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { d } = m.bolt.size;
  const d0 = m.bolt.holeDiameter;
  const outer = outerThickness(m);
  const clause = detailing.clauses.pitch;
  if (m.rows > 1) {
    found.check(ruleOf('pitch-least', clause, 'mm'), m.pitch, detailing.leastPitch(d, d0));
    found.check(ruleOf('pitch-greatest', clause, 'mm', false), m.pitch, detailing.greatestPitch(outer));
  }
  if (m.lines === 2) {
    found.check(ruleOf('gauge-least', clause, 'mm'), m.gauge, detailing.leastGauge(d, d0));
    if (m.member.brace !== 'star') {
      found.check(ruleOf('gauge-greatest', clause, 'mm', false), m.gauge, detailing.greatestPitch(outer));
    }
  }
}

function checkMemberEdges(m: GussetModel, found: Rejections): void {
  const { member, basis } = m;
  const { detailing } = basis;
  const { d } = m.bolt.size;
  const d0 = m.bolt.holeDiameter;
  const { clauses } = detailing;
  const most = detailing.greatestEdge(outerThickness(m), isExposed(m));
  const end = detailing.leastEnd(d, d0, m.finish, m.rows);
  found.check(ruleOf('member-end-least', clauses.end, 'mm'), member.endDistance, end);
  found.check(ruleOf('member-end-greatest', clauses.edge, 'mm', false), member.endDistance, most);
  const edge = detailing.leastEdge(d, d0, 'rolled');
  found.check(ruleOf('member-edge-least', clauses.edge, 'mm'), member.toeDistance, edge);
  found.check(ruleOf('member-edge-greatest', clauses.edge, 'mm', false), member.toeDistance, most);
  if (member.section.shape === 'flat') return;
  const inner = member.backmark - member.thickness;
  found.check(ruleOf('member-hole-in-leg', GEOMETRY, 'mm'), inner, d0 / 2);
  if (m.fitWaived) return;
  const flat = inner - member.rootRadius;
  found.check(ruleOf('member-root-clear', PRACTICE, 'mm'), flat, NUT_RADIUS * d);
}

function checkGussetEdges(m: GussetModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { d } = m.bolt.size;
  const d0 = m.bolt.holeDiameter;
  const { clauses } = detailing;
  const end = m.cutDistance - m.lastRow;
  const edge = m.cutHalfWidth - m.halfGauge;
  const most = detailing.greatestEdge(outerThickness(m), isExposed(m));
  const leastEnd = detailing.leastEnd(d, d0, m.finish, m.rows);
  found.check(ruleOf('gusset-end', clauses.end, 'mm'), end, leastEnd);
  found.check(ruleOf('gusset-end-greatest', clauses.edge, 'mm', false), end, most);
  const least = detailing.leastEdge(d, d0, m.finish);
  found.check(ruleOf('gusset-edge', clauses.edge, 'mm'), edge, least);
}

function checkWeld(m: GussetModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { weldSize, weldLength } = detailing.clauses;
  const support = m.supportThickness === 0 ? m.thickness : m.supportThickness;
  const leg = detailing.leastWeldLeg(Math.max(m.thickness, support), Math.min(m.thickness, support));
  found.check(ruleOf('weld-leg-least', weldSize, 'mm'), m.weldLeg, leg);
  const throat = m.weldLeg / Math.SQRT2;
  found.check(ruleOf('weld-throat-least', weldSize, 'mm'), throat, detailing.leastWeldThroat());
  const least = detailing.leastWeldLength(m.weldLeg);
  found.check(ruleOf('weld-length-least', weldLength, 'mm'), m.countedWeld, least);
}

/** The thinner outside part of the lap: the angles of a pair hold the plate between them. */
function outerThickness(m: GussetModel): number {
  return m.bolt.planes === 2 ? m.member.thickness : Math.min(m.thickness, m.member.thickness);
}

function isExposed(m: GussetModel): boolean {
  return m.values.choice('exposure') === 'exposed';
}
