import assert from 'node:assert/strict';
import { boltForceRatio } from '@shared/engine/groups/bolt-curve.ts';
import { boltGroup, type BoltGroup } from '@shared/engine/groups/bolt-group.ts';
import { elasticBoltForces, elasticBoltMultiplier } from '@shared/engine/groups/bolt-group-elastic.ts';
import { boltGroupIc } from '@shared/engine/groups/bolt-group-ic.ts';
import type { GroupLoad } from '@shared/engine/groups/group-load.ts';
import { worstElasticWeld } from '@shared/engine/groups/weld-group-elastic.ts';
import { weldGroupIc } from '@shared/engine/groups/weld-group-ic.ts';
import { type BoltCase, loadBeside, type WeldCase } from './group-cases.ts';

/** Farthest from 0 that a share of the load may be out of balance. */
const BALANCE = 1e-9;

function strengthOf(group: BoltGroup, load: GroupLoad) {
  const found = boltGroupIc(group, load);
  assert(found.ok, `no centre: ${found.ok ? '' : `${found.reason}, imbalance ${found.imbalance}`}`);
  return found;
}

function assertBalance(group: BoltGroup, load: GroupLoad, times: number, forces: Float64Array): void {
  let [fx, fy, m] = [0, 0, 0];
  for (let i = 0; i < group.count; i++) {
    fx += forces[2 * i]!;
    fy += forces[2 * i + 1]!;
    m += group.dx[i]! * forces[2 * i + 1]! - group.dy[i]! * forces[2 * i]!;
  }
  const size = times * Math.hypot(load.fx, load.fy, load.moment / group.radius);
  assert(Math.abs(fx - times * load.fx) < BALANCE * size, `forces along x: ${fx}`);
  assert(Math.abs(fy - times * load.fy) < BALANCE * size, `forces along y: ${fy}`);
  assert(Math.abs(m - times * load.moment) < BALANCE * size * group.radius, `moment: ${m}`);
}

/**
 * The definition of the method, whichever way the centre was found: the forces balance the load, each bolt's is square to
 * its distance from the centre and of the curve's size there, and the farthest has reached Δ_max.
 */
export function centreHolds({ group, load }: BoltCase): void {
  const found = strengthOf(group, load);
  const { forces, motion } = found;
  assertBalance(group, load, found.multiplier, forces);
  let most = 0;
  for (let i = 0; i < group.count; i++) {
    const force = Math.hypot(forces[2 * i]!, forces[2 * i + 1]!);
    most = Math.max(most, force);
    const ux = motion.ux - (motion.turn * group.dy[i]!) / group.radius;
    const uy = motion.uy + (motion.turn * group.dx[i]!) / group.radius;
    const moved = Math.hypot(ux, uy);
    // A bolt at the centre moves less than its motion can be told from rounding; its force stands in the balance.
    if (moved < 1e-9) continue;
    assert(Math.abs(force - boltForceRatio(moved)) < 1e-7, `bolt ${i}: force ${force} at ${moved}`);
    assert(Math.abs(forces[2 * i]! * uy - forces[2 * i + 1]! * ux) < 1e-7 * moved, `bolt ${i}: direction`);
  }
  assert(Math.abs(most / boltForceRatio(1) - 1) < BALANCE, `farthest bolt: ${most}`);
}

/** The elastic method exceeds the instantaneous centre by the normalisation at most. */
export function elasticIsBelow({ group, load }: BoltCase): void {
  const elastic = elasticBoltMultiplier(group, load) * boltForceRatio(1);
  assert(strengthOf(group, load).multiplier >= elastic * (1 - 1e-9), `elastic ${elastic}`);
}

/** Elastic forces balance the load and the moment. */
export function elasticBalances({ group, load }: BoltCase): void {
  const forces = new Float64Array(2 * group.count);
  elasticBoltForces(group, load, forces);
  assertBalance(group, load, 1, forces);
}

/** A group turned with its load has the same coefficient. */
export function turnsAlong({ group, load }: BoltCase, turn: number): void {
  const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
  const turned = boltGroup(
    Array.from(group.dx, (x, i) => ({ x: x * cos - group.dy[i]! * sin, y: x * sin + group.dy[i]! * cos })),
  );
  const { fx, fy, moment } = load;
  const there = { fx: fx * cos - fy * sin, fy: fx * sin + fy * cos, moment };
  const ratio = strengthOf(turned, there).multiplier / strengthOf(group, load).multiplier;
  assert(Math.abs(ratio - 1) < 1e-7, `turned by ${turn}: ${ratio}`);
}

/** A load along the rows' line carries no more when it moves `further` away from the middle. */
export function fallsWithDistance({ group, load }: BoltCase, further: number): void {
  const near = strengthOf(group, loadBeside(Math.PI / 2, Math.abs(load.moment))).multiplier;
  const far = strengthOf(group, loadBeside(Math.PI / 2, Math.abs(load.moment) + further)).multiplier;
  assert(far <= near * (1 + 1e-9), `near ${near}, ${further} mm further ${far}`);
}

/**
 * The least strength of a fillet at its own Δ_u over its longitudinal strength is 0.801, at 11.4° to the force:
 * Δ_u = 0.17 w, p = 0.17/(0.209 · 13.4^-0.32) = 1.866, (1 + 0.5 sin^1.5 11.4°) [p (1.9 - 0.9 p)]^0.3 = 0.801.
 */
const LEAST_OF_ELASTIC = 0.8;

/** A weld group has its centre, in balance, and is worth about the elastic method or more. */
export function weldCentreHolds({ group, load }: WeldCase): void {
  const found = weldGroupIc(group, load);
  assert(found.ok, `no centre: ${found.ok ? '' : `${found.reason}, imbalance ${found.imbalance}`}`);
  assert(found.imbalance < BALANCE);
  const share = found.multiplier * worstElasticWeld(group, load);
  assert(share >= LEAST_OF_ELASTIC, `share of the elastic method ${share}`);
}
