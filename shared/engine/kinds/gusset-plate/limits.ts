import { alignedBearing, inclinedBearing } from '../../limit-states/bearing.ts';
import { blockCapacity } from '../../limit-states/block-shear.ts';
import { plateSectionCapacity } from '../../limit-states/plate-section.ts';
import { weldLineCapacity } from '../../limit-states/weld-line.ts';
import { whitmoreBuckling, whitmoreTension } from '../../limit-states/whitmore.ts';
import type { ClauseKey, Rec } from '../../standards/basis.ts';
import type { FailingPart } from '../../types.ts';
import type { GussetModel } from './model.ts';
import { type GussetView, LOWER, UPPER } from './view.ts';

/** One of the twelve; `clause` names the check that the basis cites for it. */
interface LimitState {
  readonly id: string;
  readonly code: string;
  readonly title: string;
  readonly part: FailingPart;
  readonly clause: ClauseKey;
}

const state = (
  id: string,
  code: string,
  title: string,
  part: FailingPart,
  clause: ClauseKey,
): LimitState => ({
  id,
  code,
  title,
  part,
  clause,
});

/** The limit states in the order they are printed; `evaluate` fills its array in the same order. */
export const limitStates = [
  state('weld-metal', 'WM', 'Weld metal', 'weld', 'filletMetal'),
  state('weld-base-metal', 'WB', 'Base metal at the weld', 'weld', 'filletBaseMetal'),
  state('plate-section-at-weld', 'PW', 'Plate section at the weld', 'plate', 'plateSection'),
  state('bolt-shear', 'BS', 'Bolt shear', 'bolt', 'boltShear'),
  state('gusset-bearing', 'GB', 'Bearing and tear-out on the gusset', 'plate', 'bearing'),
  state('member-bearing', 'MB', 'Bearing and tear-out on the brace', 'member', 'bearing'),
  state('gusset-block-shear', 'GX', 'Block shear in the gusset', 'plate', 'blockShear'),
  state('member-block-shear', 'MX', 'Block shear in the brace', 'member', 'blockShear'),
  state('whitmore', 'WH', 'Whitmore section', 'plate', 'tensionSection'),
  state('gusset-buckling', 'GC', 'Gusset buckling in compression', 'plate', 'compression'),
  state('member-net-section', 'MN', 'Net section of the brace', 'member', 'memberNet'),
  state('member-yield', 'MY', 'Gross section of the brace', 'member', 'memberGross'),
] as const;

/** Weld metal on its worst millimetre, N. */
export function weldMetal(m: GussetModel, v: GussetView, rec: Rec): number {
  return weldLineCapacity(m.fillet, 'metal', v.cos, v.sin, v.cos * m.offset, m.countedWeld, rec);
}

/** Base metal along the fusion face, N; Infinity where the basis has no such check. */
export function weldBaseMetal(m: GussetModel, v: GussetView, rec: Rec): number {
  if (!m.fillet.hasBaseMetalCheck) return Infinity;
  return weldLineCapacity(m.fillet, 'base', v.cos, v.sin, v.cos * m.offset, m.countedWeld, rec);
}

/** Pull, shear and bending on the plate along the weld, N. */
export function plateSection(m: GussetModel, v: GussetView, rec: Rec): number {
  const fyd = m.basis.yieldStress(m.plate.fy);
  const moment = v.cos * m.offset;
  const clause = m.basis.clauses.plateSection;
  return plateSectionCapacity(fyd, m.thickness, m.weldLength, v.cos, v.sin, moment, m.plastic, clause, rec);
}

/** Shear of all bolts, which share the force equally because its line runs through their centre, N. */
export function boltShear(m: GussetModel, rec: Rec): number {
  const one = m.basis.boltShear(m.bolt, rec);
  if (rec !== null) rec.line('n m', 'number of bolts, equal shares', '', m.rows * m.lines, '', '');
  return m.rows * m.lines * one;
}

/** Bearing on the gusset, N. `oneBolt` is the shear resistance of one bolt. */
export function gussetBearing(m: GussetModel, v: GussetView, oneBolt: number, rec: Rec): number {
  if (!m.tapered) {
    const sign = v.tension ? 1 : -1;
    return inclinedBearing(m.basis, m.plateBearing, m.inclined, v.cos, v.sin, sign, oneBolt, m.shares, rec);
  }
  const end = v.tension ? m.cutDistance - m.lastRow : Infinity;
  const gauge = m.lines === 2 ? m.gauge : Infinity;
  return alignedBearing(
    m.basis,
    m.plateBearing,
    m.rows,
    m.lines,
    end,
    m.pitch,
    edgeBeside(m, v),
    gauge,
    oneBolt,
    rec,
    m.shares,
    v.tension ? m.rows - 1 : 0,
  );
}

/** Least distance across the brace from a bolt to the side of the plate that faces it, mm. */
function edgeBeside(m: GussetModel, v: GussetView): number {
  const { firstRow, lastRow, halfGauge } = m;
  // A side that runs square across the brace faces no bolt; the rules admit none that leans further.
  const upper = Math.max(1e-12, -v.normalQ[UPPER]!);
  const lower = Math.max(1e-12, v.normalQ[LOWER]!);
  return Math.min(
    v.leastInside(UPPER, firstRow, lastRow, halfGauge) / upper,
    v.leastInside(LOWER, firstRow, lastRow, halfGauge) / lower,
  );
}

/** Bearing on the brace, N: in tension its own end lies ahead of the first row. */
export function memberBearing(m: GussetModel, tension: boolean, oneBolt: number, rec: Rec): number {
  const { member } = m;
  const end = tension ? member.endDistance : Infinity;
  const edge = member.toeDistance;
  const gauge = member.linesEach === 2 ? m.gauge : Infinity;
  return alignedBearing(m.basis, m.memberBearing, m.rows, m.lines, end, m.pitch, edge, gauge, oneBolt, rec);
}

/**
 * Bearing on the brace where each bolt counts for what it takes in shear and on both plies, N: the sum of the lesser
 * of gusset and brace over the bolts. In tension the first row has the end of the brace ahead, the last that of the
 * gusset. Reads what `gussetBearing` found for each bolt at this angle.
 */
export function sharedBearing(m: GussetModel, v: GussetView, rec: Rec): number {
  const { member, rows, lines, pitch } = m;
  const ofMember = member.linesEach === 2 ? m.gauge : Infinity;
  const end = v.tension ? member.endDistance : Infinity;
  if (rec !== null) rec.line('', 'row ahead', '', '', '', '');
  const ahead = m.memberBearing.bolt(end, Infinity, member.toeDistance, ofMember, rec);
  if (rec !== null && rows > 1) rec.line('', 'rows behind', '', '', '', '');
  const behind = m.memberBearing.bolt(Infinity, pitch, member.toeDistance, ofMember, rows > 1 ? rec : null);
  let sum = 0;
  for (let row = 0; row < rows; row++) {
    const onMember = row === (v.tension ? 0 : rows - 1) ? ahead : behind;
    for (let line = 0; line < lines; line++) sum += Math.min(onMember, m.shares[row * lines + line]!);
  }
  if (rec !== null) {
    const meaning = 'each bolt, the lesser on brace and gusset';
    rec.line('Σ', meaning, '', sum, 'N', m.basis.clauses.bearing);
  }
  return sum;
}

/** A block of the gusset torn outwards, N: tension only. */
export function gussetBlock(m: GussetModel, v: GussetView, rec: Rec): number {
  if (!v.tension) return Infinity;
  return blockCapacity(m.basis, m.plateBlock, v.shearLower, v.shearUpper, v.sideLower, v.sideUpper, rec);
}

/** A block of the brace torn towards its own end, N: tension only. */
export function memberBlock(m: GussetModel, tension: boolean, rec: Rec): number {
  if (!tension) return Infinity;
  const { member } = m;
  const shear = member.endDistance + (m.rows - 1) * m.pitch;
  const side = member.toeDistance;
  if (rec !== null) rec.line('parts', 'angles or flats', '', member.parts, '', '');
  return member.parts * blockCapacity(m.basis, member.block, shear, shear, side, side, rec);
}

/** The spread width at the row nearest the support in tension, N. */
export function whitmore(m: GussetModel, v: GussetView, rec: Rec): number {
  if (!v.tension) return Infinity;
  const { fy, fu } = m.plate;
  const above = Math.min(m.spread, v.above);
  const below = Math.min(m.spread, v.below);
  return whitmoreTension(m.basis, m.thickness, fy, fu, m.lines, m.gauge, m.deduction, above, below, rec);
}

/** The spread width as a column from the first row to the face, N: compression only. */
export function gussetBuckling(m: GussetModel, v: GussetView, rec: Rec): number {
  if (v.tension) return Infinity;
  const above = Math.min(m.spread, v.above);
  const below = Math.min(m.spread, v.below);
  return whitmoreBuckling(
    m.basis,
    m.thickness,
    m.plate.fy,
    m.buckling,
    above,
    below,
    m.firstRow,
    v.toFace(m.firstRow, above),
    v.toFace(m.firstRow, -below),
    rec,
  );
}

/** Rupture of the brace at its holes, N: tension only. */
export function memberNet(m: GussetModel, tension: boolean, rec: Rec): number {
  if (!tension) return Infinity;
  const { member, basis } = m;
  const { section, thickness, steel, linesEach } = member;
  if (rec !== null) rec.line('parts', 'angles or flats', '', member.parts, '', '');
  if (section.shape === 'flat') {
    const net = Math.max(0, section.area - linesEach * m.deduction * thickness);
    if (rec !== null) rec.line('A_net', 'net area', 'A − holes', net, 'mm²', basis.clauses.memberNet);
    return basis.tensionRupture(net, steel.fu, rec);
  }
  const one = basis.angleNetSection(
    {
      area: section.area,
      thickness,
      connectedLeg: member.connectedLeg,
      otherLeg: member.otherLeg,
      centroid: member.centroid,
      rows: m.rows,
      lines: linesEach,
      pitch: m.pitch,
      toeDistance: member.toeDistance,
      holeDiameter: m.bolt.holeDiameter,
      deduction: m.deduction,
      fu: steel.fu,
    },
    rec,
  );
  return member.parts * one;
}

/** Yield of the gross section in tension; the same squash load in compression, N. */
export function memberGross(m: GussetModel, rec: Rec): number {
  const area = m.member.parts * m.member.section.area;
  if (rec !== null) rec.line('A', 'gross area of all parts', '', area, 'mm²', m.basis.clauses.memberGross);
  return m.basis.tensionYield(area, m.member.steel.fy, rec);
}
