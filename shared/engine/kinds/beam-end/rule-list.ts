const rule = <Id extends string>(id: Id, subject: string, title: string) => ({ id, subject, title });

/** The rules of a beam's bolted end, for the lists of the kinds that have one. */
export const beamRules = [
  rule('beam-steel-thickness', 'Steel of the beam', 'Steel of the beam has no strength at this thickness'),
  rule('cope-whole', 'Cope: length and depth', 'Cope without length or without depth'),
  rule('cope-depth-least', 'Depth of the cope', 'Cope not deeper than flange and root radius'),
  rule('cope-web-left', 'Depth left between the copes', 'Too little of the beam left at the cope'),
  rule('web-end-least', 'End distance on the web', 'End distance on the web too small'),
  rule('web-end-greatest', 'End distance on the web', 'End distance on the web too large'),
  rule('web-edge-least', 'Bolt to the coped edge of the web', 'Edge distance on the coped web too small'),
  rule('web-hole-inside', 'Bolt to the inside of the flange', 'Bolt outside the web'),
  rule('web-root-clear', 'Nut clear of the root radius of the beam', 'Nut on the root radius of the beam'),
  rule(
    'part-inside-web',
    'Bolted part clear of the root radius of the beam',
    'Bolted part on the root radius',
  ),
] as const;

export type BeamRuleId = (typeof beamRules)[number]['id'];
