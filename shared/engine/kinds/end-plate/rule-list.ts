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
  rule('beam-steel-thickness', 'Steel of the beam', 'Steel of the beam has no strength at this thickness'),
  rule('bolt-grade-size', 'Bolt grade', 'Bolt grade has no strength at this diameter'),
  rule('hole-least', 'Hole diameter', 'Hole too small for the bolt'),
  rule('hole-greatest', 'Hole diameter', 'Hole too large for the bolt'),
  rule('pitch-least', 'Pitch', 'Pitch too small'),
  rule('pitch-greatest', 'Pitch', 'Pitch too large'),
  rule('gauge-least', 'Cross centres', 'Cross centres too small'),
  rule('plate-end-least', 'End distance on the plate', 'End distance on the plate too small'),
  rule('plate-end-greatest', 'End distance on the plate', 'End distance on the plate too large'),
  rule('plate-edge-least', 'Edge distance on the plate', 'Edge distance on the plate too small'),
  rule('plate-edge-greatest', 'Edge distance on the plate', 'Edge distance on the plate too large'),
  rule('weld-leg-least', 'Weld leg', 'Weld leg too small'),
  rule('weld-throat-least', 'Weld throat', 'Weld throat too small'),
  rule('weld-length-least', 'Counted weld length', 'Weld too short'),
  rule('hole-clear-of-weld', 'Bolt to the web', 'Hole on the weld'),
  rule('plate-inside-web', 'Plate clear of the root radius of the beam', 'Partial plate on the root radius'),
  rule('plate-flush', 'Height of a flush plate', 'Flush plate lower than the beam'),
  rule('row-inside-beam', 'Outer row inside the flanges', 'Row of bolts outside the beam'),
  rule('spanner-room', 'Bolt to the web', 'No room for the spanner beside the web'),
  rule('spanner-room-flange', 'Outer row to the flange', 'No room for the spanner at the flange'),
  rule('ductile-thickness', 'Plate thickness', 'Plate too thick to yield before its bolts'),
  rule('gauge-practice-least', 'Cross centres', 'Cross centres below the usual'),
  rule('gauge-practice-greatest', 'Cross centres', 'Cross centres above the usual'),
  rule('plate-height-least', 'Height of the plate', 'Plate too low to hold the beam from twisting'),
] as const;

export type RuleId = (typeof list)[number]['id'];

/** Every rule that can reject a cell of an end plate, for legends. */
export const rules = list.map(({ id, title }) => ({ id, title }));

/** A rule of the kind with the clause that its basis gives. */
export const ruleOf = rulesOf<RuleId>(list);
