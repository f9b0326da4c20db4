/** How a load stands to a capacity. */
export interface Reading {
  /** Load over capacity, rounded up to three decimals; null without a load or where the capacity is zero. */
  readonly utilisation: number | null;
  readonly adequate: boolean | null;
}

/**
 * Reads a load against a published capacity; errs high.
 * @param load kN
 * @param capacity kN, rounded down
 */
export function readLoad(load: number | undefined, capacity: number): Reading {
  if (load === undefined) return { utilisation: null, adequate: null };
  const adequate = load <= capacity;
  if (capacity === 0) return { utilisation: null, adequate };
  // Float noise does not cost a thousandth, but what is not adequate never reads 1.000.
  const utilisation = Math.ceil((load / capacity) * 1000 - 1e-9) / 1000;
  return { utilisation: adequate ? utilisation : Math.max(utilisation, 1.001), adequate };
}
