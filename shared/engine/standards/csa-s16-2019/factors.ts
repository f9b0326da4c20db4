/** Resistance factors. CSA S16:19, 13.1. */
export const phi = 0.9;
/** Fracture on net sections and tension-and-shear blocks. */
export const phiu = 0.75;
export const phib = 0.8;
export const phibr = 0.8;
export const phiw = 0.67;

/** Elastic modulus of steel, MPa. CSA S16:19, Symbols. */
export const E = 200_000;
