import type { BoltSize, BoltStresses, Electrode, Section } from './types.ts';

/** The reference data a kind needs; plain data so that it can cross to a worker or a browser. */
export interface EngineCatalogue {
  readonly boltSizes: readonly (BoltSize & {
    /** Normal round holes; null where the standard lists none for this size. */
    readonly hole: {
      readonly en: number | null;
      readonly sans: number | null;
      readonly csa: number | null;
      readonly aisc: number | null;
    };
  })[];
  readonly boltGrades: readonly {
    readonly name: string;
    readonly fyb: number;
    /** Nominal strength, used by EN; MPa; null for a grade that EN does not have. */
    readonly nominal: number | null;
    /** Minimum tensile strength by size, used by SANS and CSA: first band whose dMax is not below d. */
    readonly minimum: readonly { readonly dMax: number; readonly fub: number }[];
    /** Stresses of AISC 360 Table J3.2 by size, read as `minimum`. */
    readonly aisc: readonly (BoltStresses & { readonly dMax: number })[];
    readonly source: string;
  }[];
  readonly steels: readonly {
    readonly name: string;
    readonly bands: readonly { readonly tMax: number; readonly fy: number; readonly fu: number }[];
    readonly source: string;
  }[];
  readonly electrodes: readonly (Electrode & { readonly source: string })[];
  readonly sections: readonly (Section & { readonly source: string })[];
}
