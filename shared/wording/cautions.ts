/** Printed wherever a capacity is read: on screen, on a sheet, in an export, by the command line. */
export const CAUTIONS = [
  'Capacities are for the use of competent engineers; local codes, the project specification and the judgement of a licensed engineer come first.',
  'They cover the listed limit states alone, and not the support, the member, fatigue, seismic detailing, fire, corrosion, weld inspection or erection.',
  'Values are rounded down to the stated increment. Where the text of a standard leaves room, the lower value is taken and the choice is named in the notes.',
] as const;
