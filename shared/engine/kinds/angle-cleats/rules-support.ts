import { groupHeight } from '../../limit-states/upright-group.ts';
import type { Rejections } from '../rules.ts';
import type { CleatModel } from './model.ts';
import { ruleOf } from './rule-list.ts';
import type { SupportBolts } from './support-bolts.ts';
import type { SupportWeld } from './support-weld.ts';

const PRACTICE = 'common practice';
const GEOMETRY = 'geometry of the detail';

/** A bolt does not enter a hole that is less than this larger, mm (common practice, from memory). */
const LEAST_HOLE_CLEARANCE = 0.5;

/** Room for a spanner beside a bolt, by bolt diameter, from its centre to a leg (common practice, from memory). */
const SPANNER_ROOM = 1.25;

/** Half of a nut across corners, and a nut with its washer above the leg, by bolt diameter (from memory). */
const NUT = { radius: 0.85, height: 1 };

/** A leg on one bolt turns. */
const LEAST_ROWS = 2;

/** The outstanding legs: their bolts, or their welds. */
export function checkSupport(m: CleatModel, found: Rejections): void {
  const { bolts, weld } = m;
  if (weld !== null) checkWeld(m, weld, found);
  if (bolts === null) return;
  checkBolts(m, bolts, found);
  checkLeg(m, bolts, found);
  if (m.fitWaived) return;
  checkRoom(m, bolts, found);
}

/** The thinner outside part of the lap; the support counts where its thickness is given. */
function outerThickness(m: CleatModel): number {
  const { thickness } = m.legs;
  return m.supportThickness > 0 ? Math.min(thickness, m.supportThickness) : thickness;
}

function checkBolts(m: CleatModel, { group, bolt, prefix }: SupportBolts, found: Rejections): void {
  const { detailing } = m.basis;
  const { d } = bolt.size;
  const d0 = bolt.holeDiameter;
  found.check(ruleOf('support-bolt-count', PRACTICE, ''), group.rows, LEAST_ROWS);
  if (prefix !== '') {
    const { hole } = detailing.clauses;
    found.check(ruleOf('support-hole-least', hole, 'mm'), d0, d + LEAST_HOLE_CLEARANCE);
    found.check(ruleOf('support-hole-greatest', hole, 'mm', false), d0, detailing.greatestHole(d));
  }
  if (group.rows === 1) return;
  const clause = detailing.clauses.pitch;
  found.check(ruleOf('support-pitch-least', clause, 'mm'), group.pitch, detailing.leastPitch(d, d0));
  const most = detailing.greatestPitch(outerThickness(m));
  found.check(ruleOf('support-pitch-greatest', clause, 'mm', false), group.pitch, most);
}

function checkLeg(m: CleatModel, bolts: SupportBolts, found: Rejections): void {
  const { detailing } = m.basis;
  const { clauses } = detailing;
  const { d } = bolts.bolt.size;
  const d0 = bolts.bolt.holeDiameter;
  const most = detailing.greatestEdge(outerThickness(m), m.values.choice('exposure') === 'exposed');
  const end = detailing.leastEnd(d, d0, m.finish, bolts.group.rows);
  found.check(ruleOf('support-end-least', clauses.end, 'mm'), bolts.endDistance, end);
  found.check(ruleOf('support-end-greatest', clauses.edge, 'mm', false), bolts.endDistance, most);
  const edge = detailing.leastEdge(d, d0, m.finish);
  found.check(ruleOf('support-edge-least', clauses.edge, 'mm'), bolts.edgeDistance, edge);
  found.check(ruleOf('support-edge-greatest', clauses.edge, 'mm', false), bolts.edgeDistance, most);
  found.check(ruleOf('support-leg-hole', GEOMETRY, 'mm'), bolts.backmark - m.legs.thickness, d0 / 2);
}

function checkRoom(m: CleatModel, bolts: SupportBolts, found: Rejections): void {
  const { thickness, section } = m.legs;
  const { d } = bolts.bolt.size;
  const inside = bolts.backmark - thickness;
  const flat = inside - section.rootRadius;
  found.check(ruleOf('support-root-clear', PRACTICE, 'mm'), flat, NUT.radius * d);
  found.check(ruleOf('support-spanner-room', PRACTICE, 'mm'), inside, SPANNER_ROOM * d);
  const apart = NUT.radius * (d + m.bolt.size.d);
  if (nearestRows(m, bolts) >= apart) return;
  found.check(ruleOf('nuts-clear', PRACTICE, 'mm'), clearanceOfNuts(m, bolts), 0);
}

/** Least difference in height between a row in the web and a row at the support, mm. */
function nearestRows(m: CleatModel, { group }: SupportBolts): number {
  let least = Infinity;
  for (let row = 0; row < m.group.rows; row++) {
    const y = row * m.group.pitch - groupHeight(m.group) / 2;
    for (let other = 0; other < group.rows; other++) {
      least = Math.min(least, Math.abs(y - other * group.pitch + groupHeight(group) / 2));
    }
  }
  return least;
}

/**
 * Between the nuts of two bolts at one height, in the corner of the angle, mm: beside the nut in the web along the beam, or
 * beside the nut at the support across it, whichever is more. Below 0 they meet.
 */
function clearanceOfNuts(m: CleatModel, bolts: SupportBolts): number {
  const { thickness, firstColumn } = m.legs;
  const inWeb = m.bolt.size.d;
  const { d: atSupport } = bolts.bolt.size;
  const alongBeam = firstColumn - NUT.radius * inWeb - (thickness + NUT.height * atSupport);
  const acrossBeam = bolts.backmark - NUT.radius * atSupport - (thickness + NUT.height * inWeb);
  return Math.max(alongBeam, acrossBeam);
}

function checkWeld(m: CleatModel, weld: SupportWeld, found: Rejections): void {
  const { detailing } = m.basis;
  const { weldSize, weldLength } = detailing.clauses;
  const { thickness } = m.legs;
  const support = m.supportThickness || thickness;
  const least = detailing.leastWeldLeg(Math.max(thickness, support), Math.min(thickness, support));
  found.check(ruleOf('weld-leg-least', weldSize, 'mm'), weld.leg, least);
  const most = detailing.greatestWeldLeg(thickness);
  found.check(ruleOf('weld-leg-greatest', weldSize, 'mm', false), weld.leg, most);
  const throat = weld.leg / Math.SQRT2;
  found.check(ruleOf('weld-throat-least', weldSize, 'mm'), throat, detailing.leastWeldThroat());
  const length = detailing.leastWeldLength(weld.leg);
  found.check(ruleOf('weld-length-least', weldLength, 'mm'), weld.length, length);
}
