import type { BoltGrade, BoltSize, PartialFactors } from '../../types.ts';
import type {
  AngleByOneLeg,
  Basis,
  BasisDefinition,
  BearingPly,
  BearingStrength,
  BlockPull,
  BoltInShear,
  BoltInTension,
  CatalogueBoltSize,
  CatalogueGrade,
  ClauseKey,
  FilletSpec,
  FilletStrength,
  Rec,
  TStub,
} from '../basis.ts';
import { pryingStub } from '../prying.ts';
import { AiscBearing } from './bearing.ts';
import { nominalBlockShear, uniformity } from './block-shear.ts';
import { longJointFactor, nominalBoltShear, stressesOf } from './bolt-shear.ts';
import { nominalBoltTension, tensionBesideShear } from './bolt-tension.ts';
import {
  criticalStress,
  E,
  nominalShearRupture,
  nominalShearYield,
  nominalTensileRupture,
  nominalTensileYield,
} from './connected-elements.ts';
import { detailing, standardClearance } from './detailing.ts';
import { AiscFillet } from './fillet-line.ts';
import { asd, type Format, lrfd, rupture, shearYielding, yielding } from './format.ts';
import { infoOf } from './notes.ts';
import { shearLagFactor } from './shear-lag.ts';

const clauses: Readonly<Record<ClauseKey, string>> = {
  filletMetal: 'AISC 360 J2.4(a)',
  filletBaseMetal: 'AISC 360 J2.4, J4',
  plateSection: 'AISC 360 J4.1(a), elastic section',
  boltShear: 'AISC 360 J3.7',
  bearing: 'AISC 360 J3.11a',
  blockShear: 'AISC 360 J4.3',
  tensionSection: 'AISC 360 J4.1',
  compression: 'AISC 360 J4.4, E3',
  memberNet: 'AISC 360 D2(b), D3',
  memberGross: 'AISC 360 D2(a)',
  shearSection: 'AISC 360 J4.2',
  webTension: 'AISC 360 J4.1',
  boltTension: 'AISC 360 J3.7',
  boltCombined: 'AISC 360 J3.8',
  tStub: 'AISC Manual Part 9, prying',
};

/** ANSI/AISC 360-22 in one of its formats. Its factors are part of the standard, so a firm's are not used. */
class AiscBasis implements Basis {
  readonly info;
  readonly clauses = clauses;
  readonly detailing = detailing;
  readonly modulus = E;
  readonly boltByBolt = true;
  readonly centreNormalisation = 'ultimate' as const;
  private readonly ofRupture: number;
  private readonly ofYielding: number;

  constructor(
    private readonly format: Format,
    readonly factors: PartialFactors,
  ) {
    this.info = infoOf(format);
    this.ofRupture = format.factor(rupture);
    this.ofYielding = format.factor(yielding);
  }

  normalHole(size: BoltSize, catalogued: CatalogueBoltSize | null): number | null {
    return catalogued === null ? size.d + standardClearance(size.d) : catalogued.hole.aisc;
  }

  holeAllowance(): number {
    return 2;
  }

  hasGrade(grade: CatalogueGrade): boolean {
    return grade.aisc.length > 0;
  }

  grade(grade: CatalogueGrade, d: number): BoltGrade | null {
    const band = grade.aisc.find(({ dMax }) => d <= dMax);
    const tensile = grade.minimum.find(({ dMax }) => d <= dMax);
    if (band === undefined || tensile === undefined) return null;
    const { fnt, fnvN, fnvX } = band;
    return { name: grade.name, fyb: grade.fyb, fub: tensile.fub, aisc: { fnt, fnvN, fnvX } };
  }

  boltShear(bolt: BoltInShear, rec: Rec): number {
    const { size, planes, threadsInPlane, jointLength } = bolt;
    const Ab = (Math.PI * size.d * size.d) / 4;
    const { fnvN, fnvX } = stressesOf(bolt.grade);
    const factor = longJointFactor(jointLength);
    const Fnv = factor * (threadsInPlane ? fnvN : fnvX);
    const strength = this.ofRupture * nominalBoltShear({ Fnv, Ab, planes });
    if (rec !== null) {
      const clause = clauses.boltShear;
      const threads = threadsInPlane ? 'threads in the planes (N)' : 'threads out of the planes (X)';
      rec.line('A_b', 'nominal unthreaded area', 'π d²/4', Ab, 'mm²', clause);
      rec.line('k_L', 'long joint', '0.833 beyond 965 mm', factor, '', 'AISC 360 Table J3.2');
      rec.line('F_nv', `shear stress, ${threads}`, '', Fnv, 'MPa', 'AISC 360 Table J3.2');
      rec.line('n_s', 'shear planes', '', planes, '', clause);
      const formula = `F_nv A_b n_s ${this.format.text(rupture)}`;
      rec.line('r_v', 'shear of one bolt', formula, strength, 'N', clause);
    }
    return strength;
  }

  boltTension({ size, grade }: BoltInTension, rec: Rec): number {
    const Ab = (Math.PI * size.d * size.d) / 4;
    const Fnt = stressesOf(grade).fnt;
    const strength = this.ofRupture * nominalBoltTension({ Fnt, Ab });
    if (rec !== null) {
      const clause = clauses.boltTension;
      rec.line('A_b', 'nominal unthreaded area', 'π d²/4', Ab, 'mm²', clause);
      rec.line('F_nt', 'tensile stress', '', Fnt, 'MPa', 'AISC 360 Table J3.2');
      rec.line('r_t', 'tension of one bolt', `F_nt A_b ${this.format.text(rupture)}`, strength, 'N', clause);
    }
    return strength;
  }

  tensionWithShear(tension: number, v: number, rec: Rec): number {
    const left = tensionBesideShear(tension, v);
    if (rec !== null) {
      const clause = clauses.boltCombined;
      const share = this.format.id === 'lrfd' ? 'f_rv/(φ F_nv)' : 'Ω f_rv/F_nv';
      rec.line('v', 'shear on the bolt', share, v, '', clause);
      rec.line('r_t,v', 'tension beside the shear', '(1.3 − v) r_t ≤ r_t', left, 'N', clause);
    }
    return left;
  }

  tStub(stub: TStub, boltTension: number, rec: Rec): number {
    const stress = stub.byTensile ? stub.steel.fu : stub.steel.fy;
    const bending = this.ofYielding * stress;
    const text = `${stub.byTensile ? 'F_u' : 'F_y'} ${this.format.text(yielding)}`;
    return pryingStub(stub, bending, text, boltTension, clauses.tStub, rec);
  }

  bearing(ply: BearingPly): BearingStrength {
    return new AiscBearing(ply, this.format);
  }

  bearingGroup(
    _count: number,
    _least: number,
    _most: number,
    sum: number,
    _boltShear: number,
    rec: Rec,
  ): number {
    if (rec !== null) rec.line('Σ r', 'sum over the bolts', '', sum, 'N', 'AISC 360 J3.7');
    return sum;
  }

  leastBearingThroughout(): boolean {
    return false;
  }

  fillet(spec: FilletSpec): FilletStrength {
    return new AiscFillet(spec, this.format);
  }

  yieldStress(fy: number): number {
    return this.ofYielding * fy;
  }

  blockShear(
    Ant: number,
    Agv: number,
    Anv: number,
    Fy: number,
    Fu: number,
    pull: BlockPull,
    rec: Rec,
  ): number {
    const Ubs = uniformity[pull];
    const strength = this.ofRupture * nominalBlockShear(Ant, Agv, Anv, Fy, Fu, Ubs);
    if (rec !== null) {
      rec.line('U_bs', 'uniformity of the tension', '', Ubs, '', clauses.blockShear);
      const formula = `(0.60 min(F_u A_nv, F_y A_gv) + U_bs F_u A_nt) ${this.format.text(rupture)}`;
      rec.line('R', 'block', formula, strength, 'N', clauses.blockShear);
    }
    return strength;
  }

  tearOut(): number {
    return Infinity;
  }

  tensionYield(area: number, fy: number, rec: Rec): number {
    const strength = this.ofYielding * nominalTensileYield(fy, area);
    if (rec !== null) {
      rec.line(
        'R_y',
        'yield',
        `F_y A_g ${this.format.text(yielding)}`,
        strength,
        'N',
        'AISC 360 J4.1(a), D2(a)',
      );
    }
    return strength;
  }

  tensionRupture(net: number, fu: number, rec: Rec): number {
    const strength = this.ofRupture * nominalTensileRupture(fu, net);
    if (rec !== null) {
      rec.line(
        'R_u',
        'rupture',
        `F_u A_e ${this.format.text(rupture)}`,
        strength,
        'N',
        'AISC 360 J4.1(b), D2(b)',
      );
    }
    return strength;
  }

  shearYield(Agv: number, Fy: number, rec: Rec): number {
    const strength = this.format.factor(shearYielding) * nominalShearYield(Fy, Agv);
    if (rec !== null) {
      const formula = `0.60 F_y A_gv ${this.format.text(shearYielding)}`;
      rec.line('V_y', 'yield', formula, strength, 'N', 'AISC 360 J4.2(a)');
    }
    return strength;
  }

  shearRupture(Anv: number, Fu: number, rec: Rec): number {
    const strength = this.ofRupture * nominalShearRupture(Fu, Anv);
    if (rec !== null) {
      const formula = `0.60 F_u A_nv ${this.format.text(rupture)}`;
      rec.line('V_u', 'rupture', formula, strength, 'N', 'AISC 360 J4.2(b)');
    }
    return strength;
  }

  compression(area: number, fy: number, Lcr: number, rec: Rec): number {
    const Fcr = criticalStress(fy, Lcr);
    const strength = this.ofYielding * Fcr * area;
    if (rec !== null) {
      const clause = clauses.compression;
      const formula = 'F_y to L_c/r = 25; 0.658^(F_y/F_e) F_y; 0.877 F_e for F_y/F_e > 2.25';
      rec.line('F_cr', 'critical stress', formula, Fcr, 'MPa', clause);
      rec.line('P', 'buckling', `F_cr A ${this.format.text(yielding)}`, strength, 'N', clause);
    }
    return strength;
  }

  angleNetSection(a: AngleByOneLeg, rec: Rec): number {
    const An = Math.max(0, a.area - a.lines * a.deduction * a.thickness);
    const length = (a.rows - 1) * a.pitch;
    const share = (a.connectedLeg * a.thickness) / a.area;
    const U = shearLagFactor(a.centroid, length, share);
    if (rec !== null) {
      const clause = 'AISC 360 D3, Table D3.1';
      rec.line('A_n', 'net area of one angle', 'A − holes', An, 'mm²', 'AISC 360 B4.3b');
      rec.line('x', 'back of the connected leg to the centroid', '', a.centroid, 'mm', clause);
      rec.line('l', 'between the end rows', '', length, 'mm', clause);
      rec.line('U', 'shear lag', '1 − x/l, not below b t/A_g of the connected leg', U, '', clause);
    }
    return this.tensionRupture(U * An, a.fu, rec);
  }
}

/** ANSI/AISC 360-22, load and resistance factor design. */
export const aisc360Lrfd: BasisDefinition = {
  info: infoOf(lrfd),
  create: (factors) => new AiscBasis(lrfd, factors),
};

/** ANSI/AISC 360-22, allowable strength design. */
export const aisc360Asd: BasisDefinition = {
  info: infoOf(asd),
  create: (factors) => new AiscBasis(asd, factors),
};
