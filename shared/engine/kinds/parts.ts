import type { Basis, BoltInShear, FilletPart } from '../standards/basis.ts';
import type { BoltGrade, Steel } from '../types.ts';
import { type Resolved, steelAt } from './resolved.ts';
import { TOLERANCE } from './rules.ts';

/** Stands for a strength that the catalogue does not have; the rule that says so rejects the detail. */
export const noSteel: Steel = { name: 'none', fy: 1, fu: 1 };
export const noGrade: BoltGrade = { name: 'none', fyb: 1, fub: 1 };

/** A plate and the support that it is welded to. mm, MPa. */
export interface WeldedPlate {
  readonly thickness: number;
  readonly plate: Steel;
  readonly support: Steel;
  /** 0: not thicker than the plate. */
  readonly supportThickness: number;
}

/** Reads the plate and its support. */
export function plateOf(values: Resolved): WeldedPlate {
  const thickness = values.number('plate_thickness');
  const plate = steelAt(values.steel('plate_steel'), thickness, null) ?? noSteel;
  const supportThickness = values.number('support_thickness');
  const at = supportThickness === 0 ? thickness : supportThickness;
  const support = steelAt(values.steel('support_steel'), at, plate) ?? noSteel;
  return { thickness, plate, support, supportThickness };
}

/** The plate between its two fillets, and the support under each. */
export function weldedParts(plate: WeldedPlate): readonly FilletPart[] {
  const { thickness, supportThickness } = plate;
  const behind = supportThickness <= TOLERANCE ? thickness : supportThickness;
  return [weldedPart(plate.plate, thickness, 2), weldedPart(plate.support, behind, 1)];
}

const weldedPart = ({ name, fy, fu }: Steel, thickness: number, fillets: number): FilletPart => ({
  name,
  fy,
  fu,
  thickness,
  fillets,
});

/** Before the names of a bolt's parameters: a kind with two bolts names those at the support apart. */
export type BoltPrefix = '' | 'support_';

/** The normal round hole of the basis for the chosen bolt, mm, or null where it lists none. */
export function normalHole(values: Resolved, basis: Basis, prefix: BoltPrefix = ''): number | null {
  const { size, catalogued } = values.size(`${prefix}bolt_size`);
  return basis.normalHole(size, catalogued);
}

/** Reads the bolt with its hole. */
export function boltOf(
  values: Resolved,
  basis: Basis,
  planes: number,
  jointLength: number,
  prefix: BoltPrefix = '',
): BoltInShear {
  const { size } = values.size(`${prefix}bolt_size`);
  const choice = values.grade(`${prefix}bolt_grade`);
  const grade = 'given' in choice ? choice.given : basis.grade(choice.catalogued, size.d);
  const hole = values.number(`${prefix}hole_diameter`);
  return {
    size,
    grade: grade ?? noGrade,
    // A size without a hole of its own is a fault unless the hole is given.
    holeDiameter: hole === 0 ? (normalHole(values, basis, prefix) ?? size.d) : hole,
    planes,
    threadsInPlane: values.choice(`${prefix}threads`) === 'in_plane',
    jointLength,
  };
}
