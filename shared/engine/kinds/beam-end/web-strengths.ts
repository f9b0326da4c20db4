import { byBoth } from '../../limit-states/resultant.ts';
import { blocksTogether } from '../../limit-states/upright-block.ts';
import type { UprightGroup } from '../../limit-states/upright-group.ts';
import type { Basis, Rec } from '../../standards/basis.ts';
import type { BeamEnd } from './beam.ts';
import { webBlockAcross, webBlockAlong, webShearGross, webShearNet, webTension } from './strengths.ts';

/** What the web's strengths are worked out from. mm. */
export interface WebSetting {
  readonly basis: Basis;
  readonly beam: BeamEnd;
  readonly group: UprightGroup;
  /** Height of the bolted part. */
  readonly height: number;
  readonly eccentricBlock: boolean;
  /** The shear is taken up and down, the worse kept. */
  readonly eitherWay: boolean;
}

/** Strengths of a beam's web that no load angle changes, worked out once. N. */
export class WebStrengths {
  readonly shearGross: number;
  readonly shearNet: number;
  private readonly up: number;
  private readonly down: number;
  private readonly across: number;
  private readonly tension: number;

  constructor(private readonly setting: WebSetting) {
    const { basis, beam, group, height, eccentricBlock } = setting;
    this.shearGross = webShearGross(basis, beam, null);
    this.shearNet = webShearNet(basis, beam, group, null);
    this.up = webBlockAlong(basis, beam, group, true, eccentricBlock, null);
    this.down = webBlockAlong(basis, beam, group, false, eccentricBlock, null);
    this.across = webBlockAcross(basis, beam, group, null);
    this.tension = webTension(basis, beam, group, height, null);
  }

  /** Blocks torn along and across the face together, N; the bolts push the web against the resultant. */
  block(cos: number, sin: number, rec: Rec): number {
    const { up, down, setting } = this;
    const along = setting.eitherWay ? Math.min(up, down) : sin < 0 ? up : down;
    if (rec !== null) {
      const { basis, beam, group, eccentricBlock } = setting;
      const tornUp = along === up;
      rec.line('', 'block along the face', '', tornUp ? 'torn up' : 'torn down', '', '');
      webBlockAlong(basis, beam, group, tornUp, eccentricBlock, rec);
      webBlockAcross(basis, beam, group, rec);
    }
    return blocksTogether(along, this.across, cos, sin, rec);
  }

  /** Pull beside shear, as the root of the sum of squares, N; Infinity where nothing pulls. */
  pull(cos: number, sin: number, rec: Rec): number {
    if (cos === 0) return Infinity;
    const shear = Math.min(this.shearGross, this.shearNet);
    if (rec !== null) {
      const { basis, beam, group, height } = this.setting;
      webTension(basis, beam, group, height, rec);
      rec.line('V_r', 'the web in shear, gross or net', 'the lesser', shear, 'N', '');
      const meaning = 'as the root of the sum of squares';
      rec.line('', 'together', '√((V/V_r)² + (N/N_r)²) ≤ 1', meaning, '', 'method of this catalogue');
    }
    return byBoth(shear, this.tension, cos, sin);
  }
}
