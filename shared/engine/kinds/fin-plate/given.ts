import type { Recorder } from '../../types.ts';
import { beamUsual } from '../beam-end/parameters.ts';
import { recordBolt, recordFactors, recordParameters, recordSteel } from '../given.ts';
import type { FinPlateModel } from './model.ts';
import { parameters } from './parameters.ts';

/** Lengths that may be left to the usual value. */
const usual: ReadonlySet<string> = new Set([
  'hole_diameter',
  'support_thickness',
  'eccentricity',
  ...beamUsual,
]);

/** Writes down the inputs and the forces, before the limit states. */
export function recordGiven(m: FinPlateModel, theta: number, cos: number, sin: number, rec: Recorder): void {
  rec.section('given', 'Given');
  recordParameters(parameters, m.values, m.basis, usual, rec);
  recordSteel('plate', m.plate, rec);
  recordSteel('support', m.support, rec);
  recordSteel('beam', m.beam.steel, rec);
  recordBolt(m.bolt, m.deduction, rec);
  const { section, edges } = m.beam;
  rec.line('', 'section of the beam', '', section.name, '', '');
  rec.line('h_b', 'depth of the beam', '', section.depth, 'mm', '');
  rec.line('t_w', 'web of the beam', '', section.webThickness, 'mm', '');
  rec.line('h', 'height of the plate', '(n_1 − 1) p_1 + 2 e_1', m.height, 'mm', '');
  rec.line('e_2b', 'first column to the end of the beam', 'z_p − g_h', edges.near, 'mm', '');
  rec.line('e_1b', 'highest row to the edge of the web above', '', edges.above, 'mm', '');
  rec.line('', 'lowest row to the edge of the web below', '', edges.below, 'mm', '');
  recordFactors(m.basis, rec);
  recordForces(m, theta, cos, sin, rec);
}

function recordForces(m: FinPlateModel, theta: number, cos: number, sin: number, rec: Recorder): void {
  rec.section('forces', 'Forces for a resultant R');
  rec.line('θ', 'load angle from the normal of the face', '', theta, 'rad', '');
  rec.line('N/R', 'pull off the face', 'cos θ', cos, '', '');
  rec.line('V/R', 'along the face', 'sin θ', sin, '', '');
  rec.line('e', 'eccentricity', '', m.lines.eccentricity, 'mm', '');
  rec.line('M_w/R', 'at the weld', 'V × lever', sin * m.lines.weldLever, 'mm', '');
  rec.line('M_h/R', 'at the first column', 'V × lever', sin * m.lines.columnLever, 'mm', '');
}
