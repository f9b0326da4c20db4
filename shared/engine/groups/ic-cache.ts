import type { BoltNormalisation } from './bolt-curve.ts';
import { boltGroup, boltPattern } from './bolt-group.ts';
import { boltGroupIc } from './bolt-group-ic.ts';

/** Coefficients that are kept; beyond it all are dropped when the next pattern is asked for. */
const MOST = 200_000;

/** The coefficients of one pattern of bolts by load line; symmetric, so that signs do not matter. */
export class PatternCoefficients {
  private readonly known = new Map<number, Map<number, number>>();
  private readonly group;

  constructor(
    rows: number,
    columns: number,
    pitch: number,
    gauge: number,
    private readonly normalise: BoltNormalisation,
    private readonly grown: () => void,
  ) {
    this.group = boltGroup(boltPattern(rows, columns, pitch, gauge));
  }

  /**
   * Coefficient C for a unit resultant, 0 where the group resists none (a single bolt under a moment).
   * @param along share of the resultant along the rows' line (y), 0 to 1
   * @param moment about the middle of the bolts for a resultant of 1, mm
   * @throws {Error} when the search does not converge: a coefficient is never guessed
   */
  coefficient(along: number, moment: number): number {
    const sin = Math.abs(along);
    const lever = Math.abs(moment);
    let lines = this.known.get(sin);
    if (lines === undefined) this.known.set(sin, (lines = new Map()));
    const kept = lines.get(lever);
    if (kept !== undefined) return kept;
    const fresh = this.solve(sin, lever);
    lines.set(lever, fresh);
    this.grown();
    return fresh;
  }

  private solve(sin: number, moment: number): number {
    const load = { fx: Math.sqrt(Math.max(0, 1 - sin * sin)), fy: sin, moment };
    const found = boltGroupIc(this.group, load, { normalise: this.normalise });
    if (found.ok) return found.multiplier;
    if (found.reason === 'no-moment-resistance') return 0;
    throw new Error(`The instantaneous centre was not found: ${found.reason}, imbalance ${found.imbalance}`);
  }
}

const patterns = new Map<string, PatternCoefficients>();
let size = 0;

/** The coefficients of a pattern of bolts, shared by every detail that has it whatever its bolts. */
export function coefficientsOf(
  rows: number,
  columns: number,
  pitch: number,
  gauge: number,
  normalise: BoltNormalisation,
): PatternCoefficients {
  const key = `${rows} ${columns} ${pitch} ${columns > 1 ? gauge : 0} ${normalise}`;
  const kept = patterns.get(key);
  if (kept !== undefined) return kept;
  if (size > MOST) {
    patterns.clear();
    size = 0;
  }
  const grown = () => (size += 1);
  const fresh = new PatternCoefficients(rows, columns, pitch, columns > 1 ? gauge : 0, normalise, grown);
  patterns.set(key, fresh);
  return fresh;
}
