import { beamRules } from '../beam-end/rule-list.ts';
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
  rule('bolt-grade-size', 'Bolt grade', 'Bolt grade has no strength at this diameter'),
  rule('bolt-count', 'Number of bolts', 'Number of bolts'),
  rule('hole-least', 'Hole diameter', 'Hole too small for the bolt'),
  rule('hole-greatest', 'Hole diameter', 'Hole too large for the bolt'),
  rule('pitch-least', 'Pitch', 'Pitch too small'),
  rule('pitch-greatest', 'Pitch', 'Pitch too large'),
  rule('gauge-least', 'Gauge', 'Gauge too small'),
  rule('gauge-greatest', 'Gauge', 'Gauge too large'),
  rule('plate-end-least', 'End distance on the plate', 'End distance on the plate too small'),
  rule('plate-end-greatest', 'End distance on the plate', 'End distance on the plate too large'),
  rule('plate-edge-least', 'Edge distance on the plate', 'Edge distance on the plate too small'),
  rule('plate-edge-greatest', 'Edge distance on the plate', 'Edge distance on the plate too large'),
  rule('weld-leg-least', 'Weld leg', 'Weld leg too small'),
  rule('weld-throat-least', 'Weld throat', 'Weld throat too small'),
  rule('weld-length-least', 'Counted weld length', 'Weld too short'),
  rule('weld-full-strength', 'Weld leg for a full-strength weld', 'Weld weaker than the plate'),
  rule('hole-clear-of-weld', 'First column to the face', 'Hole on the weld'),
  rule('spanner-room', 'First column to the face', 'No room for the spanner at the first column'),
  rule('beam-clear-of-weld', 'End gap of the beam', 'Beam on the weld'),
  rule('ductile-thickness', 'Plate thickness', 'Plate too thick to yield before its bolts'),
  rule('plate-height-least', 'Height of the plate', 'Plate too low to hold the beam from twisting'),
  ...beamRules,
] as const;

export type RuleId = (typeof list)[number]['id'];

/** Every rule that can reject a cell of a fin plate, for legends. */
export const rules = list.map(({ id, title }) => ({ id, title }));

/** A rule of the kind with the clause that its basis gives. */
export const ruleOf = rulesOf<RuleId>(list);
