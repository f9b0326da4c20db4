import type { Recorder } from '../../types.ts';
import { beamUsual } from '../beam-end/parameters.ts';
import { recordBolt, recordFactors, recordParameters, recordSteel } from '../given.ts';
import type { CleatModel } from './model.ts';
import { parameters } from './parameters.ts';

/** Values that may be left to the usual ones. */
const usual: ReadonlySet<string> = new Set([
  'hole_diameter',
  'support_thickness',
  'support_rows',
  'support_pitch',
  'support_backmark',
  'support_hole_diameter',
  'web_backmark',
  'cleat_length',
  'eccentricity',
  ...beamUsual,
]);

/** Writes down the inputs and the forces, before the limit states. */
export function recordGiven(m: CleatModel, theta: number, cos: number, sin: number, rec: Recorder): void {
  rec.section('given', 'Given');
  recordParameters(parameters, m.values, m.basis, usual, rec);
  recordSteel('cleats', m.legs.steel, rec);
  if (m.supportThickness > 0 || m.weld !== null) recordSteel('support', m.support, rec);
  recordSteel('beam', m.beam.steel, rec);
  recordBolt(m.bolt, m.deduction, rec);
  recordLegs(m, rec);
  recordSupport(m, rec);
  const { section, edges } = m.beam;
  rec.line('', 'section of the beam', '', section.name, '', '');
  rec.line('h_b', 'depth of the beam', '', section.depth, 'mm', '');
  rec.line('t_w', 'web of the beam', '', section.webThickness, 'mm', '');
  rec.line('e_2b', 'first column to the end of the beam', 'z − g_h', edges.near, 'mm', '');
  rec.line('e_1b', 'highest row to the edge of the web above', '', edges.above, 'mm', '');
  rec.line('', 'lowest row to the edge of the web below', '', edges.below, 'mm', '');
  recordFactors(m.basis, rec);
  recordForces(m, theta, cos, sin, rec);
}

function recordLegs({ legs }: CleatModel, rec: Recorder): void {
  rec.line('', 'section of the cleats', '', legs.section.name, '', '');
  rec.line('t_ac', 'thickness of a cleat', '', legs.thickness, 'mm', '');
  rec.line('', 'leg on the web', '', legs.webLeg, 'mm', '');
  rec.line('', 'outstanding leg', '', legs.outstandingLeg, 'mm', '');
  rec.line('h_ac', 'length of the cleats', '', legs.height, 'mm', '');
  rec.line('z', 'heel to the first column', '', legs.firstColumn, 'mm', '');
  rec.line('e_1', 'outer row to the end of the web leg', '', legs.endDistance, 'mm', '');
  rec.line('e_2', 'last column to the toe of the web leg', '', legs.edgeDistance, 'mm', '');
}

function recordSupport(m: CleatModel, rec: Recorder): void {
  const { bolts } = m;
  if (bolts === null) return;
  const same = bolts.prefix === '' ? 'those in the web' : 'of their own';
  rec.line('', 'bolts at the support', '', same, '', '');
  if (bolts.prefix !== '') recordBolt(bolts.bolt, bolts.deduction, rec);
  rec.line('n_s', 'rows in each outstanding leg', '', bolts.group.rows, '', '');
  rec.line('p_s', 'pitch at the support', '', bolts.group.pitch, 'mm', '');
  rec.line('g_s', 'heel to the bolts at the support', '', bolts.backmark, 'mm', '');
  if (m.legs.cleats === 2) {
    const centres = 2 * bolts.backmark + m.beam.section.webThickness;
    rec.line('p_3', 'cross centres', '2 g_s + t_w', centres, 'mm', '');
  }
  rec.line('e_1s', 'outer row to the end of the outstanding leg', '', bolts.endDistance, 'mm', '');
  rec.line('e_2s', 'bolts to the toe of the outstanding leg', '', bolts.edgeDistance, 'mm', '');
}

function recordForces(m: CleatModel, theta: number, cos: number, sin: number, rec: Recorder): void {
  rec.section('forces', 'Forces for a resultant R');
  rec.line('θ', 'load angle from the normal of the face', '', theta, 'rad', '');
  rec.line('N/R', 'pull off the face', 'cos θ', cos, '', '');
  rec.line('V/R', 'along the face', 'sin θ', sin, '', '');
  rec.line('e', 'eccentricity', '', m.lines.eccentricity, 'mm', '');
  rec.line('M_k/R', 'at the heel', 'V × lever', sin * m.lines.weldLever, 'mm', '');
  rec.line('M_h/R', 'at the first column', 'V × lever', sin * m.lines.columnLever, 'mm', '');
}
