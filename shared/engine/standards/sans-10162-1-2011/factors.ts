/** Resistance factors. SANS 10162-1:2011, 13.1. */
export const phi = 0.9;
export const phib = 0.8;
export const phibr = 0.67;
export const phiw = 0.67;

/** Elastic modulus of steel, MPa. SANS 10162-1:2011, Symbols. */
export const E = 200_000;
