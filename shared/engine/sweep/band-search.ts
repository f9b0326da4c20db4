import { toRadians } from '../numeric/units.ts';
import type { PreparedDetail, Sense } from '../types.ts';

/** Angles lie this close together at first, radians. */
const STEP = toRadians(0.5);
/** A change of more than this share between two samples is looked into. */
const JUMP = 0.02;
/** Halvings of an interval, and golden cuts: both end below 1e-11 of a step. */
const HALVINGS = 40;
const CUTS = 52;
const GOLDEN = (Math.sqrt(5) - 1) / 2;
/** A limit state this far above the lowest found cannot fall below it within two steps. */
const FAR = 2;

interface Sample {
  readonly theta: number;
  /** Index of the governing limit state, or NOT_PERMITTED, NOT_COVERED. */
  readonly governing: number;
  readonly capacity: number;
  readonly states: Float64Array;
}

/** The lowest point of the capacity curve in a band; of an angle without a capacity, that angle. */
export class BandSearch {
  private readonly out: Float64Array;
  private best: Sample | undefined;
  /** An angle that has no capacity ends the search: nothing holds for the whole band. */
  private gap: Sample | undefined;

  constructor(
    private readonly detail: PreparedDetail,
    private readonly sense: Sense,
    private readonly from: number,
    private readonly to: number,
  ) {
    this.out = new Float64Array(detail.limitStates.length);
  }

  lowest(): Sample {
    const samples = this.angles().map((theta) => this.sample(theta));
    for (let at = 1; at < samples.length && !this.gap; at++) {
      this.closeIn(samples[at - 1]!, samples[at]!);
    }
    for (let state = 0; state < this.out.length && !this.gap; state++) this.follow(samples, state);
    return this.gap ?? this.best!;
  }

  private angles(): number[] {
    const { from, to } = this;
    const steps = Math.max(1, Math.ceil((to - from) / STEP));
    const even = Array.from({ length: steps + 1 }, (_, at) => from + ((to - from) * at) / steps);
    const all = from < 0 && to > 0 ? [...even, 0] : even;
    return [...new Set(all)].sort((one, other) => one - other);
  }

  /** Evaluates an angle and remembers it when it is the lowest yet. */
  private sample(theta: number): Sample {
    const governing = this.detail.at(theta, this.sense, this.out);
    const capacity = governing < 0 ? NaN : this.out[governing]!;
    const sample = { theta, governing, capacity, states: Float64Array.from(this.out) };
    if (governing < 0) this.gap ??= sample;
    else if (this.best === undefined || capacity < this.best.capacity) this.best = sample;
    return sample;
  }

  /** Halves the interval around a change of governing limit state or a jump, so that both of its sides are seen. */
  private closeIn(left: Sample, right: Sample): void {
    const changes = (a: Sample, b: Sample) =>
      a.governing !== b.governing || Math.abs(a.capacity - b.capacity) > JUMP * a.capacity;
    if (!changes(left, right)) return;
    let [a, b] = [left, right];
    for (let step = 0; step < HALVINGS && !this.gap; step++) {
      const middle = this.sample((a.theta + b.theta) / 2);
      const leftIsSteeper = Math.abs(a.capacity - middle.capacity) > Math.abs(middle.capacity - b.capacity);
      const takeLeft =
        a.governing !== middle.governing && b.governing === middle.governing
          ? true
          : a.governing === middle.governing && b.governing !== middle.governing
            ? false
            : leftIsSteeper;
      if (takeLeft) b = middle;
      else a = middle;
    }
  }

  /** Follows every local minimum of one limit state's own curve down to its foot. */
  private follow(samples: readonly Sample[], state: number): void {
    const value = (at: number) => samples[at]?.states[state] ?? Infinity;
    for (let at = 0; at < samples.length; at++) {
      const here = value(at);
      if (!(here <= value(at - 1) && here <= value(at + 1))) continue;
      if (this.gap || here > FAR * this.best!.capacity) continue;
      const left = samples[Math.max(at - 1, 0)]!;
      const right = samples[Math.min(at + 1, samples.length - 1)]!;
      this.cutDown(left.theta, right.theta, state);
    }
  }

  /** Golden-section search for the least of one limit state between two angles. */
  private cutDown(from: number, to: number, state: number): void {
    let [low, high] = [from, to];
    let [a, b] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)];
    let [left, right] = [this.sample(a), this.sample(b)];
    for (let cut = 0; cut < CUTS && !this.gap; cut++) {
      if (left.states[state]! <= right.states[state]!) {
        [high, b, right] = [b, a, left];
        a = high - GOLDEN * (high - low);
        left = this.sample(a);
      } else {
        [low, a, left] = [a, b, right];
        b = low + GOLDEN * (high - low);
        right = this.sample(b);
      }
    }
  }
}
