import type { Rejection } from '../../types.ts';
import { Rejections, type Rule } from '../rules.ts';
import type { GussetModel } from './model.ts';

const PRACTICE = 'common practice';
const GEOMETRY = 'geometry of the detail';

const rule = (id: string, title: string, clause: string, unit: string, least = true): Rule => ({
  id,
  title,
  clause,
  unit,
  least,
});

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
  const missing = (id: string, part: string, thickness: number) => {
    const title = `Steel of the ${part}`;
    const message = `${title}: the grade has no strength at ${thickness} mm`;
    found.add(rule(id, title, 'product standard of the steel', 'mm', false), thickness, 0, message);
  };
  if (m.missing.plate) missing('plate-steel-thickness', 'plate', m.thickness);
  if (m.missing.support && !m.missing.plate) {
    missing('support-steel-thickness', 'support', m.supportThickness || m.thickness);
  }
  if (m.missing.member) missing('member-steel-thickness', 'brace', m.member.thickness);
  if (m.missing.grade) {
    const { d } = m.bolt.size;
    const title = 'Bolt grade';
    const message = `${title}: the grade has no strength at a diameter of ${d} mm`;
    found.add(rule('bolt-grade-size', title, 'ISO 898-1', 'mm', false), d, 0, message);
  }
}

function checkArrangement(m: GussetModel, found: Rejections): void {
  const { member, bolt } = m;
  found.check(rule('bolt-count', 'Number of bolts', PRACTICE, ''), m.rows * m.lines, 2);
  if (member.brace === 'star') {
    found.check(rule('star-lines', 'Lines of bolts for two angles in star', GEOMETRY, ''), m.lines, 2);
  }
  if (!member.shapeFits) {
    const wanted = member.brace === 'flat' ? 'a flat' : 'an angle';
    const message = `Section of the brace: this arrangement needs ${wanted}, ${member.section.name} is not`;
    found.add(rule('member-shape', 'Section of the brace', GEOMETRY, ''), 0, 1, message);
  }
  const clause = m.basis.detailing.clauses.hole;
  const greatest = m.basis.detailing.greatestHole(bolt.size.d);
  const least = bolt.size.d + LEAST_HOLE_CLEARANCE;
  found.check(rule('hole-least', 'Hole diameter', clause, 'mm'), bolt.holeDiameter, least);
  found.check(rule('hole-greatest', 'Hole diameter', clause, 'mm', false), bolt.holeDiameter, greatest);
}

function checkSpacing(m: GussetModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { d } = m.bolt.size;
  const d0 = m.bolt.holeDiameter;
  const outer = outerThickness(m);
  const clause = detailing.clauses.pitch;
  if (m.rows > 1) {
    found.check(rule('pitch-least', 'Pitch', clause, 'mm'), m.pitch, detailing.leastPitch(d, d0));
    found.check(
      rule('pitch-greatest', 'Pitch', clause, 'mm', false),
      m.pitch,
      detailing.greatestPitch(outer),
    );
  }
  if (m.lines === 2) {
    found.check(rule('gauge-least', 'Gauge', clause, 'mm'), m.gauge, detailing.leastGauge(d, d0));
    if (m.member.brace !== 'star') {
      found.check(
        rule('gauge-greatest', 'Gauge', clause, 'mm', false),
        m.gauge,
        detailing.greatestPitch(outer),
      );
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
  found.check(
    rule('member-end-least', 'End distance on the brace', clauses.end, 'mm'),
    member.endDistance,
    end,
  );
  found.check(
    rule('member-end-greatest', 'End distance on the brace', clauses.edge, 'mm', false),
    member.endDistance,
    most,
  );
  const edge = detailing.leastEdge(d, d0, 'rolled');
  const toe = member.brace === 'flat' ? 'Edge distance on the brace' : 'Bolt to the toe of the leg';
  found.check(rule('member-edge-least', toe, clauses.edge, 'mm'), member.toeDistance, edge);
  found.check(rule('member-edge-greatest', toe, clauses.edge, 'mm', false), member.toeDistance, most);
  if (member.section.shape === 'flat') return;
  const inner = member.backmark - member.thickness;
  found.check(rule('member-hole-in-leg', 'Bolt to the inside of the heel', GEOMETRY, 'mm'), inner, d0 / 2);
  if (m.fitWaived) return;
  const flat = inner - member.rootRadius;
  found.check(
    rule('member-root-clear', 'Nut clear of the root radius', PRACTICE, 'mm'),
    flat,
    NUT_RADIUS * d,
  );
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
  found.check(rule('gusset-end', 'End distance on the gusset', clauses.end, 'mm'), end, leastEnd);
  found.check(
    rule('gusset-end-greatest', 'End distance on the gusset', clauses.edge, 'mm', false),
    end,
    most,
  );
  const least = detailing.leastEdge(d, d0, m.finish);
  found.check(rule('gusset-edge', 'Edge distance on the gusset', clauses.edge, 'mm'), edge, least);
}

function checkWeld(m: GussetModel, found: Rejections): void {
  const { detailing } = m.basis;
  const { weldSize, weldLength } = detailing.clauses;
  const thicker = Math.max(m.thickness, m.supportThickness);
  found.check(rule('weld-leg-least', 'Weld leg', weldSize, 'mm'), m.weldLeg, detailing.leastWeldLeg(thicker));
  const throat = m.weldLeg / Math.SQRT2;
  found.check(rule('weld-throat-least', 'Weld throat', weldSize, 'mm'), throat, detailing.leastWeldThroat());
  const least = detailing.leastWeldLength(m.weldLeg);
  found.check(rule('weld-length-least', 'Counted weld length', weldLength, 'mm'), m.countedWeld, least);
}

/** The thinner outside part of the lap: the angles of a pair hold the plate between them. */
function outerThickness(m: GussetModel): number {
  return m.bolt.planes === 2 ? m.member.thickness : Math.min(m.thickness, m.member.thickness);
}

function isExposed(m: GussetModel): boolean {
  return m.values.choice('exposure') === 'exposed';
}
