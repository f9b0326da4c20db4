import { groupHeight, type PlyEdges, type UprightGroup } from '../../limit-states/upright-group.ts';
import type { UprightPly } from '../../limit-states/upright-block.ts';
import type { ISection, Steel } from '../../types.ts';
import { type Resolved, steelAt } from '../resolved.ts';

/** A notch in a flange and the web beside it; a length or a depth of 0: none. mm. */
export interface Cope {
  readonly length: number;
  readonly depth: number;
}

/** The end of a beam whose web is bolted, ready for its limit states. mm, mm2, MPa. */
export interface BeamEnd {
  readonly section: ISection;
  readonly steel: Steel;
  /** The catalogue has no strength of the steel at this web. */
  readonly steelMissing: boolean;
  readonly top: Cope;
  readonly bottom: Cope;
  readonly gap: number;
  /** Height of the middle of the bolts above the middle of the beam's depth. */
  readonly offset: number;
  /** From the outer bolts to the end of the web and to its edges above and below: a cope, or the back of the flange. */
  readonly edges: PlyEdges;
  /** Depth that is left at the end of the beam. */
  readonly depthLeft: number;
  /** Gross area of the web in shear. */
  readonly shearArea: number;
  readonly web: UprightPly;
}

export function isCoped(cope: Cope): boolean {
  return cope.depth > 0;
}

/**
 * Reads the beam's end from checked parameters.
 * @param firstColumn from the face of the support to the nearest column of bolts, mm
 * @param deduction hole as deducted from net areas, mm
 * @param noSteel stands for a grade without a strength at this thickness
 */
export function beamEndOf(
  values: Resolved,
  group: UprightGroup,
  firstColumn: number,
  deduction: number,
  noSteel: Steel,
): BeamEnd {
  const section = values.section<ISection>('beam_section');
  const { webThickness, depth } = section;
  const found = steelAt(values.steel('beam_steel'), webThickness, null);
  const steel = found ?? noSteel;
  const top = copeOf(values, 'top');
  const bottom = copeOf(values, 'bottom');
  const height = groupHeight(group);
  const given = values.number('beam_top_to_row');
  const aboveRow = given === 0 ? (depth - height) / 2 : given;
  const gap = values.number('beam_gap');
  return {
    section,
    steel,
    steelMissing: found === null,
    top,
    bottom,
    gap,
    offset: (depth - height) / 2 - aboveRow,
    edges: {
      near: firstColumn - gap,
      far: Infinity,
      above: aboveRow - top.depth,
      below: depth - height - aboveRow - bottom.depth,
    },
    depthLeft: depth - top.depth - bottom.depth,
    shearArea: shearArea(section, top, bottom),
    web: { thickness: webThickness, deduction, fy: steel.fy, fu: steel.fu },
  };
}

function copeOf(values: Resolved, side: 'top' | 'bottom'): Cope {
  return { length: values.number(`cope_${side}_length`), depth: values.number(`cope_${side}_depth`) };
}

/**
 * Web area in shear, mm2: the depth that is left times the web. A flange counts with the thickness of the web only as
 * far as its root radius carries it, which leaves out the flanges of a welded section (errs low).
 */
function shearArea(section: ISection, top: Cope, bottom: Cope): number {
  const { depth, webThickness, flangeThickness, rootRadius } = section;
  const counted = flangeThickness * Math.min(1, (2 * rootRadius) / webThickness);
  const lostAt = (cope: Cope) => (isCoped(cope) ? cope.depth : flangeThickness - counted);
  return webThickness * Math.max(0, depth - lostAt(top) - lostAt(bottom));
}
