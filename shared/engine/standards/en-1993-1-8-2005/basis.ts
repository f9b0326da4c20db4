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
import { EnBearing } from './bearing.ts';
import { blockTearing } from './block-tearing.ts';
import { boltShearResistance, longJointFactor, shearCoefficient, smallBoltFactor } from './bolt-shear.ts';
import { boltTensionResistance, punchingResistance, tensionBesideShear } from './bolt-tension.ts';
import { columnCurveC, compressionResistance, E, slenderness } from './compression.ts';
import { detailing, normalClearance } from './detailing.ts';
import { EnFillet } from './fillet-weld.ts';
import { info } from './notes.ts';
import { angleByOneLeg, equalAngleArea, grossYield, netSectionResistance } from './tension-member.ts';
import { shearRupture, shearYield } from './shear-section.ts';
import { tStubResistance, tyingFactor } from './t-stub.ts';

const clauses: Readonly<Record<ClauseKey, string>> = {
  filletMetal: 'EN 1993-1-8 4.5.3',
  filletBaseMetal: 'no check in EN 1993-1-8',
  plateSection: 'EN 1993-1-1 6.2.1(5)',
  boltShear: 'EN 1993-1-8 Table 3.4',
  bearing: 'EN 1993-1-8 Table 3.4, 3.7',
  blockShear: 'EN 1993-1-8 3.10.2',
  tensionSection: 'EN 1993-1-1 6.2.3',
  compression: 'EN 1993-1-1 6.3.1',
  memberNet: 'EN 1993-1-8 3.10.3, EN 1993-1-1 6.2.3',
  memberGross: 'EN 1993-1-1 6.2.3, 6.2.4',
  shearSection: 'EN 1993-1-1 6.2.6, 6.2.3',
  webTension: 'EN 1993-1-1 6.2.3',
  boltTension: 'EN 1993-1-8 Table 3.4',
  boltCombined: 'EN 1993-1-8 Table 3.4',
  tStub: 'EN 1993-1-8 6.2.4, Table 6.2',
};

/** EN 1993-1-8:2005 with EN 1993-1-1:2005, with a firm's partial factors. */
class EnBasis implements Basis {
  readonly info = info;
  readonly clauses = clauses;
  readonly detailing = detailing;
  readonly modulus = E;
  readonly boltByBolt = false;
  readonly centreNormalisation = null;

  constructor(readonly factors: PartialFactors) {}

  normalHole(size: BoltSize, catalogued: CatalogueBoltSize | null): number {
    return catalogued?.hole.en ?? size.d + normalClearance(size.d);
  }

  holeAllowance(): number {
    return 0;
  }

  hasGrade(grade: CatalogueGrade): boolean {
    return grade.nominal !== null;
  }

  grade(grade: CatalogueGrade): BoltGrade | null {
    return grade.nominal === null ? null : { name: grade.name, fyb: grade.fyb, fub: grade.nominal };
  }

  boltShear(bolt: BoltInShear, rec: Rec): number {
    const { size, grade, threadsInPlane } = bolt;
    const alphaV = shearCoefficient(grade.fyb, grade.fub, threadsInPlane);
    const A = threadsInPlane ? size.stressArea : (Math.PI * size.d * size.d) / 4;
    const plane = boltShearResistance({ alphaV, fub: grade.fub, A, gammaM2: this.factors.gammaM2 });
    const long = longJointFactor(bolt.jointLength, size.d);
    const small = smallBoltFactor(size.d, bolt.holeDiameter, grade.fyb, grade.fub);
    if (rec !== null) {
      const clause = clauses.boltShear;
      rec.line('A', threadsInPlane ? 'tensile stress area' : 'shank area', '', A, 'mm²', clause);
      rec.line('f_ub', 'tensile strength of the bolt', '', grade.fub, 'MPa', clause);
      rec.line('α_v', threadsInPlane ? 'threads in the plane' : 'shank in the plane', '', alphaV, '', clause);
      rec.line('F_v,Rd', 'shear of one bolt, one plane', 'α_v f_ub A/γ_M2', plane, 'N', clause);
      rec.line('n_p', 'shear planes', '', bolt.planes, '', clause);
      rec.line('β_Lf', 'long joint', '1 − (L_j − 15d)/(200d)', long, '', 'EN 1993-1-8 3.8');
      if (small < 1) rec.line('k_s', 'M12, M14, 2 mm clearance', '', small, '', 'EN 1993-1-8 3.6.1(5)');
    }
    return bolt.planes * plane * long * small;
  }

  boltTension(bolt: BoltInTension, rec: Rec): number {
    const { size, grade, headDiameter: dm, plateThickness: tp, plateFu: fu } = bolt;
    const { gammaM2 } = this.factors;
    const FtRd = boltTensionResistance({ fub: grade.fub, As: size.stressArea, gammaM2 });
    const BpRd = punchingResistance({ dm, tp, fu, gammaM2 });
    if (rec !== null) {
      const clause = clauses.boltTension;
      rec.line('A_s', 'tensile stress area', '', size.stressArea, 'mm²', clause);
      rec.line('f_ub', 'tensile strength of the bolt', '', grade.fub, 'MPa', clause);
      rec.line('F_t,Rd', 'tension of one bolt', '0.9 f_ub A_s/γ_M2', FtRd, 'N', clause);
      rec.line('d_m', 'mean width of the head or nut', '', dm, 'mm', clause);
      rec.line('B_p,Rd', 'punching of the ply', '0.6 π d_m t_p f_u/γ_M2', BpRd, 'N', clause);
    }
    return Math.min(FtRd, BpRd);
  }

  tensionWithShear(FtRd: number, v: number, rec: Rec): number {
    const left = tensionBesideShear(FtRd, v);
    if (rec !== null) {
      const clause = clauses.boltCombined;
      rec.line('v', 'shear on the bolt', 'F_v/F_v,Rd', v, '', clause);
      const formula = '1.4 F_t,Rd (1 − v) ≤ F_t,Rd, F_t,Rd not above B_p,Rd';
      rec.line('F_t,v,Rd', 'tension beside the shear', formula, left, 'N', clause);
    }
    return left;
  }

  tStub(stub: TStub, boltTension: number, rec: Rec): number {
    const { fy, fu } = stub.steel;
    const bending = stub.byTensile ? fu / tyingFactor : fy / this.factors.gammaM0;
    return tStubResistance(stub, bending, boltTension, rec);
  }

  bearing(ply: BearingPly): BearingStrength {
    return new EnBearing(ply, this.factors.gammaM2);
  }

  bearingGroup(count: number, least: number, most: number, sum: number, boltShear: number, rec: Rec): number {
    const shared = boltShear >= most;
    if (rec !== null) {
      const text = shared
        ? 'shear of a bolt ≥ its bearing everywhere: sum over the bolts'
        : 'shear of a bolt < some bearing: number times the least';
      rec.line('group', text, '', shared ? sum : count * least, 'N', 'EN 1993-1-8 3.7');
    }
    return shared ? sum : count * least;
  }

  /** EN 1993-1-8:2005, 3.7. */
  leastBearingThroughout(most: number, boltShear: number): boolean {
    return boltShear < most;
  }

  fillet(spec: FilletSpec): FilletStrength {
    return new EnFillet(spec, this.factors.gammaM2);
  }

  yieldStress(fy: number): number {
    return fy / this.factors.gammaM0;
  }

  blockShear(
    ant: number,
    _agv: number,
    anv: number,
    fy: number,
    fu: number,
    pull: BlockPull,
    rec: Rec,
  ): number {
    const eccentric = pull !== 'even';
    const strength = blockTearing(ant, anv, fy, fu, eccentric, this.factors.gammaM0, this.factors.gammaM2);
    if (rec !== null) {
      const formula = `${eccentric ? '0.5 ' : ''}f_u A_nt/γ_M2 + f_y A_nv/(√3 γ_M0)`;
      const symbol = eccentric ? 'V_eff,2,Rd' : 'V_eff,1,Rd';
      rec.line(symbol, 'block', formula, strength, 'N', clauses.blockShear);
    }
    return strength;
  }

  tearOut(): number {
    return Infinity;
  }

  tensionYield(area: number, fy: number, rec: Rec): number {
    const strength = grossYield(area, fy, this.factors.gammaM0);
    if (rec !== null) rec.line('N_pl,Rd', 'yield', 'A f_y/γ_M0', strength, 'N', 'EN 1993-1-1 6.2.3(2)a');
    return strength;
  }

  tensionRupture(net: number, fu: number, rec: Rec): number {
    const strength = netSectionResistance(net, fu, this.factors.gammaM2);
    if (rec !== null) {
      rec.line('N_u,Rd', 'rupture', '0.9 A_net f_u/γ_M2', strength, 'N', 'EN 1993-1-1 6.2.3(2)b');
    }
    return strength;
  }

  shearYield(agv: number, fy: number, rec: Rec): number {
    const strength = shearYield(agv, fy, this.factors.gammaM0);
    if (rec !== null)
      rec.line('V_pl,Rd', 'yield', 'A_v f_y/(√3 γ_M0)', strength, 'N', 'EN 1993-1-1 6.2.6(2)');
    return strength;
  }

  shearRupture(anv: number, fu: number, rec: Rec): number {
    const strength = shearRupture(anv, fu, this.factors.gammaM2);
    if (rec !== null) {
      const clause = 'EN 1993-1-1 6.2.6, rupture as in 6.2.3(2)b';
      rec.line('V_u,Rd', 'rupture', 'A_v,net f_u/(√3 γ_M2)', strength, 'N', clause);
    }
    return strength;
  }

  compression(area: number, fy: number, LcrOverI: number, rec: Rec): number {
    const lambdaBar = slenderness(LcrOverI, fy);
    const chi = columnCurveC(lambdaBar);
    const strength = compressionResistance(chi, area, fy, this.factors.gammaM1);
    if (rec !== null) {
      rec.line('λ̄', 'slenderness', '(L_cr/i)/(π √(E/f_y))', lambdaBar, '', 'EN 1993-1-1 6.3.1.3');
      rec.line('χ', 'reduction, curve c, α = 0.49', '', chi, '', 'EN 1993-1-1 6.3.1.2');
      rec.line('N_b,Rd', 'buckling', 'χ A f_y/γ_M1', strength, 'N', 'EN 1993-1-1 6.3.1.1');
    }
    return strength;
  }

  angleNetSection(a: AngleByOneLeg, rec: Rec): number {
    const byShortLeg = a.connectedLeg < a.otherLeg;
    const gross = byShortLeg ? Math.min(a.area, equalAngleArea(a.connectedLeg, a.thickness)) : a.area;
    const Anet = Math.max(0, gross - a.lines * a.deduction * a.thickness);
    const strength = angleByOneLeg({
      bolts: a.rows,
      e2: a.toeDistance,
      d0: a.holeDiameter,
      t: a.thickness,
      p1: a.pitch,
      Anet,
      fu: a.fu,
      gammaM2: this.factors.gammaM2,
    });
    if (rec !== null) {
      const formula = byShortLeg ? '(2b − t)t − holes, short leg' : 'A − holes';
      rec.line('A_net', 'net area of one angle', formula, Anet, 'mm²', 'EN 1993-1-8 3.10.3');
      rec.line('e_2', 'hole to the toe', '', a.toeDistance, 'mm', 'EN 1993-1-8 3.10.3');
      const rule = a.rows === 1 ? '2.0 (e_2 − 0.5 d_0) t f_u/γ_M2' : 'β A_net f_u/γ_M2, β of Table 3.8';
      rec.line('N_u,Rd,1', 'rupture of one angle', rule, strength, 'N', 'EN 1993-1-8 3.10.3');
    }
    return strength;
  }
}

export const en199318: BasisDefinition = {
  info,
  create: (factors) => new EnBasis(factors),
};
