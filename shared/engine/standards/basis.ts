import type { BoltNormalisation } from '../groups/bolt-curve.ts';
import type {
  BasisId,
  BasisInfo,
  BoltGrade,
  BoltSize,
  EngineCatalogue,
  PartialFactors,
  Recorder,
  Steel,
} from '../types.ts';

/** A recorder, or null in a sweep. */
export type Rec = Recorder | null;

export type CatalogueGrade = EngineCatalogue['boltGrades'][number];
export type CatalogueBoltSize = EngineCatalogue['boltSizes'][number];
export type HoleMaking = 'punched' | 'drilled';
export type EdgeFinish = 'sheared' | 'rolled';

/**
 * How a block is pulled on its tension plane: evenly over it; unevenly, as by one line of bolts at its side or by
 * one leg of an angle; at the coped end of a beam by one or by two lines of bolts.
 */
export type BlockPull = 'even' | 'uneven' | 'coped-one-line' | 'coped-two-lines';

/** The checks that a limit state can ask of a basis; each basis names its clause. */
export type ClauseKey =
  | 'filletMetal'
  | 'filletBaseMetal'
  | 'plateSection'
  | 'boltShear'
  | 'bearing'
  | 'blockShear'
  | 'tensionSection'
  | 'compression'
  | 'memberNet'
  | 'memberGross'
  | 'shearSection'
  | 'webTension'
  | 'boltTension'
  | 'boltCombined'
  | 'tStub';

/** One bolt in shear. mm, mm2, MPa. */
export interface BoltInShear {
  readonly size: BoltSize;
  readonly grade: BoltGrade;
  readonly holeDiameter: number;
  readonly planes: number;
  readonly threadsInPlane: boolean;
  /** Between the end fasteners, along the force. */
  readonly jointLength: number;
}

/** One bolt in tension, and the ply that its head or nut could punch through. mm, MPa. */
export interface BoltInTension {
  readonly size: BoltSize;
  readonly grade: BoltGrade;
  /** Mean of the widths of the head or the nut across points and across flats. */
  readonly headDiameter: number;
  readonly plateThickness: number;
  readonly plateFu: number;
}

/** An equivalent T-stub: a flange pulled off its support by bolts on both sides of a web. mm, MPa. */
export interface TStub {
  readonly thickness: number;
  readonly steel: Steel;
  /** Bending by tensile strength instead of yield, where the basis's practice has both. */
  readonly byTensile: boolean;
  readonly bolt: BoltSize;
  readonly bolts: number;
  readonly holeDiameter: number;
  /** Bolt line to the web's face, or to the middle of the standing leg of an angle. */
  readonly boltToWeb: number;
  /** Bolt line to the yield line: 0.8 of the root radius or of the weld's leg nearer than the web. */
  readonly m: number;
  /** Bolt line to the free edge. */
  readonly edge: number;
  /** Effective lengths of the whole stub for modes 1 and 2. */
  readonly leff1: number;
  readonly leff2: number;
  /** Length of flange for one bolt. */
  readonly tributary: number;
}

/** The ply that a bolt bears on. */
export interface BearingPly {
  readonly size: BoltSize;
  readonly grade: BoltGrade;
  readonly holeDiameter: number;
  readonly normalHole: number;
  readonly thickness: number;
  readonly fu: number;
  /** A single lap joint with one row of bolts across the force. */
  readonly singleLapOneRow: boolean;
  /** Shear strength of one bolt, all planes, N: some bases let no bolt take more than that. */
  readonly boltShear: number;
  /** Whether the lengthening of the hole under service load matters. */
  readonly deformationMatters: boolean;
}

/** Bearing and tear-out of one bolt on one ply. */
export interface BearingStrength {
  /**
   * Design strength, N. `end`: centre to the free end ahead; `pitch`: to the next bolt ahead; `edge`: to the
   * nearest edge beside; `gauge`: to the next bolt beside. Infinity where there is none.
   */
  bolt(end: number, pitch: number, edge: number, gauge: number, rec: Rec): number;
}

/** A part that a fillet is laid on. */
export interface FilletPart extends Steel {
  readonly thickness: number;
  /** Fillets of the line that load this thickness: two where one lies on each side of a plate. */
  readonly fillets: number;
}

/** One fillet of a straight line of welds. */
export interface FilletSpec {
  readonly leg: number;
  readonly xu: number;
  readonly parts: readonly FilletPart[];
  readonly directional: boolean;
  /** The resultant passes through the middle of the line. */
  readonly concentric: boolean;
  /** The electrode matches the parts, which some bases take to settle the base metal. */
  readonly matching: boolean;
}

/** Strength of one fillet under a force per millimetre: `pull` across its axis, `shear` along it, N/mm. */
export interface FilletStrength {
  readonly hasBaseMetalCheck: boolean;
  metalUtilisation(pull: number, shear: number, rec: Rec): number;
  baseMetalUtilisation(pull: number, shear: number, rec: Rec): number;
  /** Taken off the length at the two ends together when the weld runs out before its ends, mm. */
  readonly runOut: number;
}

/** An angle bolted by one leg, tension. Areas mm2, lengths mm. */
export interface AngleByOneLeg {
  readonly area: number;
  readonly thickness: number;
  readonly connectedLeg: number;
  readonly otherLeg: number;
  /** From the back of the connected leg to the centroid. */
  readonly centroid: number;
  readonly rows: number;
  /** Bolts across the force in the connected leg. */
  readonly lines: number;
  readonly pitch: number;
  readonly toeDistance: number;
  readonly holeDiameter: number;
  /** Hole as deducted from a net area. */
  readonly deduction: number;
  readonly fu: number;
}

/** Limits of spacing, edges and weld sizes. Infinity or 0 where the standard sets none. */
export interface Detailing {
  readonly clauses: {
    readonly pitch: string;
    readonly edge: string;
    readonly end: string;
    readonly weldSize: string;
    readonly weldLength: string;
    readonly hole: string;
  };
  leastPitch(d: number, d0: number): number;
  leastGauge(d: number, d0: number): number;
  greatestPitch(t: number): number;
  leastEdge(d: number, d0: number, finish: EdgeFinish): number;
  leastEnd(d: number, d0: number, finish: EdgeFinish, boltsInLine: number): number;
  greatestEdge(t: number, exposed: boolean): number;
  /** By the thicker or the thinner part joined, mm. */
  leastWeldLeg(thicker: number, thinner: number): number;
  /** Along an edge of a part of thickness t, mm. */
  greatestWeldLeg(t: number): number;
  leastWeldThroat(): number;
  leastWeldLength(leg: number): number;
  greatestHole(d: number): number;
}

/** A design basis with its partial factors in place: what the limit states call. Every strength is factored. */
export interface Basis {
  readonly info: BasisInfo;
  readonly factors: PartialFactors;
  readonly clauses: Readonly<Record<ClauseKey, string>>;
  readonly detailing: Detailing;
  readonly modulus: number;
  /** The strength of a bolt group is the sum of what each bolt takes in shear and on both plies. */
  readonly boltByBolt: boolean;
  /** What a coefficient of the instantaneous centre is a multiple of, or null where the basis does not use that method. */
  readonly centreNormalisation: BoltNormalisation | null;
  /** Diameter of the normal round hole, mm, or null when the basis has none for a catalogued size. */
  normalHole(size: BoltSize, catalogued: CatalogueBoltSize | null): number | null;
  /** Added to a hole's diameter when an area is reduced for it, mm. */
  holeAllowance(making: HoleMaking): number;
  /** Whether the basis has strengths for a catalogued grade at any diameter. */
  hasGrade(grade: CatalogueGrade): boolean;
  /** The strengths of a catalogued grade at a bolt diameter, or null when the grade has none there. */
  grade(grade: CatalogueGrade, d: number): BoltGrade | null;
  boltShear(bolt: BoltInShear, rec: Rec): number;
  /** Strength of one bolt in tension, N: the bolt itself and, where the basis has it, punching of its ply. */
  boltTension(bolt: BoltInTension, rec: Rec): number;
  /**
   * Tension that one bolt still takes beside a shear, N, not below 0. `tension` from `boltTension`, N; `shearRatio`
   * shear over shear strength of that bolt: 0 gives `tension` back. The shear strength itself is a check of its own.
   */
  tensionWithShear(tension: number, shearRatio: number, rec: Rec): number;
  /**
   * Pull that a T-stub carries when each of its bolts may take `boltTension`, prying included, N. It never falls when
   * the bolt or the flange is stronger.
   */
  tStub(stub: TStub, boltTension: number, rec: Rec): number;
  bearing(ply: BearingPly): BearingStrength;
  /** Strength of a group in bearing from that of its bolts, N: number, least, greatest, sum, shear of one bolt. */
  bearingGroup(count: number, least: number, most: number, sum: number, boltShear: number, rec: Rec): number;
  /**
   * Whether the bolts of an eccentric group all take the least bearing of any, N: greatest bearing of a bolt, shear of
   * one bolt.
   */
  leastBearingThroughout(most: number, boltShear: number): boolean;
  fillet(spec: FilletSpec): FilletStrength;
  /** Design yield stress of a plate section, MPa. */
  yieldStress(fy: number): number;
  /** Areas mm2, strengths MPa. */
  blockShear(
    ant: number,
    agv: number,
    anv: number,
    fy: number,
    fu: number,
    pull: BlockPull,
    rec: Rec,
  ): number;
  /**
   * All bolts torn out along two gross planes each line, mm2, MPa; Infinity where the basis sees to it with the
   * bearing of each bolt.
   */
  tearOut(agv: number, fy: number, fu: number, rec: Rec): number;
  tensionYield(area: number, fy: number, rec: Rec): number;
  tensionRupture(net: number, fu: number, rec: Rec): number;
  /** Gross section of a plate or a web in shear, N. mm2, MPa. */
  shearYield(agv: number, fy: number, rec: Rec): number;
  /** Net section of a plate or a web in shear, N. mm2, MPa. */
  shearRupture(anv: number, fu: number, rec: Rec): number;
  /** Flexural buckling of a plate strip; `slenderness` is K L / r. */
  compression(area: number, fy: number, slenderness: number, rec: Rec): number;
  angleNetSection(angle: AngleByOneLeg, rec: Rec): number;
}

/** One line of the registry: what a basis is, and how it is made with a firm's partial factors. */
export interface BasisDefinition {
  readonly info: BasisInfo;
  create(factors: PartialFactors): Basis;
}

export type BasisRegistry = Readonly<Record<BasisId, BasisDefinition>>;
