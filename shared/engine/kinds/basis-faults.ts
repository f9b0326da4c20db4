import type { Basis } from '../standards/basis.ts';
import type { FieldFault } from '../types.ts';
import type { BoltPrefix } from './parts.ts';
import type { Resolved } from './resolved.ts';

/**
 * Faults of bolts that the catalogue knows but the basis does not: it gives no hole or no strength for them.
 * @param prefix before the names of the bolt's parameters
 */
export function basisFaults(values: Resolved, basis: Basis, prefix: BoltPrefix = ''): FieldFault[] {
  const faults: FieldFault[] = [];
  const { short } = basis.info;
  const { size, catalogued } = values.size(`${prefix}bolt_size`);
  const hole = `${prefix}hole_diameter`;
  if (values.number(hole) === 0 && basis.normalHole(size, catalogued) === null) {
    const message = `Bolt size: ${short} lists no normal hole for ${size.name}; give ${hole}, or a size that it lists`;
    faults.push({ field: `${prefix}bolt_size`, value: size.name, message });
  }
  const grade = values.grade(`${prefix}bolt_grade`);
  if ('catalogued' in grade && !basis.hasGrade(grade.catalogued)) {
    const { name } = grade.catalogued;
    const message = `Bolt grade: ${short} has no strength for ${name}; give a grade that it has, or { fyb, fub }`;
    faults.push({ field: `${prefix}bolt_grade`, value: name, message });
  }
  return faults;
}
