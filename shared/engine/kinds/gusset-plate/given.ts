import type { ParameterSpec, Recorder } from '../../types.ts';
import type { GussetModel } from './model.ts';
import { parameters } from './parameters.ts';
import type { GussetView } from './view.ts';

/** Writes down the inputs and the forces, before the limit states. */
export function recordGiven(m: GussetModel, v: GussetView, theta: number, rec: Recorder): void {
  rec.section('given', 'Given');
  for (const spec of parameters.filter((one) => isUsed(one, m))) {
    if (spec.type === 'choice') {
      const value = m.values.choice(spec.name);
      const label = spec.choices?.find((choice) => choice.value === value)?.label ?? value;
      rec.line(spec.symbol, spec.label, '', label, '', '');
    } else if (spec.type === 'length' || spec.type === 'number' || spec.type === 'count') {
      rec.line(spec.symbol, spec.label, '', m.values.number(spec.name), spec.unit, '');
    }
  }
  recordCatalogue(m, rec);
  recordFactors(m, rec);
  recordForces(m, v, theta, rec);
}

/** Lengths that may be left to the usual value. */
const usual: ReadonlySet<string> = new Set(['hole_diameter', 'member_backmark', 'support_thickness']);

/** Whether this basis and these choices use a parameter. */
function isUsed({ name, bases, when }: ParameterSpec, m: GussetModel): boolean {
  // A length of 0 stands for the usual one, which is written down with what the catalogue gives.
  if (usual.has(name) && m.values.number(name) === 0) return false;
  if (bases !== undefined && !bases.includes(m.basis.info.id)) return false;
  return when === undefined || when.is.includes(m.values.text(when.parameter));
}

function recordCatalogue(m: GussetModel, rec: Recorder): void {
  const { member, bolt } = m;
  const strengths = (label: string, steel: { name: string; fy: number; fu: number }) => {
    rec.line('f_y', `${label}, ${steel.name}`, '', steel.fy, 'MPa', '');
    rec.line('f_u', `${label}, ${steel.name}`, '', steel.fu, 'MPa', '');
  };
  strengths('plate', m.plate);
  strengths('support', m.support);
  strengths('brace', member.steel);
  rec.line('d', `bolt ${bolt.size.name}, class ${bolt.grade.name}`, '', bolt.size.d, 'mm', '');
  rec.line('f_ub', `bolt ${bolt.size.name}, class ${bolt.grade.name}`, '', bolt.grade.fub, 'MPa', '');
  rec.line('d_0', 'hole', '', bolt.holeDiameter, 'mm', '');
  rec.line('d_h', 'hole as deducted from areas', '', m.deduction, 'mm', '');
  rec.line('', 'section of the brace', '', member.section.name, '', '');
  rec.line('A', 'area of one part', '', member.section.area, 'mm²', '');
  if (member.section.shape === 'angle') rec.line('b', 'back mark used', '', member.backmark, 'mm', '');
  rec.line('e_2', 'outer line to the toe or edge of the brace', '', member.toeDistance, 'mm', '');
}

function recordFactors(m: GussetModel, rec: Recorder): void {
  if (!m.basis.info.hasPartialFactors) return;
  const { gammaM0, gammaM1, gammaM2 } = m.basis.factors;
  rec.line('γ_M0', 'partial factor', '', gammaM0, '', '');
  rec.line('γ_M1', 'partial factor', '', gammaM1, '', '');
  rec.line('γ_M2', 'partial factor', '', gammaM2, '', '');
}

function recordForces(m: GussetModel, v: GussetView, theta: number, rec: Recorder): void {
  rec.section('forces', 'Forces at the weld for a resultant R');
  rec.line('θ', 'load angle from the normal of the face', '', theta, 'rad', '');
  rec.line('', 'sense', '', v.tension ? 'tension' : 'compression', '', '');
  rec.line('N/R', 'across the face', 'cos θ', v.cos, '', '');
  rec.line('V/R', 'along the face', 'sin θ', v.sin, '', '');
  rec.line('M/R', 'about the middle of the weld', 'N e', v.cos * m.offset, 'mm', '');
}
