import type { Basis, Rec, TStub } from '../standards/basis.ts';
import type { BoltSize, Steel } from '../types.ts';

/** Rows of two bolts, one on each side of a web, evenly spaced, on a flange without stiffeners. mm, MPa. */
export interface StubRowsSpec {
  readonly thickness: number;
  readonly steel: Steel;
  readonly byTensile: boolean;
  readonly bolt: BoltSize;
  readonly holeDiameter: number;
  /** Bolts in a row: two, or one where the flange is a single leg. */
  readonly perRow: 1 | 2;
  readonly rows: number;
  readonly pitch: number;
  /** End row to the end of the flange along the row line. */
  readonly end: number;
  readonly boltToWeb: number;
  readonly m: number;
  readonly edge: number;
}

/** Effective lengths of one row, mm: of circular and of other patterns. */
interface Lengths {
  readonly circular: number;
  readonly other: number;
}

/**
 * Effective lengths of a row by itself. EN 1993-1-8:2005, Table 6.4, unstiffened: an inner row 2πm and 4m + 1.25e; an end
 * row not more than πm + 2e_1 and 2m + 0.625e + e_1; the only row, with an end on both sides, not more than 4e_1 and 2e_1.
 */
export function lengthsAlone(m: number, e: number, end: number, ends: 0 | 1 | 2): Lengths {
  const circular = [2 * Math.PI * m, Math.PI * m + 2 * end, 4 * end];
  const other = [4 * m + 1.25 * e, 2 * m + 0.625 * e + end, 2 * end];
  return { circular: Math.min(...circular.slice(0, ends + 1)), other: Math.min(...other.slice(0, ends + 1)) };
}

/**
 * Effective lengths of all rows as one group. EN 1993-1-8:2005, Table 6.4, unstiffened: an inner row 2p and p; an end row
 * min(πm + p, 2e_1 + p) and min(2m + 0.625e + 0.5p, e_1 + 0.5p).
 */
export function lengthsOfGroup(m: number, e: number, end: number, pitch: number, rows: number): Lengths {
  const inner = Math.max(0, rows - 2);
  return {
    circular: 2 * Math.min(Math.PI * m + pitch, 2 * end + pitch) + inner * 2 * pitch,
    other: 2 * Math.min(2 * m + 0.625 * e + 0.5 * pitch, end + 0.5 * pitch) + inner * pitch,
  };
}

interface Part {
  readonly name: string;
  readonly stub: TStub;
  readonly times: number;
}

/**
 * The pull on all rows together: not more than the rows one by one, and not more than all of them as one group.
 * Groups of some of the rows lie between the two and are not worked out apart. A leg with one bolt in a row carries half of
 * the stub that has its like on the other side.
 */
export class StubRows {
  private readonly alone: readonly Part[];
  private readonly group: TStub | null;
  private readonly share: number;

  constructor(
    private readonly basis: Basis,
    spec: StubRowsSpec,
  ) {
    const { rows, end, pitch, m, edge, boltToWeb } = spec;
    this.share = spec.perRow / 2;
    // A bolt draws on no more of the flange than b to either side: AISC Manual Part 9.
    const side = (length: number) => Math.min(length, boltToWeb);
    const stub = (ends: 0 | 1 | 2, tributary: number) =>
      stubOf(spec, lengthsAlone(m, edge, end, ends), 2, tributary);
    if (rows === 1) {
      this.alone = [{ name: 'the row', stub: stub(2, 2 * side(end)), times: 1 }];
      this.group = null;
      return;
    }
    const [ofEnd, ofInner] = [side(end) + side(pitch / 2), 2 * side(pitch / 2)];
    const ends = { name: 'an end row alone', stub: stub(1, ofEnd), times: 2 };
    const inner = { name: 'an inner row alone', stub: stub(0, ofInner), times: rows - 2 };
    this.alone = rows === 2 ? [ends] : [ends, inner];
    const mean = (2 * ofEnd + (rows - 2) * ofInner) / rows;
    this.group = stubOf(spec, lengthsOfGroup(m, edge, end, pitch, rows), 2 * rows, mean);
  }

  /** @param boltTension tension that each bolt may take, N */
  pull(boltTension: number, rec: Rec): number {
    const { basis, share } = this;
    let alone = 0;
    // By index: the search for a root comes here many times for every cell.
    for (let i = 0; i < this.alone.length; i++) {
      const { name, stub, times } = this.alone[i]!;
      if (rec !== null) rec.line('', name, '', times === 1 ? 'once' : `${times} times`, '', '');
      alone += times * basis.tStub(stub, boltTension, rec);
    }
    if (rec !== null && this.group !== null) {
      rec.line('ΣF_T', 'rows one by one', '', alone, 'N', '');
      rec.line('', 'all rows as a group', '', 'once', '', '');
    }
    const group = this.group === null ? Infinity : basis.tStub(this.group, boltTension, rec);
    if (rec !== null && share < 1) rec.line('', 'one bolt in a row', '', 'half of the stub', '', '');
    return share * Math.min(alone, group);
  }
}

/** Bolts too strong to give way: what is left is the flange. N. */
const STRONG_BOLTS = 1e12;

/** Above this a force on a sheet is only the strength of bolts that are not there, N. */
const OF_BOLTS = 1e10;

/**
 * Pull that the flange carries by itself, N, its bolts taken as too strong to give way; what the sheet would say of them is
 * left out.
 * @param what the flange in words, e.g. `the plate alone`
 */
export function flangeAlone(stub: Pick<StubRows, 'pull'>, what: string, rec: Rec): number {
  if (rec === null) return stub.pull(STRONG_BOLTS, null);
  rec.line('B', 'bolts that do not give way', '', what, '', '');
  return stub.pull(STRONG_BOLTS, {
    section: (id, title) => rec.section(id, title),
    line: (symbol, meaning, formula, value, unit, clause) => {
      if (symbol === 't_c' || (typeof value === 'number' && value > OF_BOLTS)) return;
      rec.line(symbol, meaning, formula, value, unit, clause);
    },
  });
}

function stubOf(spec: StubRowsSpec, { circular, other }: Lengths, bolts: number, tributary: number): TStub {
  const { thickness, steel, byTensile, bolt, holeDiameter, boltToWeb, m, edge } = spec;
  const leff1 = Math.min(circular, other);
  const sizes = { thickness, steel, byTensile, bolt, holeDiameter, boltToWeb, m, edge };
  return { ...sizes, bolts, leff1, leff2: other, tributary };
}
