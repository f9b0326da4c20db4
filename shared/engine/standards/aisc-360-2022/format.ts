/** A resistance factor and a safety factor that belong to one limit state. */
export interface FactorPair {
  readonly phi: number;
  readonly omega: number;
}

/** Load and resistance factor design, or allowable strength design. ANSI/AISC 360-22, B3.1 and B3.2. */
export interface Format {
  readonly id: 'lrfd' | 'asd';
  /** What the nominal strength is multiplied by. */
  factor(pair: FactorPair): number;
  /** The same as it is written on a sheet, e.g. `× φ, φ = 0.75`. */
  text(pair: FactorPair): string;
}

/** Yield of a gross section, buckling. ANSI/AISC 360-22, J4.1(a), E1. */
export const yielding: FactorPair = { phi: 0.9, omega: 1.67 };
/** Rupture, block shear, bolts, bearing, fillets. ANSI/AISC 360-22, J2.4, J3.7, J3.11, J4.1(b), J4.2(b), J4.3. */
export const rupture: FactorPair = { phi: 0.75, omega: 2 };
/** Yield in shear of a connecting element. ANSI/AISC 360-22, J4.2(a). */
export const shearYielding: FactorPair = { phi: 1, omega: 1.5 };

/** Design strength `phi R_n`. ANSI/AISC 360-22, B3.1. */
export const lrfd: Format = {
  id: 'lrfd',
  factor: ({ phi }) => phi,
  text: ({ phi }) => `× φ, φ = ${phi.toFixed(2)}`,
};

/** Allowable strength `R_n/Omega`. ANSI/AISC 360-22, B3.2. */
export const asd: Format = {
  id: 'asd',
  factor: ({ omega }) => 1 / omega,
  text: ({ omega }) => `/ Ω, Ω = ${omega.toFixed(2)}`,
};

/** Available strength of a nominal one in its own unit: `phi R_n` or `R_n/Omega`. ANSI/AISC 360-22, B3.1, B3.2. */
export function available(format: Format, Rn: number, pair: FactorPair): number {
  return format.factor(pair) * Rn;
}
