import type { Basis, BoltInShear } from '../standards/basis.ts';
import type { ParameterSpec, Recorder, Steel } from '../types.ts';
import type { Resolved } from './resolved.ts';

/**
 * Writes down the choices and lengths that this basis and these choices use.
 * @param usual parameters whose 0 stands for the usual value, which is written down with what the catalogue gives
 */
export function recordParameters(
  specs: readonly ParameterSpec[],
  values: Resolved,
  basis: Basis,
  usual: ReadonlySet<string>,
  rec: Recorder,
): void {
  for (const spec of specs) {
    if (usual.has(spec.name) && values.number(spec.name) === 0) continue;
    if (!isUsed(spec, values, basis)) continue;
    if (spec.type === 'choice') {
      const value = values.choice(spec.name);
      const label = spec.choices?.find((choice) => choice.value === value)?.label ?? value;
      rec.line(spec.symbol, spec.label, '', label, '', '');
    } else if (spec.type === 'length' || spec.type === 'number' || spec.type === 'count') {
      rec.line(spec.symbol, spec.label, '', values.number(spec.name), spec.unit, '');
    }
  }
}

/** Whether a basis and the other choices use a parameter. */
export function isUsed({ bases, when }: ParameterSpec, values: Resolved, basis: Basis): boolean {
  if (bases !== undefined && !bases.includes(basis.info.id)) return false;
  return when === undefined || when.is.includes(values.text(when.parameter));
}

/** Whether a choice of a schema has that value and the basis and the other choices use it. */
export function isChosen(
  specs: readonly ParameterSpec[],
  values: Resolved,
  basis: Basis,
  name: string,
  value: string,
): boolean {
  if (values.choice(name) !== value) return false;
  const spec = specs.find((one) => one.name === name);
  return spec !== undefined && isUsed(spec, values, basis);
}

/** Yield and tensile strength of one part. */
export function recordSteel(label: string, steel: Steel, rec: Recorder): void {
  rec.line('f_y', `${label}, ${steel.name}`, '', steel.fy, 'MPa', '');
  rec.line('f_u', `${label}, ${steel.name}`, '', steel.fu, 'MPa', '');
}

/** The bolt with its hole, and the hole as net areas lose it. */
export function recordBolt(bolt: BoltInShear, deduction: number, rec: Recorder): void {
  const words = `bolt ${bolt.size.name}, class ${bolt.grade.name}`;
  rec.line('d', words, '', bolt.size.d, 'mm', '');
  rec.line('f_ub', words, '', bolt.grade.fub, 'MPa', '');
  rec.line('d_0', 'hole', '', bolt.holeDiameter, 'mm', '');
  rec.line('d_h', 'hole as deducted from areas', '', deduction, 'mm', '');
}

/** The partial factors, where the basis has them. */
export function recordFactors(basis: Basis, rec: Recorder): void {
  if (!basis.info.hasPartialFactors) return;
  const { gammaM0, gammaM1, gammaM2 } = basis.factors;
  rec.line('γ_M0', 'partial factor', '', gammaM0, '', '');
  rec.line('γ_M1', 'partial factor', '', gammaM1, '', '');
  rec.line('γ_M2', 'partial factor', '', gammaM2, '', '');
}
