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
  HoleMaking,
  Rec,
  TStub,
} from '../basis.ts';
import { pryingStub } from '../prying.ts';
import { SansBearing } from './bearing.ts';
import { blockTearing } from './block-shear.ts';
import { boltShearResistance, longJointFactor } from './bolt-shear.ts';
import { boltTensionResistance, tensionBesideShear } from './bolt-tension.ts';
import { compressionResistance, slenderness } from './compression.ts';
import { detailing } from './detailing.ts';
import { E, phi } from './factors.ts';
import { SansFillet } from './fillet-weld.ts';
import { info } from './notes.ts';
import { grossYield, netSectionResistance, oneLegFactor } from './tension-member.ts';
import { shearRupture, shearYield } from './shear-section.ts';

const clauses: Readonly<Record<ClauseKey, string>> = {
  filletMetal: 'SANS 10162-1 13.13.2.2(b)',
  filletBaseMetal: 'SANS 10162-1 13.13.2.2(a)',
  plateSection: 'SANS 10162-1 13.1, elastic section',
  boltShear: 'SANS 10162-1 13.12.1.1',
  bearing: 'SANS 10162-1 13.10',
  blockShear: 'SANS 10162-1 13.11',
  tensionSection: 'SANS 10162-1 13.2',
  compression: 'SANS 10162-1 13.3.1',
  memberNet: 'SANS 10162-1 12.3.3.2, 13.2(a)(ii)',
  memberGross: 'SANS 10162-1 13.2(a)(i)',
  shearSection: 'SANS 10162-1 13.4, 13.11',
  webTension: 'SANS 10162-1 13.2',
  boltTension: 'SANS 10162-1 13.12.1.2',
  boltCombined: 'SANS 10162-1 13.12.1.3',
  tStub: 'SANS 10162-1 13.12.1.2, published prying method',
};

/** SANS 10162-1:2011. Resistance factors are part of the standard, so a firm's partial factors are not used. */
class SansBasis implements Basis {
  readonly info = info;
  readonly clauses = clauses;
  readonly detailing = detailing;
  readonly modulus = E;
  readonly boltByBolt = false;
  readonly centreNormalisation = 'ultimate' as const;

  constructor(readonly factors: PartialFactors) {}

  normalHole(size: BoltSize, catalogued: CatalogueBoltSize | null): number {
    return catalogued?.hole.sans ?? size.d + (size.d >= 27 ? 3 : 2);
  }

  holeAllowance(making: HoleMaking): number {
    return making === 'punched' ? 2 : 0;
  }

  hasGrade(): boolean {
    return true;
  }

  grade(grade: CatalogueGrade, d: number): BoltGrade | null {
    const band = grade.minimum.find(({ dMax }) => d <= dMax);
    return band === undefined ? null : { name: grade.name, fyb: grade.fyb, fub: band.fub };
  }

  boltShear(bolt: BoltInShear, rec: Rec): number {
    const d = bolt.size.d;
    const Ab = (Math.PI * d * d) / 4;
    const fub = bolt.grade.fub;
    const threadsIntercepted = bolt.threadsInPlane;
    const single = boltShearResistance({ m: bolt.planes, Ab, fub, threadsIntercepted });
    const factor = longJointFactor(bolt.jointLength, d);
    if (rec !== null) {
      const clause = clauses.boltShear;
      rec.line('A_b', 'nominal shank area', 'π d²/4', Ab, 'mm²', clause);
      rec.line('f_ub', 'tensile strength of the bolt', '', fub, 'MPa', clause);
      rec.line('m', 'shear planes', '', bolt.planes, '', clause);
      const formula = `0.60 φ_b m A_b f_ub${threadsIntercepted ? ' × 0.70, threads in the plane' : ''}, φ_b = 0.80`;
      rec.line('V_r,0', 'shear of one bolt', formula, single, 'N', clause);
      rec.line('k_L', 'long joint', '1 up to 15 d, then 1.075 − 0.005 L/d ≥ 0.75', factor, '', clause);
    }
    return single * factor;
  }

  boltTension({ size, grade }: BoltInTension, rec: Rec): number {
    const Ab = (Math.PI * size.d * size.d) / 4;
    const Tr = boltTensionResistance({ Ab, fub: grade.fub });
    if (rec !== null) {
      const clause = clauses.boltTension;
      rec.line('A_b', 'nominal shank area', 'π d²/4', Ab, 'mm²', clause);
      rec.line('f_ub', 'tensile strength of the bolt', '', grade.fub, 'MPa', clause);
      rec.line('T_r', 'tension of one bolt', '0.75 φ_b A_b f_ub, φ_b = 0.80', Tr, 'N', clause);
    }
    return Tr;
  }

  tensionWithShear(Tr: number, v: number, rec: Rec): number {
    const left = tensionBesideShear(Tr, v);
    if (rec !== null) {
      const clause = clauses.boltCombined;
      rec.line('v', 'shear on the bolt', 'V/V_r', v, '', clause);
      const line = Math.max(0, Math.min(1, 1.4 - v)) * Tr;
      rec.line('T_1', 'by the straight line', '(1.4 − v) T_r ≤ T_r', line, 'N', clause);
      const circle = Math.sqrt(Math.max(0, 1 - v * v)) * Tr;
      rec.line('T_2', 'by the circle', '√(1 − v²) T_r', circle, 'N', clause);
      rec.line('T_r,v', 'tension beside the shear', 'min(T_1, T_2)', left, 'N', clause);
    }
    return left;
  }

  tStub(stub: TStub, boltTension: number, rec: Rec): number {
    const { fy, fu } = stub.steel;
    const bending = phi * (stub.byTensile ? fu : fy);
    const text = stub.byTensile ? 'φ f_u, φ = 0.90' : 'φ f_y, φ = 0.90';
    return pryingStub(stub, bending, text, boltTension, clauses.tStub, rec);
  }

  bearing(ply: BearingPly): BearingStrength {
    return new SansBearing(ply);
  }

  bearingGroup(
    count: number,
    least: number,
    _most: number,
    _sum: number,
    _boltShear: number,
    rec: Rec,
  ): number {
    if (rec !== null) {
      rec.line('B_r,min', 'the weakest bolt, equal shares', '', least, 'N', clauses.bearing);
    }
    return count * least;
  }

  leastBearingThroughout(): boolean {
    return false;
  }

  fillet(spec: FilletSpec): FilletStrength {
    return new SansFillet(spec);
  }

  yieldStress(fy: number): number {
    return phi * fy;
  }

  blockShear(
    ant: number,
    agv: number,
    anv: number,
    fy: number,
    fu: number,
    pull: BlockPull,
    rec: Rec,
  ): number {
    const coped = pull === 'coped-one-line' || pull === 'coped-two-lines';
    const strength = blockTearing(ant, agv, anv, fy, fu, coped ? 0.5 : 1);
    if (rec !== null) {
      const formula = `${coped ? '0.5 ' : ''}φ A_nt f_u + 0.60 φ min(A_gv f_y, A_nv f_u), φ = 0.90`;
      rec.line('T_r + V_r', 'block', formula, strength, 'N', clauses.blockShear);
    }
    return strength;
  }

  tearOut(): number {
    return Infinity;
  }

  tensionYield(area: number, fy: number, rec: Rec): number {
    const strength = grossYield(area, fy);
    if (rec !== null)
      rec.line('T_r,y', 'yield', 'φ A_g f_y, φ = 0.90', strength, 'N', 'SANS 10162-1 13.2(a)(i)');
    return strength;
  }

  tensionRupture(net: number, fu: number, rec: Rec): number {
    const strength = netSectionResistance(net, fu);
    if (rec !== null) {
      rec.line('T_r,u', 'rupture', '0.85 φ A_ne f_u, φ = 0.90', strength, 'N', 'SANS 10162-1 13.2(a)(ii)');
    }
    return strength;
  }

  shearYield(agv: number, fy: number, rec: Rec): number {
    const strength = shearYield(agv, fy);
    if (rec !== null)
      rec.line('V_r,y', 'yield', '0.60 φ A_gv f_y, φ = 0.90', strength, 'N', clauses.shearSection);
    return strength;
  }

  shearRupture(anv: number, fu: number, rec: Rec): number {
    const strength = shearRupture(anv, fu);
    if (rec !== null)
      rec.line('V_r,u', 'rupture', '0.60 φ A_nv f_u, φ = 0.90', strength, 'N', clauses.shearSection);
    return strength;
  }

  compression(area: number, fy: number, KLr: number, rec: Rec): number {
    const lambda = slenderness(KLr, fy);
    const strength = compressionResistance(area, fy, lambda);
    if (rec !== null) {
      rec.line('λ', 'slenderness', '(K L/r) √(f_y/(π² E))', lambda, '', clauses.compression);
      const formula = 'φ A f_y (1 + λ^2n)^(−1/n), n = 1.34, φ = 0.90';
      rec.line('C_r', 'buckling', formula, strength, 'N', clauses.compression);
    }
    return strength;
  }

  angleNetSection(a: AngleByOneLeg, rec: Rec): number {
    const Ane = Math.max(0, a.area - a.lines * a.deduction * a.thickness);
    const factor = oneLegFactor(a.rows);
    if (rec !== null) {
      rec.line('A_ne', 'net area of one angle', 'A − holes', Ane, 'mm²', 'SANS 10162-1 12.3');
      rec.line(
        'U',
        'shear lag, one leg',
        '0.80 for ≥ 4 rows, else 0.60',
        factor,
        '',
        'SANS 10162-1 12.3.3.2',
      );
    }
    return this.tensionRupture(factor * Ane, a.fu, rec);
  }
}

export const sans101621: BasisDefinition = {
  info,
  create: (factors) => new SansBasis(factors),
};
