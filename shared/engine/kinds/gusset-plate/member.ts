import type { BlockPly } from '../../limit-states/block-shear.ts';
import type { AngleSection, FlatSection, Steel } from '../../types.ts';
import { usualBackmark } from '../backmark.ts';
import { type Resolved, steelAt } from '../resolved.ts';

type Section = AngleSection | FlatSection;
export type Brace = 'back_to_back' | 'star' | 'single' | 'flat';

/** The brace, ready for its limit states. mm, mm2, MPa. */
export interface GussetMember {
  readonly brace: Brace;
  readonly section: Section;
  readonly steel: Steel;
  /** An angle where the brace is of angles, a flat where it is a flat. */
  readonly shapeFits: boolean;
  readonly parts: number;
  /** Lines of bolts through each part. */
  readonly linesEach: number;
  readonly connectedLeg: number;
  readonly otherLeg: number;
  /** From the back of the connected leg to the centroid; 0 for a flat. */
  readonly centroid: number;
  readonly thickness: number;
  readonly rootRadius: number;
  /** Heel to the first line; for a flat, edge to the first line. */
  readonly backmark: number;
  /** Outer line to the toe, or to the edge of a flat. */
  readonly toeDistance: number;
  /** Greatest extent across the axis, whichever way an angle is turned. */
  readonly halfWidth: number;
  readonly endDistance: number;
  /** Thickness that one bolt bears on. */
  readonly bearingThickness: number;
  readonly block: BlockPly;
}

/** Reads the brace from checked parameters. `noSteel` stands for a grade without a value at this thickness. */
export function memberOf(values: Resolved, deduction: number, noSteel: Steel): GussetMember {
  const brace = values.choice<Brace>('brace');
  const section = values.section<Section>('section');
  const { thickness } = section;
  const steel = steelAt(values.steel('member_steel'), thickness, null) ?? noSteel;
  const rows = values.number('rows');
  const lines = values.number('lines');
  const gauge = values.number('gauge');
  const linesEach = brace === 'star' ? 1 : lines;
  const legs = legsOf(section, values.choice('connected_leg'));
  const backmark = backmarkOf(section, legs.connectedLeg, linesEach, gauge, values.number('member_backmark'));
  const toeDistance = legs.connectedLeg - backmark - (linesEach - 1) * gauge;
  const parts = brace === 'back_to_back' || brace === 'star' ? 2 : 1;
  return {
    connectedLeg: legs.connectedLeg,
    otherLeg: legs.otherLeg,
    rootRadius: legs.rootRadius,
    centroid: legs.centroid,
    brace,
    section,
    steel,
    shapeFits: (brace === 'flat') === (section.shape === 'flat'),
    parts,
    linesEach,
    thickness,
    backmark,
    toeDistance,
    halfWidth: halfWidthOf(brace, linesEach, gauge, backmark, toeDistance),
    endDistance: values.number('member_end_distance'),
    bearingThickness: brace === 'back_to_back' ? 2 * thickness : thickness,
    block: {
      thickness,
      deduction,
      fy: steel.fy,
      fu: steel.fu,
      rows,
      lines: linesEach,
      gauge,
      angle: section.shape === 'angle',
    },
  };
}

function legsOf(section: Section, connected: string) {
  if (section.shape === 'flat')
    return { connectedLeg: section.width, otherLeg: section.width, rootRadius: 0, centroid: 0 };
  const { longLeg, shortLeg, thickness, rootRadius, centroidLong, centroidShort } = section;
  const long = centroidLong ?? centroidOf(longLeg, shortLeg, thickness);
  const short = centroidShort ?? centroidOf(shortLeg, longLeg, thickness);
  return connected === 'long'
    ? { connectedLeg: longLeg, otherLeg: shortLeg, rootRadius, centroid: long }
    : { connectedLeg: shortLeg, otherLeg: longLeg, rootRadius, centroid: short };
}

/** From the back of one leg to the centroid of both as rectangles, which lies a little far out (errs low), mm. */
function centroidOf(leg: number, other: number, t: number): number {
  return (leg * t + other * other - t * t) / (2 * (leg + other - t));
}

function backmarkOf(section: Section, leg: number, lines: number, gauge: number, given: number): number {
  if (section.shape === 'flat') return (leg - (lines - 1) * gauge) / 2;
  return given === 0 ? usualBackmark(leg, lines) : given;
}

function halfWidthOf(brace: Brace, lines: number, gauge: number, backmark: number, toe: number): number {
  if (brace === 'star') return Math.max(gauge / 2 + toe, backmark - gauge / 2);
  const half = ((lines - 1) * gauge) / 2;
  return Math.max(backmark, toe) + half;
}
