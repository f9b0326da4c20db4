import type { Rec, TStub } from './basis.ts';

/**
 * The published method for prying on flanges and legs of angles, which AISC, Canadian and South African practice share:
 * AISC Steel Construction Manual, 16th edition, Part 9, "Prying action"; CISC Handbook, Part 3; after Kulak, Fisher and
 * Struik, Guide to Design Criteria for Bolted and Riveted Joints, 1987.
 */

/** Bolt line to the web less half a bolt, mm: `b' = b − d/2`, taken as 1 mm where a bolt would touch the web. */
export function reducedLever(b: number, d: number): number {
  return Math.max(b - d / 2, 1);
}

/** Bolt line to the free edge and half a bolt, mm: `a' = min(a, 1.25 b) + d/2`. */
export function extendedEdge(a: number, b: number, d: number): number {
  return Math.min(a, 1.25 * b) + d / 2;
}

/** Net over gross length at the bolt line: `δ = 1 − d_h/p`, d_h across the hole, p the length for one bolt, mm. */
export function netShare(dh: number, p: number): number {
  return Math.max(0, 1 - dh / p);
}

/** Pull at which the flange yields at its web without prying, N: `K = f p t²/(4 b')`. MPa, mm. */
export function singleCurvature(bending: number, p: number, t: number, b: number): number {
  return (bending * p * t * t) / (4 * b);
}

/**
 * Pull on one bolt that may take a tension B, prying included, N:
 *
 *   T = min(B, (B + ρ K)/(1 + ρ), K (1 + δ))
 *
 * which are the Manual's three cases `T = B Q`: the flange thicker than t_c (no prying), the bolt and the flange together, and
 * the flange alone with hinges at both of its lines. ρ = b'/a', δ from `netShare`, K from `singleCurvature`, N.
 */
export function pryingPull(B: number, K: number, rho: number, delta: number): number {
  return Math.min(B, (B + rho * K) / (1 + rho), K * (1 + delta));
}

/**
 * Pull on a whole stub by the same method, N, and its lines on the sheet.
 * @param bending design bending stress of the flange, factored, MPa
 * @param bendingText the same as a formula
 * @param boltTension tension B that each bolt may take, N
 */
export function pryingStub(
  stub: TStub,
  bending: number,
  bendingText: string,
  boltTension: number,
  clause: string,
  rec: Rec,
): number {
  const { thickness, tributary: p, bolts } = stub;
  const { d } = stub.bolt;
  const bReduced = reducedLever(stub.boltToWeb, d);
  const aExtended = extendedEdge(stub.edge, stub.boltToWeb, d);
  const rho = bReduced / aExtended;
  const delta = netShare(stub.holeDiameter, p);
  const K = singleCurvature(bending, p, thickness, bReduced);
  const one = pryingPull(boltTension, K, rho, delta);
  if (rec !== null) {
    const without = Math.sqrt((4 * boltTension * bReduced) / (bending * p));
    rec.line("b'", 'bolt line to the web less half a bolt', 'b − d/2', bReduced, 'mm', clause);
    rec.line("a'", 'edge plus half a bolt', 'min(a, 1.25 b) + d/2', aExtended, 'mm', clause);
    rec.line('ρ', 'ratio', "b'/a'", rho, '', clause);
    rec.line('p', 'length for one bolt', '', p, 'mm', clause);
    rec.line('δ', 'net over gross length', '1 − d_h/p', delta, '', clause);
    rec.line('f', 'bending stress of the plate', bendingText, bending, 'MPa', clause);
    rec.line('K', 'plate alone, one hinge', "f p t²/(4 b')", K, 'N', clause);
    rec.line('B', 'tension the bolt may take', '', boltTension, 'N', clause);
    rec.line('t_c', 'thickness from which nothing pries', "√(4 B b'/(p f))", without, 'mm', clause);
    const formula = 'min(B, (B + ρ K)/(1 + ρ), K (1 + δ))';
    rec.line('T', 'pull on one bolt with prying', formula, one, 'N', clause);
    rec.line('n', 'bolts', '', bolts, '', clause);
  }
  return bolts * one;
}
