import fc from 'fast-check';
import { boltForceRatio } from '@shared/engine/groups/bolt-curve.ts';
import { boltGroup, boltPattern, type BoltGroup } from '@shared/engine/groups/bolt-group.ts';
import { unitLoadThrough, type GroupLoad } from '@shared/engine/groups/group-load.ts';
import { weldGroup, type WeldGroup } from '@shared/engine/groups/weld-group.ts';

export interface BoltCase {
  readonly group: BoltGroup;
  readonly load: GroupLoad;
}
export interface WeldCase {
  readonly group: WeldGroup;
  readonly load: GroupLoad;
}

interface Pattern {
  readonly rows: number;
  readonly lines: number;
  readonly pitch: number;
  readonly gauge: number;
}

const length = (min: number, max: number) =>
  fc.oneof(
    fc.double({ min, max, noNaN: true }),
    fc.integer({ min: min / 5, max: max / 5 }).map((fives) => 5 * fives),
  );
const patterns: fc.Arbitrary<Pattern> = fc
  .record({
    rows: fc.integer({ min: 1, max: 12 }),
    lines: fc.integer({ min: 1, max: 4 }),
    pitch: length(40, 150),
    gauge: length(40, 250),
  })
  .filter(({ rows, lines }) => rows * lines > 1);
const angles = fc.oneof(
  fc.integer({ min: 0, max: 24 }).map((step) => (step * Math.PI) / 12),
  fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }),
);
/** Eccentricity in depths of the group: 0 to 20, many of them small. */
const depths = fc.double({ min: 0, max: 1, noNaN: true }).map((share) => 20 * share ** 3);

const groupOf = ({ rows, lines, pitch, gauge }: Pattern) => boltGroup(boltPattern(rows, lines, pitch, gauge));
const depthOf = ({ rows, lines, pitch, gauge }: Pattern) => Math.max((rows - 1) * pitch, (lines - 1) * gauge);

/** A unit load at an angle whose line passes `e` from the point. */
export const loadBeside = (turn: number, e: number, x = 0, y = 0) =>
  unitLoadThrough(turn, x - e * Math.sin(turn), y + e * Math.cos(turn));

const anyLine = fc.tuple(patterns, angles, depths).map(([pattern, turn, times]): BoltCase => {
  return { group: groupOf(pattern), load: loadBeside(turn, times * depthOf(pattern)) };
});

/** Load lines in whole fives of millimetres, on which centres fall on bolts. */
const roundLine = fc
  .tuple(patterns, fc.integer({ min: 0, max: 3 }), fc.integer({ min: 0, max: 200 }))
  .map(([pattern, quarters, fives]): BoltCase => {
    const [fx, fy] = [[1, 0] as const, [0, 1] as const, [-1, 0] as const, [0, -1] as const][quarters]!;
    return { group: groupOf(pattern), load: { fx, fy, moment: 5 * fives } };
  });

/** The load that balances the group when it turns about one of its bolts, which has a small force or none. */
const centreAtBolt = fc
  .tuple(
    patterns,
    fc.nat(),
    angles,
    fc.oneof(
      fc.constant(0),
      fc.double({ min: 0, max: 20, noNaN: true }).map((power) => 10 ** -power),
    ),
  )
  .map(([pattern, pick, turn, force]): BoltCase => {
    const group = groupOf(pattern);
    const bolt = pick % group.count;
    const own = { x: force * Math.cos(turn), y: force * Math.sin(turn) };
    return { group, load: loadAbout(group, bolt, own) };
  });

function loadAbout(group: BoltGroup, bolt: number, own: { x: number; y: number }): GroupLoad {
  const { count, dx, dy } = group;
  const away = (i: number) => ({ x: dx[i]! - dx[bolt]!, y: dy[i]! - dy[bolt]! });
  const farthest = Math.max(...Array.from({ length: count }, (_, i) => Math.hypot(away(i).x, away(i).y)));
  let [fx, fy, moment] = [0, 0, 0];
  for (let i = 0; i < count; i++) {
    const { x, y } = away(i);
    const distance = Math.hypot(x, y);
    const secant = i === bolt ? 0 : boltForceRatio(distance / farthest) / distance;
    const force = i === bolt ? own : { x: -secant * y, y: secant * x };
    fx += force.x;
    fy += force.y;
    moment += dx[i]! * force.y - dy[i]! * force.x;
  }
  return { fx, fy, moment };
}

/** Bolt groups of 1 to 12 rows and 1 to 4 lines under any load, degenerate ones among them. */
export const boltCases: fc.Arbitrary<BoltCase> = fc.oneof(anyLine, roundLine, centreAtBolt);

/** The same under unit loads up to 20 depths away. */
export const boltLines: fc.Arbitrary<BoltCase> = fc.oneof(anyLine, roundLine);

const line = (x0: number, y0: number, x1: number, y1: number) => ({
  from: { x: x0, y: y0 },
  to: { x: x1, y: y1 },
});
const shapes = [
  (L: number, _k: number) => [line(0, 0, 0, L)],
  (L: number, k: number) => [line(0, 0, 0, L), line(k, 0, k, L)],
  (L: number, k: number) => [line(0, 0, k, 0), line(0, L, k, L)],
  (L: number, k: number) => [line(0, 0, 0, L), line(0, 0, k, 0), line(0, L, k, L)],
  (L: number, k: number) => [line(0, 0, 0, L), line(0, 0, k, 0)],
  (L: number, k: number) => [line(0, 0, 0, L), line(k, 0, k, L), line(0, 0, k, 0), line(0, L, k, L)],
];

/** Lines, pairs, channels, angles and boxes of weld under unit loads up to 20 lengths away. */
export const weldCases: fc.Arbitrary<WeldCase> = fc
  .tuple(
    fc.constantFrom(...shapes),
    fc.double({ min: 100, max: 600, noNaN: true }),
    fc.double({ min: 0.05, max: 1.5, noNaN: true }),
    angles,
    depths,
  )
  .map(([shape, L, share, turn, times]) => {
    const group = weldGroup(shape(L, share * L));
    return { group, load: loadBeside(turn, times * L, group.centroid.x, group.centroid.y) };
  });
