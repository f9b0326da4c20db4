import { groupHeight, groupWidth, type UprightGroup } from '../../limit-states/upright-group.ts';
import type { AngleSection, Steel } from '../../types.ts';
import { usualBackmark } from '../backmark.ts';
import { noSteel } from '../parts.ts';
import { type Resolved, steelAt } from '../resolved.ts';
import { TOLERANCE } from '../rules.ts';

/** One angle and its two legs, the heel at the face of the support and against the web. mm, MPa. */
export interface Legs {
  readonly cleats: 1 | 2;
  readonly section: AngleSection;
  readonly steel: Steel;
  readonly thickness: number;
  /** Length along the face of the support. */
  readonly height: number;
  readonly webLeg: number;
  readonly outstandingLeg: number;
  /** Bolts in the web. */
  readonly group: UprightGroup;
  /** From the heel, which is the face of the support. */
  readonly firstColumn: number;
  readonly lastColumn: number;
  /** Outer row in the web to the end of the cleat. */
  readonly endDistance: number;
  /** Last column to the toe of the web leg. */
  readonly edgeDistance: number;
}

/** Reads the cleats and the bolts in their web legs from checked parameters. */
export function legsOf(values: Resolved): Legs {
  const section = values.section<AngleSection>('cleat_section');
  const { thickness, longLeg, shortLeg } = section;
  const onWeb = values.choice('web_leg') === 'long';
  const webLeg = onWeb ? longLeg : shortLeg;
  const group: UprightGroup = {
    rows: values.number('rows'),
    columns: values.number('columns'),
    pitch: values.number('pitch'),
    gauge: values.number('gauge'),
  };
  const wanted = values.number('cleat_length');
  const length = wanted <= TOLERANCE ? 0 : wanted;
  const given = values.number('cleat_end_distance');
  const height = length === 0 ? groupHeight(group) + 2 * given : length;
  const backmark = values.number('web_backmark');
  const firstColumn = backmark === 0 ? usualBackmark(webLeg, group.columns) : backmark;
  const lastColumn = firstColumn + groupWidth(group);
  return {
    cleats: values.number('cleats') === 1 ? 1 : 2,
    section,
    steel: steelAt(values.steel('cleat_steel'), thickness, null) ?? noSteel,
    thickness,
    height,
    webLeg,
    outstandingLeg: onWeb ? shortLeg : longLeg,
    group,
    firstColumn,
    lastColumn,
    endDistance: length === 0 ? given : (height - groupHeight(group)) / 2,
    edgeDistance: webLeg - lastColumn,
  };
}
