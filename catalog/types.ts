/**
 * Record types of the reference data. Lengths mm, areas mm2, strengths MPa, masses kg/m.
 * A value that is not known is null, and the record's `missing` says why; nothing is guessed.
 */

/** The standards families that read different values from one record. */
export type Practice = 'en' | 'sans' | 'csa' | 'aisc';

/** Where a record comes from and how far it has been confirmed. */
export interface Provenance {
  /** Standard and table. */
  readonly source: string;
  readonly edition: string;
  /** How the number got here, e.g. "from memory; area confirmed from geometry". */
  readonly evidence: string;
}

/** Why a field of a record is null. `field` is a dotted path, e.g. `holes.normal.aisc`. */
export interface MissingValue {
  readonly field: string;
  readonly reason: string;
}

export interface CatalogueRecord extends Provenance {
  readonly name: string;
  readonly missing: readonly MissingValue[];
}

/** Hole diameters of one bolt size, mm, each to its own standard. */
export type HoleDiameters = Readonly<Record<Practice, number | null>>;

export interface BoltSizeRecord extends CatalogueRecord {
  readonly d: number;
  readonly pitch: number;
  /** Tensile stress area as printed in ISO 898-1, or in ASME B1.1 for inch sizes, mm2. */
  readonly As: number;
  readonly headAcrossFlats: number;
  /** Smallest width across corners, product grade B. */
  readonly headAcrossCorners: number;
  readonly holes: { readonly normal: HoleDiameters; readonly oversize: HoleDiameters };
}

/** Least tensile strength for bolts up to and including `dMax`; the first band that fits applies. */
export interface TensileBand {
  readonly dMax: number;
  readonly fub: number;
}

/** Tension, shear with threads in the plane (N) and not (X) for bolts up to and including `dMax`, MPa. */
export interface AiscStressBand {
  readonly dMax: number;
  readonly fnt: number;
  readonly fnvN: number;
  readonly fnvX: number;
}

export interface BoltGradeRecord extends CatalogueRecord {
  readonly family: 'property-class' | 'structural-assembly';
  /** Smallest and largest bolt diameter the values hold for, mm. */
  readonly dMin: number;
  readonly dMax: number;
  /** Nominal values of EN 1993-1-8 Table 3.1, MPa; null for a grade that table does not have. */
  readonly nominal: { readonly fyb: number; readonly fub: number } | null;
  /** Specified minimum tensile strength, MPa, by diameter: what SANS, CSA and AISC practice reads. */
  readonly minimum: readonly TensileBand[];
  /** Yield strength of the grade, nominal for a property class and minimum for an assembly, MPa. */
  readonly fyb: number;
  /** Nominal stresses as AISC 360 Table J3.2 gives them for this grade, by diameter, MPa. */
  readonly aisc: readonly AiscStressBand[];
  readonly practices: readonly Practice[];
}

/** Another printed value for the same thickness, with the document that prints it. MPa. */
export interface AlternativeStrength {
  readonly fy?: number;
  readonly fu?: number;
  readonly source: string;
}

/** Yield and tensile strength for thicknesses above the previous band up to and including `tMax`. */
export interface StrengthBand {
  readonly tMax: number;
  readonly fy: number;
  readonly fu: number;
  readonly alternatives: readonly AlternativeStrength[];
}

export interface SteelRecord extends CatalogueRecord {
  readonly standard: string;
  readonly products: readonly ('plate' | 'section')[];
  /** Smallest thickness the values hold for, mm. Past the last band there is no value. */
  readonly tMin: number;
  readonly bands: readonly StrengthBand[];
  readonly practices: readonly Practice[];
  readonly note: string;
}

export interface ElectrodeRecord extends CatalogueRecord {
  /** Ultimate tensile strength of the weld metal, MPa. */
  readonly xu: number;
  readonly practices: readonly Practice[];
  readonly note: string;
}

/** Suggested back marks of one leg, mm. */
export interface LegBackmarks {
  /** One line of bolts: distance from the heel. */
  readonly oneLine: number | null;
  /** Two lines: heel to the first line, then the first line to the second. */
  readonly twoLines: readonly [number, number] | null;
}

export interface BackmarkRecord extends CatalogueRecord, LegBackmarks {
  /** Leg length, mm. */
  readonly leg: number;
}

export interface AngleRecord extends CatalogueRecord {
  /** Longer leg, standing along y. */
  readonly a: number;
  /** Shorter leg, lying along x; equal to `a` in an equal angle. */
  readonly b: number;
  readonly t: number;
  /** Root radius. */
  readonly r1: number;
  /** Toe radius. */
  readonly r2: number;
  readonly A: number;
  /** Centroid from the heel, measured along leg b: from the back of leg a. */
  readonly cx: number;
  /** Centroid from the heel, measured along leg a: from the back of leg b. */
  readonly cy: number;
  readonly mass: number;
  readonly backmarks: { readonly a: LegBackmarks; readonly b: LegBackmarks };
}

export interface FlatRecord extends CatalogueRecord {
  readonly b: number;
  readonly t: number;
  readonly A: number;
  readonly mass: number;
}

export type ISectionSeries = 'IPE' | 'IPEA' | 'HEA' | 'HEB' | 'UB' | 'UC' | 'W';

export interface ISectionRecord extends CatalogueRecord {
  readonly series: ISectionSeries;
  readonly h: number;
  readonly b: number;
  readonly tw: number;
  readonly tf: number;
  /** Root radius. */
  readonly r: number;
  readonly A: number;
  readonly mass: number;
}

/** What a table holds and the unit of each numeric field, by dotted path. */
export interface TableDescription {
  readonly title: string;
  readonly units: Readonly<Record<string, string>>;
}

export type TableName =
  'bolts' | 'boltGrades' | 'steels' | 'electrodes' | 'angles' | 'flats' | 'iSections' | 'backmarks';

/** All reference data: plain, frozen, and the same after a round trip through JSON. */
export interface Catalogue {
  readonly bolts: readonly BoltSizeRecord[];
  readonly boltGrades: readonly BoltGradeRecord[];
  readonly steels: readonly SteelRecord[];
  readonly electrodes: readonly ElectrodeRecord[];
  readonly angles: readonly AngleRecord[];
  readonly flats: readonly FlatRecord[];
  readonly iSections: readonly ISectionRecord[];
  readonly backmarks: readonly BackmarkRecord[];
  readonly tables: Readonly<Record<TableName, TableDescription>>;
}
