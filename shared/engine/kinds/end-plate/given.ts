import type { Recorder } from '../../types.ts';
import { recordBolt, recordFactors, recordParameters, recordSteel } from '../given.ts';
import type { EndPlateModel } from './model.ts';
import { parameters } from './parameters.ts';

/** Lengths that may be left to the usual value. */
const usual: ReadonlySet<string> = new Set(['hole_diameter', 'support_thickness', 'beam_top_to_row']);

/** Writes down the inputs and the forces, before the limit states. */
export function recordGiven(m: EndPlateModel, theta: number, cos: number, sin: number, rec: Recorder): void {
  rec.section('given', 'Given');
  recordParameters(parameters, m.values, m.basis, usual, rec);
  recordSteel('plate', m.plate, rec);
  if (m.supportBearing !== null) recordSteel('support', m.support, rec);
  recordSteel('beam', m.beamSteel, rec);
  recordBolt(m.bolt, m.deduction, rec);
  rec.line('', 'section of the beam', '', m.section.name, '', '');
  rec.line('h_b', 'depth of the beam', '', m.section.depth, 'mm', '');
  rec.line('t_w', 'web of the beam', '', m.section.webThickness, 'mm', '');
  rec.line('h_p', 'height of the plate', '(n_1 − 1) p_1 + 2 e_1', m.height, 'mm', '');
  rec.line('e_2', 'bolt to the edge of the plate', '(b_p − p_3)/2', m.edgeDistance, 'mm', '');
  rec.line('b', 'bolt to the face of the web', '(p_3 − t_w)/2', m.boltToWeb, 'mm', '');
  recordFactors(m.basis, rec);
  rec.section('forces', 'Forces for a resultant R');
  rec.line('θ', 'load angle from the normal of the face', '', theta, 'rad', '');
  rec.line('N/R', 'pull off the face', 'cos θ', cos, '', '');
  rec.line('V/R', 'along the face', 'sin θ', sin, '', '');
}
