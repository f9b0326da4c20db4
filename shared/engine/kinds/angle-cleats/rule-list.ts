import { beamRules } from '../beam-end/rule-list.ts';
import { rulesOf } from '../rules.ts';

const rule = <Id extends string>(id: Id, subject: string, title: string) => ({ id, subject, title });

/** What each rule measures, and what it says when broken. Packed codes follow the order, so it only grows at the end. */
const list = [
  rule(
    'cleat-steel-thickness',
    'Steel of the cleats',
    'Steel of the cleats has no strength at this thickness',
  ),
  rule(
    'support-steel-thickness',
    'Steel of the support',
    'Steel of the support has no strength at this thickness',
  ),
  rule('bolt-grade-size', 'Bolt grade', 'Bolt grade has no strength at this diameter'),
  rule(
    'support-bolt-grade-size',
    'Bolt grade at the support',
    'Bolt grade at the support has no strength at this diameter',
  ),
  rule('bolt-count', 'Number of bolts in the web', 'Number of bolts in the web'),
  rule('hole-least', 'Hole diameter', 'Hole too small for the bolt'),
  rule('hole-greatest', 'Hole diameter', 'Hole too large for the bolt'),
  rule('pitch-least', 'Pitch', 'Pitch too small'),
  rule('pitch-greatest', 'Pitch', 'Pitch too large'),
  rule('gauge-least', 'Gauge', 'Gauge too small'),
  rule('gauge-greatest', 'Gauge', 'Gauge too large'),
  rule('cleat-end-least', 'End distance on the web leg', 'End distance on the web leg too small'),
  rule('cleat-end-greatest', 'End distance on the web leg', 'End distance on the web leg too large'),
  rule('web-leg-edge-least', 'Bolt to the toe of the web leg', 'Edge distance on the web leg too small'),
  rule('web-leg-edge-greatest', 'Bolt to the toe of the web leg', 'Edge distance on the web leg too large'),
  rule('web-leg-hole', 'Bolt in the web to the inside of the heel', 'Hole outside the web leg'),
  rule('web-leg-root-clear', 'Nut clear of the root radius of the angle', 'Nut on the root radius'),
  rule('spanner-room', 'Bolt in the web to the outstanding leg', 'No room for the spanner in the web leg'),
  rule('support-bolt-count', 'Rows of bolts at the support', 'Too few rows of bolts at the support'),
  rule('support-hole-least', 'Hole diameter at the support', 'Hole at the support too small for the bolt'),
  rule('support-hole-greatest', 'Hole diameter at the support', 'Hole at the support too large for the bolt'),
  rule('support-pitch-least', 'Pitch at the support', 'Pitch at the support too small'),
  rule('support-pitch-greatest', 'Pitch at the support', 'Pitch at the support too large'),
  rule(
    'support-end-least',
    'End distance on the outstanding leg',
    'End distance on the outstanding leg too small',
  ),
  rule(
    'support-end-greatest',
    'End distance on the outstanding leg',
    'End distance on the outstanding leg too large',
  ),
  rule(
    'support-edge-least',
    'Bolt to the toe of the outstanding leg',
    'Edge distance on the outstanding leg too small',
  ),
  rule(
    'support-edge-greatest',
    'Bolt to the toe of the outstanding leg',
    'Edge distance on the outstanding leg too large',
  ),
  rule(
    'support-leg-hole',
    'Bolt at the support to the inside of the heel',
    'Hole outside the outstanding leg',
  ),
  rule(
    'support-root-clear',
    'Nut at the support clear of the root radius of the angle',
    'Nut at the support on the root radius',
  ),
  rule(
    'support-spanner-room',
    'Bolt at the support to the web leg',
    'No room for the spanner in the outstanding leg',
  ),
  rule('nuts-clear', 'Clearance between the nuts of both legs', 'Bolts of both legs in each other’s way'),
  rule('weld-leg-least', 'Weld leg', 'Weld leg too small'),
  rule('weld-leg-greatest', 'Weld leg along the toe', 'Weld leg too large for the toe of the angle'),
  rule('weld-throat-least', 'Weld throat', 'Weld throat too small'),
  rule('weld-length-least', 'Counted weld length', 'Weld too short'),
  rule('ductile-thickness', 'Thickness of the cleats', 'Cleats too thick to let the beam turn'),
  rule('cleat-length-least', 'Length of the cleats', 'Cleats too short to hold the beam from twisting'),
  ...beamRules,
] as const;

export type RuleId = (typeof list)[number]['id'];

/** Every rule that can reject a cell of angle cleats, for legends. */
export const rules = list.map(({ id, title }) => ({ id, title }));

/** A rule of the kind with the clause that its basis gives. */
export const ruleOf = rulesOf<RuleId>(list);
