import type { DetailGeometry } from './detail-geometry.ts';
import type { EngineCatalogue } from './engine-catalogue.ts';

/**
 * The words of the engine. Inside it: newtons, millimetres, megapascals, radians;
 * kN and degrees exist only at the edges (API, screens, files, command line).
 */

/** Which way the resultant acts along the axis of the connected member. */
export type Sense = 'tension' | 'compression';

export type * from './detail-geometry.ts';
export type * from './engine-catalogue.ts';

export type BasisId =
  'sans-10162-1-2011' | 'csa-s16-2019' | 'en-1993-1-8-2005' | 'aisc-360-2022-lrfd' | 'aisc-360-2022-asd';
export type KindId = 'gusset-plate' | 'fin-plate' | 'end-plate' | 'angle-cleats';

/** Yield and tensile strength of a piece at its own thickness. MPa. */
export interface Steel {
  readonly name: string;
  readonly fy: number;
  readonly fu: number;
}

/** One bolt size. Millimetres and mm2; `stressArea` is the printed tensile stress area A_s. */
export interface BoltSize {
  readonly name: string;
  readonly d: number;
  readonly stressArea: number;
}

/** A property class. `fub` is the tensile strength that the design basis uses for this size, MPa. */
export interface BoltGrade {
  readonly name: string;
  readonly fyb: number;
  readonly fub: number;
  /** Stresses of AISC 360 Table J3.2; absent: in proportion to `fub`. */
  readonly aisc?: BoltStresses;
}

/** Nominal stresses of AISC 360 Table J3.2, MPa: tension; shear with threads in the plane (N) and not (X). */
export interface BoltStresses {
  readonly fnt: number;
  readonly fnvN: number;
  readonly fnvX: number;
}

/** Ultimate tensile strength X_u of the weld metal, MPa. */
export interface Electrode {
  readonly name: string;
  readonly xu: number;
}

/** A rolled angle. Millimetres, mm2. */
export interface AngleSection {
  readonly shape: 'angle';
  readonly name: string;
  readonly longLeg: number;
  readonly shortLeg: number;
  readonly thickness: number;
  readonly rootRadius: number;
  readonly area: number;
  /** From the back of the long leg to the centroid, and from the back of the short leg; absent: from the legs. */
  readonly centroidLong?: number;
  readonly centroidShort?: number;
}
export interface FlatSection {
  readonly shape: 'flat';
  readonly name: string;
  readonly width: number;
  readonly thickness: number;
  readonly area: number;
}
/** A rolled or welded I or H section. Millimetres, mm2. */
export interface ISection {
  readonly shape: 'i';
  readonly name: string;
  readonly depth: number;
  readonly width: number;
  readonly webThickness: number;
  readonly flangeThickness: number;
  /** Between web and flange; 0 in a welded section. */
  readonly rootRadius: number;
  readonly area: number;
}
export type Section = AngleSection | FlatSection | ISection;
export type SectionShape = Section['shape'];

/** A catalogue entry is named (`"M20"`, `"S355"`, `"L100x100x10"`) or given by its numbers. */
export type ParameterValue = number | string | boolean | Readonly<Record<string, number | string>>;
export type ParameterValues = Readonly<Record<string, ParameterValue>>;

export type ParameterType =
  'length' | 'number' | 'count' | 'choice' | 'steel' | 'boltSize' | 'boltGrade' | 'electrode' | 'section';

export type ParameterGroup = 'support' | 'plate' | 'cleat' | 'weld' | 'bolts' | 'member' | 'beam' | 'method';

/** One line of a kind's schema: everything a form, a file or a script must know of a parameter. */
export interface ParameterSpec {
  readonly name: string;
  readonly label: string;
  readonly symbol: string;
  readonly group: ParameterGroup;
  readonly type: ParameterType;
  readonly unit: 'mm' | 'MPa' | '';
  readonly minimum?: number;
  readonly maximum?: number;
  readonly choices?: readonly { readonly value: string; readonly label: string; readonly help: string }[];
  /** A section: the shapes that it may have; absent means all. */
  readonly shapes?: readonly SectionShape[];
  readonly default: ParameterValue;
  readonly help: string;
  /** What 0 stands for where it is no size, e.g. `normal hole of the basis`. */
  readonly zero?: string;
  /** Shown and used only when another parameter has one of these values. */
  readonly when?: { readonly parameter: string; readonly is: readonly string[] };
  /** Only these bases use it; absent means all. */
  readonly bases?: readonly BasisId[];
}

/** A fault in one field: the field, what was given, and what would be accepted. */
export interface FieldFault {
  readonly field: string;
  readonly value: unknown;
  readonly message: string;
  /** In an expression: places of the first character at fault and after the last. */
  readonly place?: { readonly start: number; readonly end: number };
}

/** A rule of validity that a detail breaks: never an error, always a reason with its numbers. */
export interface Rejection {
  readonly rule: string;
  readonly title: string;
  readonly clause: string;
  readonly message: string;
  readonly value: number;
  readonly limit: number;
  readonly unit: string;
}

/** The part that gives way; the colour family of a limit state. */
export type FailingPart = 'weld' | 'bolt' | 'plate' | 'member';

export interface LimitStateInfo {
  readonly id: string;
  /** Our own two letters, e.g. `WM`. */
  readonly code: string;
  readonly title: string;
  readonly part: FailingPart;
  readonly clause: string;
}

/** One line of a calculation sheet. */
export interface SheetLine {
  readonly symbol: string;
  readonly meaning: string;
  readonly formula: string;
  readonly value: number | string;
  readonly unit: string;
  readonly clause: string;
}
export interface SheetSection {
  readonly id: string;
  readonly title: string;
  readonly lines: SheetLine[];
}

/** Handed to a limit state to write down its working. Values arrive in engine units; the recorder converts. */
export interface Recorder {
  section(id: string, title: string): void;
  line(
    symbol: string,
    meaning: string,
    formula: string,
    value: number | string,
    unit: string,
    clause: string,
  ): void;
}

/** Partial factors that a firm may set from its National Annex. Unused by bases that have none. */
export interface PartialFactors {
  readonly gammaM0: number;
  readonly gammaM1: number;
  readonly gammaM2: number;
}

export interface BasisInfo {
  readonly id: BasisId;
  readonly title: string;
  readonly short: string;
  readonly resultLabel: string;
  readonly hasPartialFactors: boolean;
  readonly defaultFactors: PartialFactors;
  /** Choices made where the text or the editions leave room; printed on every sheet and export. */
  readonly notes: readonly { readonly id: string; readonly text: string; readonly clause: string }[];
}

/** What a cell holds. A rejected cell is never an error, a zero or a blank. */
export type CellOutcome =
  | {
      readonly status: 'capacity';
      /** N, unrounded. */
      readonly capacity: number;
      readonly governing: number;
    }
  | { readonly status: 'not-permitted'; readonly rejections: readonly Rejection[] }
  | { readonly status: 'not-covered'; readonly reason: string };

/** Returned by `PreparedDetail.at`: at or above zero, the index of the governing limit state. */
export const NOT_PERMITTED = -1;
export const NOT_COVERED = -2;

/** Quantities of one variant: kg, number, mm3 of weld metal. */
export interface Quantities {
  readonly mass: number;
  readonly boltCount: number;
  readonly weldVolume: number;
}

/**
 * A variant with everything that does not depend on the load angle already done.
 * `at` allocates nothing: it may be called millions of times.
 */
export interface PreparedDetail {
  readonly limitStates: readonly LimitStateInfo[];
  /** Rules broken at every angle; empty when the variant is sound. */
  readonly rejections: readonly Rejection[];
  readonly quantities: Quantities;
  /**
   * Writes the capacity in N of each limit state into `out` (Infinity: the limit state does not apply
   * to this sense) and returns the governing index, NOT_PERMITTED or NOT_COVERED.
   * @param theta load angle in radians, from the normal of the support's face
   */
  at(theta: number, sense: Sense, out: Float64Array): number;
  /** The same path as `at`, with the outcome spelled out, rejections with their numbers. */
  outcome(theta: number, sense: Sense): CellOutcome;
  /** The same path as `at`, written down line by line. */
  record(theta: number, sense: Sense): SheetSection[];
  geometry(theta: number): DetailGeometry;
}

export type PrepareResult =
  | { readonly ok: true; readonly detail: PreparedDetail }
  | { readonly ok: false; readonly faults: readonly FieldFault[] };

/** One detail kind: its schema, and the way from parameters to a prepared detail. */
export interface DetailKind {
  readonly id: KindId;
  readonly title: string;
  readonly description: string;
  /** Load angles the kind covers, degrees. */
  readonly angleRange: { readonly minimum: number; readonly maximum: number };
  readonly senses: readonly Sense[];
  readonly parameters: readonly ParameterSpec[];
  readonly limitStates: readonly Omit<LimitStateInfo, 'clause'>[];
  /** Every rule that can reject a cell of this kind. The order is the packed code, so it only grows at the end. */
  readonly rules: readonly { readonly id: string; readonly title: string }[];
  readonly notes: readonly string[];
  prepare(
    values: ParameterValues,
    basis: BasisId,
    catalogue: EngineCatalogue,
    factors?: Partial<PartialFactors>,
  ): PrepareResult;
}
