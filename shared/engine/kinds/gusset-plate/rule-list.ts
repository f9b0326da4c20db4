import { rulesOf } from '../rules.ts';

const rule = <Id extends string>(id: Id, subject: string, title: string) => ({ id, subject, title });

/** What each rule measures, and what it says when broken. Packed codes follow the order, so it only grows at the end. */
const list = [
  rule('plate-steel-thickness', 'Steel of the plate', 'Steel of the plate has no strength at this thickness'),
  rule(
    'support-steel-thickness',
    'Steel of the support',
    'Steel of the support has no strength at this thickness',
  ),
  rule(
    'member-steel-thickness',
    'Steel of the brace',
    'Steel of the brace has no strength at this thickness',
  ),
  rule('bolt-grade-size', 'Bolt grade', 'Bolt grade has no strength at this diameter'),
  rule('bolt-count', 'Number of bolts', 'Number of bolts'),
  rule('star-lines', 'Lines of bolts for two angles in star', 'Lines of bolts for two angles in star'),
  rule('member-shape', 'Section of the brace', 'Section does not suit the arrangement of the brace'),
  rule('hole-least', 'Hole diameter', 'Hole too small for the bolt'),
  rule('hole-greatest', 'Hole diameter', 'Hole too large for the bolt'),
  rule('pitch-least', 'Pitch', 'Pitch too small'),
  rule('pitch-greatest', 'Pitch', 'Pitch too large'),
  rule('gauge-least', 'Gauge', 'Gauge too small'),
  rule('gauge-greatest', 'Gauge', 'Gauge too large'),
  rule('member-end-least', 'End distance on the brace', 'End distance on the brace too small'),
  rule('member-end-greatest', 'End distance on the brace', 'End distance on the brace too large'),
  rule('member-edge-least', 'Bolt to the toe or edge of the brace', 'Edge distance on the brace too small'),
  rule(
    'member-edge-greatest',
    'Bolt to the toe or edge of the brace',
    'Edge distance on the brace too large',
  ),
  rule('member-hole-in-leg', 'Bolt to the inside of the heel', 'Hole outside the connected leg'),
  rule('member-root-clear', 'Nut clear of the root radius', 'Nut on the root radius of the brace'),
  rule('gusset-end', 'End distance on the gusset along the force', 'End distance on the gusset too small'),
  rule('gusset-end-greatest', 'End distance on the gusset', 'End distance on the gusset too large'),
  rule('gusset-edge', 'Edge distance on the gusset', 'Edge distance on the gusset too small'),
  rule('weld-leg-least', 'Weld leg', 'Weld leg too small'),
  rule('weld-throat-least', 'Weld throat', 'Weld throat too small'),
  rule('weld-length-least', 'Counted weld length', 'Weld too short'),
  rule(
    'outline-corner',
    'Corner of the plate to the face',
    'Corner of the plate behind the face of the support',
  ),
  rule('outline-cut', 'Cut end beyond the ends of the weld', 'Cut end between the ends of the weld'),
  rule('hole-clear-of-weld', 'Hole clear of the weld', 'Hole on the weld'),
  rule('spanner-room', 'First row to the face', 'No room for the spanner at the first row'),
  rule('member-clearance', 'Brace to the face of the support', 'Brace too close to the face of the support'),
] as const;

export type RuleId = (typeof list)[number]['id'];

/** Every rule that can reject a cell of a gusset plate, for legends. */
export const rules = list.map(({ id, title }) => ({ id, title }));

/** A rule of the kind with the clause that its basis gives. */
export const ruleOf = rulesOf<RuleId>(list);
