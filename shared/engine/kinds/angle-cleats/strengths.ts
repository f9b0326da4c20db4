import { WebStrengths } from '../beam-end/web-strengths.ts';
import * as cleat from './cleat-limits.ts';
import type { CleatModel } from './model.ts';
import * as support from './support-limits.ts';

/** What the load angle does not change, worked out once. N, MPa. */
export class Strengths {
  readonly grossShear: number;
  readonly netShear: number;
  readonly tension: number;
  readonly webLegAlong: number;
  readonly webLegAcross: number;
  readonly outstandingLegBlock: number;
  readonly legBending: number;
  readonly supportBoltShear: number;
  readonly outstandingLegBearing: number;
  readonly supportBearing: number;
  readonly web: WebStrengths;
  /** Design stress of the cleats in rupture. */
  readonly ruptureStress: number;

  constructor(m: CleatModel) {
    this.grossShear = cleat.grossShear(m, null);
    this.netShear = cleat.netShear(m, null);
    this.tension = cleat.tension(m, null);
    this.webLegAlong = cleat.webLegBlockAlong(m, null);
    this.webLegAcross = cleat.webLegBlockAcross(m, null);
    this.outstandingLegBlock = cleat.outstandingLegBlock(m, null);
    this.legBending = support.legBending(m, null);
    this.supportBoltShear = support.supportBoltShear(m, null);
    this.outstandingLegBearing = support.outstandingLegBearing(m, null);
    this.supportBearing = support.supportBearing(m, null);
    this.web = new WebStrengths(m);
    this.ruptureStress = m.basis.tensionRupture(1, m.legs.steel.fu, null);
  }
}
