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
import { CsaBearing } from './bearing.ts';
import { blockResistance, tensionEfficiency } from './block-shear.ts';
import { boltShearResistance, shearCoefficient } from './bolt-shear.ts';
import { boltTensionResistance, tensionBesideShear } from './bolt-tension.ts';
import { compressionResistance, slenderness } from './compression.ts';
import { detailing } from './detailing.ts';
import { E, phi } from './factors.ts';
import { CsaFillet } from './fillet-weld.ts';
import { info } from './notes.ts';
import { grossYield, netSectionResistance, oneLegFactor } from './tension-member.ts';
import { shearRupture, shearYield } from './shear-section.ts';

const clauses: Readonly<Record<ClauseKey, string>> = {
  filletMetal: 'CSA S16 13.13.2.2',
  filletBaseMetal: 'CSA S16 13.13.2.2',
  plateSection: 'CSA S16 13.1, elastic section',
  boltShear: 'CSA S16 13.12.1.2(c)',
  bearing: 'CSA S16 13.12.1.2(a)',
  blockShear: 'CSA S16 13.11',
  tensionSection: 'CSA S16 13.2',
  compression: 'CSA S16 13.3.1',
  memberNet: 'CSA S16 12.3.3.2, 13.2(a)(iii)',
  memberGross: 'CSA S16 13.2(a)(i)',
  shearSection: 'CSA S16 13.4, 13.11',
  webTension: 'CSA S16 13.2',
  boltTension: 'CSA S16 13.12.1.3',
  boltCombined: 'CSA S16 13.12.1.4',
  tStub: 'CSA S16 13.12.1.3, CISC Handbook Part 3',
};

/** CSA S16:19. Resistance factors are part of the standard, so a firm's partial factors are not used. */
class CsaBasis implements Basis {
  readonly info = info;
  readonly clauses = clauses;
  readonly detailing = detailing;
  readonly modulus = E;
  readonly boltByBolt = false;
  readonly centreNormalisation = 'atMaximum' as const;

  constructor(readonly factors: PartialFactors) {}

  normalHole(size: BoltSize, catalogued: CatalogueBoltSize | null): number | null {
    return catalogued === null ? size.d + 2 : catalogued.hole.csa;
  }

  holeAllowance(making: HoleMaking): number {
    return making === 'punched' ? 2 : 0;
  }

  hasGrade(grade: CatalogueGrade): boolean {
    return grade.minimum.length > 0;
  }

  grade(grade: CatalogueGrade, d: number): BoltGrade | null {
    const band = grade.minimum.find(({ dMax }) => d <= dMax);
    return band === undefined ? null : { name: grade.name, fyb: grade.fyb, fub: band.fub };
  }

  boltShear(bolt: BoltInShear, rec: Rec): number {
    const d = bolt.size.d;
    const Ab = (Math.PI * d * d) / 4;
    const Fu = bolt.grade.fub;
    const { planes: m, threadsInPlane: threadsIntercepted, jointLength: L } = bolt;
    const Vr = boltShearResistance({ m, Ab, Fu, threadsIntercepted, L });
    if (rec !== null) {
      const clause = clauses.boltShear;
      rec.line('A_b', 'nominal shank area', 'π d²/4', Ab, 'mm²', clause);
      rec.line('F_u', 'tensile strength of the bolt', '', Fu, 'MPa', clause);
      rec.line('m', 'shear planes', '', m, '', clause);
      rec.line('c', 'coefficient', '0.60; 0.50 for L ≥ 760 mm', shearCoefficient(L), '', clause);
      const formula = `c φ_b m A_b F_u${threadsIntercepted ? ' × 0.70, threads in the plane' : ''}, φ_b = 0.80`;
      rec.line('V_r', 'shear of one bolt', formula, Vr, 'N', clause);
    }
    return Vr;
  }

  boltTension({ size, grade }: BoltInTension, rec: Rec): number {
    const Ab = (Math.PI * size.d * size.d) / 4;
    const Tr = boltTensionResistance({ Ab, Fu: grade.fub });
    if (rec !== null) {
      const clause = clauses.boltTension;
      rec.line('A_b', 'nominal shank area', 'π d²/4', Ab, 'mm²', clause);
      rec.line('F_u', 'tensile strength of the bolt', '', grade.fub, 'MPa', clause);
      rec.line('T_r', 'tension of one bolt', '0.75 φ_b A_b F_u, φ_b = 0.80', Tr, 'N', clause);
    }
    return Tr;
  }

  tensionWithShear(Tr: number, v: number, rec: Rec): number {
    const left = tensionBesideShear(Tr, v);
    if (rec !== null) {
      const clause = clauses.boltCombined;
      rec.line('v', 'shear on the bolt', 'V/V_r', v, '', clause);
      rec.line('T_r,v', 'tension beside the shear', '√(1 − v²) T_r', left, 'N', clause);
    }
    return left;
  }

  tStub(stub: TStub, boltTension: number, rec: Rec): number {
    const { fy, fu } = stub.steel;
    const bending = phi * (stub.byTensile ? fu : fy);
    const text = stub.byTensile ? 'φ F_u, φ = 0.90' : 'φ F_y, φ = 0.90';
    return pryingStub(stub, bending, text, boltTension, clauses.tStub, rec);
  }

  bearing(ply: BearingPly): BearingStrength {
    return new CsaBearing(ply);
  }

  bearingGroup(count: number, least: number): number {
    return count * least;
  }

  leastBearingThroughout(): boolean {
    return false;
  }

  fillet(spec: FilletSpec): FilletStrength {
    return new CsaFillet(spec);
  }

  yieldStress(fy: number): number {
    return phi * fy;
  }

  blockShear(
    An: number,
    Agv: number,
    _anv: number,
    Fy: number,
    Fu: number,
    pull: BlockPull,
    rec: Rec,
  ): number {
    const Ut = tensionEfficiency[pull];
    const strength = blockResistance(Ut, An, Agv, Fy, Fu);
    if (rec !== null) {
      const clause = clauses.blockShear;
      rec.line('U_t', 'efficiency of the tension plane', '', Ut, '', clause);
      const formula =
        'φ_u [U_t A_n F_u + 0.60 A_gv (F_y + F_u)/2], F_y > 460 MPa in place of the mean; φ_u = 0.75';
      rec.line('T_r', 'block', formula, strength, 'N', clause);
    }
    return strength;
  }

  tearOut(Agv: number, Fy: number, Fu: number, rec: Rec): number {
    const strength = blockResistance(0, 0, Agv, Fy, Fu);
    if (rec !== null) {
      const clause = clauses.blockShear;
      rec.line('', 'tear-out, two planes along every line', '', '', '', '');
      rec.line('A_gv', 'gross area in shear', '2 m t × shortest line', Agv, 'mm²', clause);
      rec.line('T_r', 'tear-out', 'φ_u 0.60 A_gv (F_y + F_u)/2, φ_u = 0.75', strength, 'N', clause);
    }
    return strength;
  }

  tensionYield(area: number, fy: number, rec: Rec): number {
    const strength = grossYield(area, fy);
    if (rec !== null) rec.line('T_r,y', 'yield', 'φ A_g F_y, φ = 0.90', strength, 'N', clauses.memberGross);
    return strength;
  }

  tensionRupture(net: number, fu: number, rec: Rec): number {
    const strength = netSectionResistance(net, fu);
    if (rec !== null) {
      rec.line('T_r,u', 'rupture', 'φ_u A_ne F_u, φ_u = 0.75', strength, 'N', 'CSA S16 13.2(a)(iii)');
    }
    return strength;
  }

  shearYield(Agv: number, Fy: number, rec: Rec): number {
    const strength = shearYield(Agv, Fy);
    if (rec !== null)
      rec.line('V_r,y', 'yield', '0.60 φ A_gv F_y, φ = 0.90', strength, 'N', clauses.shearSection);
    return strength;
  }

  shearRupture(Anv: number, Fu: number, rec: Rec): number {
    const strength = shearRupture(Anv, Fu);
    if (rec !== null)
      rec.line('V_r,u', 'rupture', '0.60 φ_u A_nv F_u, φ_u = 0.75', strength, 'N', clauses.shearSection);
    return strength;
  }

  compression(area: number, fy: number, KLr: number, rec: Rec): number {
    const lambda = slenderness(KLr, fy);
    const strength = compressionResistance(area, fy, lambda);
    if (rec !== null) {
      rec.line('λ', 'slenderness', '(K L/r) √(F_y/(π² E))', lambda, '', clauses.compression);
      const formula = 'φ A F_y (1 + λ^2n)^(−1/n), n = 1.34, φ = 0.90';
      rec.line('C_r', 'buckling', formula, strength, 'N', clauses.compression);
    }
    return strength;
  }

  angleNetSection(a: AngleByOneLeg, rec: Rec): number {
    const An = Math.max(0, a.area - a.lines * a.deduction * a.thickness);
    const factor = oneLegFactor(a.rows);
    if (rec !== null) {
      const clause = 'CSA S16 12.3.3.2';
      rec.line('A_n', 'net area of one angle', 'A − holes', An, 'mm²', 'CSA S16 12.3.1');
      rec.line('U', 'shear lag, one leg', '0.80 for ≥ 4 rows, else 0.60', factor, '', clause);
    }
    return this.tensionRupture(factor * An, a.fu, rec);
  }
}

export const csaS16: BasisDefinition = {
  info,
  create: (factors) => new CsaBasis(factors),
};
