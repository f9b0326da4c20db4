import type { Recorder } from '../../types.ts';
import { recordBolt, recordFactors, recordParameters, recordSteel } from '../given.ts';
import type { GussetModel } from './model.ts';
import { parameters } from './parameters.ts';
import type { GussetView } from './view.ts';

/** Writes down the inputs and the forces, before the limit states. */
export function recordGiven(m: GussetModel, v: GussetView, theta: number, rec: Recorder): void {
  rec.section('given', 'Given');
  recordParameters(parameters, m.values, m.basis, usual, rec);
  recordCatalogue(m, rec);
  recordFactors(m.basis, rec);
  recordForces(m, v, theta, rec);
}

/** Lengths that may be left to the usual value. */
const usual: ReadonlySet<string> = new Set(['hole_diameter', 'member_backmark', 'support_thickness']);

function recordCatalogue(m: GussetModel, rec: Recorder): void {
  const { member, bolt } = m;
  recordSteel('plate', m.plate, rec);
  recordSteel('support', m.support, rec);
  recordSteel('brace', member.steel, rec);
  recordBolt(bolt, m.deduction, rec);
  rec.line('', 'section of the brace', '', member.section.name, '', '');
  rec.line('A', 'area of one part', '', member.section.area, 'mm²', '');
  if (member.section.shape === 'angle') rec.line('b', 'back mark used', '', member.backmark, 'mm', '');
  rec.line('e_2', 'outer line to the toe or edge of the brace', '', member.toeDistance, 'mm', '');
}

function recordForces(m: GussetModel, v: GussetView, theta: number, rec: Recorder): void {
  rec.section('forces', 'Forces at the weld for a resultant R');
  rec.line('θ', 'load angle from the normal of the face', '', theta, 'rad', '');
  rec.line('', 'sense', '', v.tension ? 'tension' : 'compression', '', '');
  rec.line('N/R', 'across the face', 'cos θ', v.cos, '', '');
  rec.line('V/R', 'along the face', 'sin θ', v.sin, '', '');
  rec.line('M/R', 'about the middle of the weld', 'N e', v.cos * m.offset, 'mm', '');
}
