import type { CatalogueBoltSize, CatalogueGrade } from '../standards/basis.ts';
import type { BoltGrade, BoltSize, Electrode, EngineCatalogue, Section, Steel } from '../types.ts';

type CatalogueSteel = EngineCatalogue['steels'][number];

/** A steel that is looked up by thickness, or strengths given by numbers. */
export type SteelChoice =
  { readonly catalogued: CatalogueSteel } | { readonly given: Steel } | { readonly same: true };
export type SizeChoice = { readonly size: BoltSize; readonly catalogued: CatalogueBoltSize | null };
export type GradeChoice = { readonly catalogued: CatalogueGrade } | { readonly given: BoltGrade };

export type ResolvedValue = number | string | SteelChoice | SizeChoice | GradeChoice | Electrode | Section;

/** Parameters that passed every check of their schema, read by name. */
export class Resolved {
  constructor(private readonly values: ReadonlyMap<string, ResolvedValue>) {}

  number(name: string): number {
    return this.read(name) as number;
  }
  choice<T extends string>(name: string): T {
    return this.read(name) as T;
  }
  /** A choice or a number as it is written in a schema's conditions. */
  text(name: string): string {
    return String(this.read(name));
  }
  steel(name: string): SteelChoice {
    return this.read(name) as SteelChoice;
  }
  size(name: string): SizeChoice {
    return this.read(name) as SizeChoice;
  }
  grade(name: string): GradeChoice {
    return this.read(name) as GradeChoice;
  }
  electrode(name: string): Electrode {
    return this.read(name) as Electrode;
  }
  /** A section; `S` is what the schema's `shapes` leave of it. */
  section<S extends Section = Section>(name: string): S {
    return this.read(name) as S;
  }

  private read(name: string): ResolvedValue {
    const value = this.values.get(name);
    if (value === undefined) throw new Error(`The schema has no parameter ${name}`);
    return value;
  }
}

/** Strengths of a steel at a thickness, mm, or null when the grade has none there. */
export function steelAt(choice: SteelChoice, thickness: number, same: Steel | null): Steel | null {
  if ('same' in choice) return same;
  if ('given' in choice) return choice.given;
  const band = choice.catalogued.bands.find(({ tMax }) => thickness <= tMax);
  return band === undefined ? null : { name: choice.catalogued.name, fy: band.fy, fu: band.fu };
}
