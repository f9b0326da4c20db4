import type { ElectrodeRecord, Practice } from './types.ts';

/** Classification, X_u, practices, note. */
type Row = readonly [string, number, readonly Practice[], string];

const rows: readonly Row[] = [
  [
    'E70XX',
    480,
    ['sans', 'aisc'],
    'SANS practice takes X_u 480 MPa; 70 ksi is 483 MPa, so this errs low for AISC.',
  ],
  ['E48XX', 480, ['csa'], 'Classification of the earlier editions of CSA W48.'],
  ['E49XX', 490, ['csa'], 'Classification of CSA W48 in use with CSA S16.'],
  ['E55XX', 550, ['sans', 'csa'], 'Over-matches the steels of 450 MPa tensile strength.'],
  ['E62XX', 620, ['csa'], 'For high-strength steels.'],
  ['E80XX', 550, ['sans', 'aisc'], '80 ksi is 552 MPa, so this errs low.'],
];

/** Weld metals by electrode classification. MPa. */
export const electrodes: readonly ElectrodeRecord[] = rows.map(([name, xu, practices, note]) => ({
  name,
  xu,
  practices,
  note,
  source: practices.includes('csa') ? 'CSA W48' : 'AWS A5.1 and A5.5; X_u as SANS 10162-1 practice takes it',
  edition: practices.includes('csa') ? 'CSA W48-18' : 'AWS A5.1-2012, A5.5-2014; SANS 10162-1:2011',
  evidence: 'from memory',
  missing: [],
}));
