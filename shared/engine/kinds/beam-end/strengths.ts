import { blockAcross, blockAlong, endPull } from '../../limit-states/upright-block.ts';
import { groupHeight, type UprightGroup } from '../../limit-states/upright-group.ts';
import type { Basis, Rec } from '../../standards/basis.ts';
import { type BeamEnd, isCoped } from './beam.ts';

/**
 * A corner of the web torn up or down, N: towards a cope, or towards the back of the flange as if the web alone were
 * there (errs low).
 * @param up whether the bolts push the web up
 */
export function webBlockAlong(
  basis: Basis,
  beam: BeamEnd,
  group: UprightGroup,
  up: boolean,
  eccentric: boolean,
  rec: Rec,
): number {
  const ahead = up ? beam.edges.above : beam.edges.below;
  return blockAlong(basis, beam.web, group, ahead, beam.edges.near, endPull(group, eccentric), rec);
}

/** A block of the web torn towards the end of the beam by a pull, N. */
export function webBlockAcross(basis: Basis, beam: BeamEnd, group: UprightGroup, rec: Rec): number {
  const edges = {
    above: isCoped(beam.top) ? beam.edges.above : Infinity,
    below: isCoped(beam.bottom) ? beam.edges.below : Infinity,
  };
  return blockAcross(basis, beam.web, group, beam.edges.near, edges, rec);
}

/**
 * Web under a pull, N: the lesser of yield and of rupture less the holes of one column, over the height of the part
 * that is bolted to it and not beyond the edges of the web.
 * @param partHeight height of the plate or cleat, mm
 */
export function webTension(
  basis: Basis,
  beam: BeamEnd,
  group: UprightGroup,
  partHeight: number,
  rec: Rec,
): number {
  const { thickness, deduction } = beam.web;
  const { above, below } = beam.edges;
  const height = Math.max(0, Math.min(partHeight, groupHeight(group) + above + below));
  const gross = height * thickness;
  const net = Math.max(0, (height - group.rows * deduction) * thickness);
  if (rec !== null) {
    const clause = basis.clauses.tensionSection;
    rec.line('h_w', 'height of the web that pulls', 'that of the bolted part', height, 'mm', clause);
    rec.line('A', 'gross', 'h_w t_w', gross, 'mm²', clause);
    rec.line('A_n', 'less the holes of a column', '(h_w − n d_h) t_w', net, 'mm²', clause);
  }
  const yielding = basis.tensionYield(gross, beam.steel.fy, rec);
  return Math.min(yielding, basis.tensionRupture(net, beam.steel.fu, rec));
}
/** Gross web in shear, N: at a cope what it leaves of the depth. */
export function webShearGross(basis: Basis, beam: BeamEnd, rec: Rec): number {
  const clause = basis.clauses.shearSection;
  if (rec !== null) rec.line('A_gv', 'web in shear', 'depth left × t_w', beam.shearArea, 'mm²', clause);
  return basis.shearYield(beam.shearArea, beam.steel.fy, rec);
}

/** Web in shear less the holes of one column, N. */
export function webShearNet(basis: Basis, beam: BeamEnd, group: UprightGroup, rec: Rec): number {
  const { thickness, deduction } = beam.web;
  const net = Math.max(0, beam.shearArea - group.rows * deduction * thickness);
  if (rec !== null) {
    rec.line(
      'A_nv',
      'web less the holes of a column',
      'A_gv − n d_h t_w',
      net,
      'mm²',
      basis.clauses.shearSection,
    );
  }
  return basis.shearRupture(net, beam.steel.fu, rec);
}
