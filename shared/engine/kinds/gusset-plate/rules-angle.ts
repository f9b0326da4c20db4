import { keeps, type Rejections, type Rule } from '../rules.ts';
import type { GussetModel } from './model.ts';
import { ruleOf } from './rule-list.ts';
import { END, type GussetView, LOWER, UPPER } from './view.ts';

/** Room for a spanner beside a bolt, by bolt diameter, from its centre to a face or a weld (common practice, from memory). */
const SPANNER_ROOM = 1.25;

/** The rules that turn with the load, ready with the clauses of their basis. */
export class AngleRules {
  private readonly leastEdge: number;
  private readonly leastEnd: number;
  private readonly leastFace: number;
  private readonly spannerRoom: number;
  private readonly leastClearance: number;
  private readonly corner = ruleOf('outline-corner', 'geometry of the detail', 'mm');
  private readonly cut = ruleOf('outline-cut', 'geometry of the detail', 'mm');
  private readonly edge: Rule;
  private readonly end: Rule;
  private readonly face = ruleOf('hole-clear-of-weld', 'geometry of the detail', 'mm');
  private readonly spanner = ruleOf('spanner-room', 'common practice', 'mm');
  private readonly clearance = ruleOf('member-clearance', 'common practice', 'mm');

  constructor(private readonly m: GussetModel) {
    const { detailing } = m.basis;
    const { d } = m.bolt.size;
    const d0 = m.bolt.holeDiameter;
    this.leastEdge = detailing.leastEdge(d, d0, m.finish);
    this.leastEnd = detailing.leastEnd(d, d0, m.finish, m.rows);
    this.leastFace = m.weldLeg + d0 / 2;
    this.spannerRoom = m.weldLeg + SPANNER_ROOM * d;
    this.leastClearance = Math.max(m.values.number('clearance'), m.weldLeg);
    this.edge = ruleOf('gusset-edge', detailing.clauses.edge, 'mm');
    this.end = ruleOf('gusset-end', detailing.clauses.end, 'mm');
  }

  /**
   * Whether every rule holds at the view's angle. Without a place to gather them it stops at the first that is
   * broken and allocates nothing.
   */
  hold(v: GussetView, found: Rejections | null): boolean {
    const { m } = this;
    if (m.tapered && !this.outlineHolds(v, found) && found === null) return false;
    const { firstRow, halfGauge, member } = m;
    if (!test(found, this.edge, this.edgeOf(v), this.leastEdge)) return false;
    if (!test(found, this.end, v.end, this.leastEnd)) return false;
    const tilt = Math.abs(v.sin);
    const face = firstRow * v.cos - halfGauge * tilt;
    if (!test(found, this.face, face, this.leastFace)) return false;
    if (m.fitWaived) return found === null || found.list.length === 0;
    if (!test(found, this.spanner, face, this.spannerRoom)) return false;
    const clear = (firstRow - member.endDistance) * v.cos - member.halfWidth * tilt;
    if (!test(found, this.clearance, clear, this.leastClearance)) return false;
    return found === null || found.list.length === 0;
  }

  /** A tapered plate is a simple outline: both corners before the face, the cut beyond both ends of the weld. */
  private outlineHolds(v: GussetView, found: Rejections | null): boolean {
    const { m } = this;
    const corner = m.cutDistance * v.cos - m.cutHalfWidth * Math.abs(v.sin);
    const weldEnd = Math.max((m.halfHeight - m.offset) * v.sin, (-m.halfHeight - m.offset) * v.sin);
    if (!test(found, this.corner, corner, 0)) return false;
    return test(found, this.cut, m.cutDistance, weldEnd);
  }

  /** Least distance of any bolt to an edge that is not welded, mm. */
  private edgeOf(v: GussetView): number {
    const { firstRow, lastRow, halfGauge } = this.m;
    return Math.min(
      v.leastInside(LOWER, firstRow, lastRow, halfGauge),
      v.leastInside(END, firstRow, lastRow, halfGauge),
      v.leastInside(UPPER, firstRow, lastRow, halfGauge),
    );
  }
}

/** Whether to go on: the rule holds, or it is noted for later. */
function test(found: Rejections | null, rule: Rule, value: number, limit: number): boolean {
  if (keeps(rule.least, value, limit)) return true;
  if (found === null) return false;
  found.add(rule, value, limit);
  return true;
}
