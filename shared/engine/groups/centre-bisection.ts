import { dot, measure, moveFrom, type MotionState, type RigidGroup } from './rigid-motion.ts';

/** Halvings of the field, about 2^-25 of each of its two sides; more than any start of Newton's search needs. */
const MOST_HALVINGS = 50;
/** Halvings between two attempts of Newton's search. */
const BETWEEN_ATTEMPTS = 4;
/** Pieces of an edge are halved at least and at most so often, until the imbalance turns by less than a radian. */
const LEAST_DEPTH = 3;
const MOST_DEPTH = 50;
/** Where a rectangle is cut: off its middle, because a symmetric group has its centre on lines of symmetry. */
const CUTS = [0.4871, 0.5327, 0.4519, 0.5713];

/**
 * Finds a start from which Newton's search succeeds, whatever the group. The members' forces do work in every motion,
 * `F(q)·q > 0`, so on the rim of the half sphere of motions `q·g >= 0` the imbalance across the load points outwards:
 * it goes round once along the rim, and there is a motion without imbalance inside. The half sphere is laid out as a
 * square and cut again and again; the piece is kept along whose edge the imbalance goes round.
 * @param attempt runs Newton's search from the motion in `state`; true ends the bisection
 */
export function bisectCentre(
  group: RigidGroup,
  state: MotionState,
  g: Float64Array,
  attempt: () => boolean,
): boolean {
  const field = new ImbalanceField(group, state, g);
  let piece: Rectangle = { left: -1, right: 1, low: -1, high: 1 };
  for (let halving = 1; halving <= MOST_HALVINGS; halving++) {
    const kept = keptHalf(field, piece);
    if (kept === null) return false;
    piece = kept;
    if (halving % BETWEEN_ATTEMPTS !== 0) continue;
    field.move((piece.left + piece.right) / 2, (piece.low + piece.high) / 2);
    if (attempt()) return true;
  }
  return false;
}

interface Rectangle {
  readonly left: number;
  readonly right: number;
  readonly low: number;
  readonly high: number;
}

/** The part of a rectangle along whose edge the imbalance goes round; null where every cut meets the centre itself. */
function keptHalf(field: ImbalanceField, whole: Rectangle): Rectangle | null {
  const { left, right, low, high } = whole;
  for (const share of CUTS) {
    const across = left + share * (right - left);
    const up = low + share * (high - low);
    const wide = right - left >= high - low;
    const first = wide ? { ...whole, right: across } : { ...whole, high: up };
    const rounds = field.rounds(first);
    if (Number.isNaN(rounds)) continue;
    return rounds !== 0 ? first : wide ? { ...whole, left: across } : { ...whole, low: up };
  }
  return null;
}

/** Direction of the imbalance across the load over the square [-1, 1] by [-1, 1], whose middle is a motion along the load. */
class ImbalanceField {
  private readonly one = new Float64Array(3);
  private readonly other = new Float64Array(3);

  constructor(
    private readonly group: RigidGroup,
    private readonly state: MotionState,
    private readonly g: Float64Array,
  ) {
    moveFrom(g, Math.PI / 2, 0, this.one);
    moveFrom(g, Math.PI / 2, Math.PI / 2, this.other);
  }

  /** Sets the motion of a point of the square. */
  move(a: number, b: number): void {
    const from = (Math.max(Math.abs(a), Math.abs(b)) * Math.PI) / 2;
    moveFrom(this.g, from, Math.atan2(b, a), this.state.q);
  }

  /** How many times the imbalance goes round along the edge of a rectangle; NaN where the edge meets a centre. */
  rounds({ left, right, low, high }: Rectangle): number {
    const sum =
      this.turned(left, low, right, low) +
      this.turned(right, low, right, high) +
      this.turned(right, high, left, high) +
      this.turned(left, high, left, low);
    return Math.round(sum / (2 * Math.PI));
  }

  private turned(a: number, b: number, c: number, d: number): number {
    return this.turnedBetween(a, b, this.direction(a, b), c, d, this.direction(c, d), 0);
  }

  private turnedBetween(
    a: number,
    b: number,
    from: number,
    c: number,
    d: number,
    to: number,
    depth: number,
  ): number {
    const turn = Math.atan2(Math.sin(to - from), Math.cos(to - from));
    if (depth >= LEAST_DEPTH && Math.abs(turn) < 1) return turn;
    if (depth === MOST_DEPTH) return NaN;
    const e = (a + c) / 2;
    const f = (b + d) / 2;
    const middle = this.direction(e, f);
    return (
      this.turnedBetween(a, b, from, e, f, middle, depth + 1) +
      this.turnedBetween(e, f, middle, c, d, to, depth + 1)
    );
  }

  private direction(a: number, b: number): number {
    this.move(a, b);
    measure(this.group, this.state, this.g, 0);
    const { imbalanceVector: r } = this.state;
    return Math.atan2(dot(r, this.other), dot(r, this.one));
  }
}
