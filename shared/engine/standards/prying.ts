import type { Rec, TStub } from './basis.ts';

/**
 * The published method for prying on flanges and legs of angles, which AISC, Canadian and South African practice share:
 * AISC Steel Construction Manual, 16th edition, Part 9, "Prying action"; CISC Handbook, Part 3; after Kulak, Fisher and
 * Struik, Guide to Design Criteria for Bolted and Riveted Joints, 1987.
 */

/** What the method makes of a stub's sizes, mm. */
export interface PryingSizes {
  /** Bolt line to the plane of the web, less half a bolt. */
  readonly bReduced: number;
  /** Bolt line to the free edge plus half a bolt, at most 1.25 b + d/2. */
  readonly aExtended: number;
  readonly rho: number;
  /** Net over gross length at the bolt line. */
  readonly delta: number;
}

/** `b' = b − d/2`, `a' = min(a, 1.25 b) + d/2`, `ρ = b'/a'`, `δ = 1 − d_h/p`, d_h across the hole, p along the line. */
export function pryingSizes(stub: TStub): PryingSizes {
  const { boltToWeb: b, edge, bolt, holeDiameter, tributary } = stub;
  const bReduced = Math.max(b - bolt.d / 2, 1);
  const aExtended = Math.min(edge, 1.25 * b) + bolt.d / 2;
  const delta = Math.max(0, 1 - holeDiameter / tributary);
  return { bReduced, aExtended, rho: bReduced / aExtended, delta };
}

/**
 * Pull on one bolt, prying included in the bolt's own tension, N:
 *
 *   K = f p t²/(4 b')                          moment strength at the bolt line as a pull
 *   T = min(B,  K + (B − K)/(1 + ρ),  K (1 + δ))
 *
 * which are the Manual's three cases of Q: the flange thicker than t_c (no prying), the bolt and the flange together, and
 * the flange alone with hinges at both of its lines.
 * @param bending design bending stress of the flange, factored, MPa
 * @param boltTension tension B that the bolt may take, N
 */
export function pryingPull(
  { bReduced, rho, delta }: PryingSizes,
  thickness: number,
  tributary: number,
  bending: number,
  boltTension: number,
): number {
  const K = (bending * tributary * thickness * thickness) / (4 * bReduced);
  return Math.min(boltTension, Math.max(0, K + (boltTension - K) / (1 + rho)), K * (1 + delta));
}

/** Pull on a whole stub by the same method, N, and its lines on the sheet. */
export function pryingStub(
  stub: TStub,
  bending: number,
  bendingText: string,
  boltTension: number,
  clause: string,
  rec: Rec,
): number {
  const sizes = pryingSizes(stub);
  const { thickness, tributary, bolts } = stub;
  const one = pryingPull(sizes, thickness, tributary, bending, boltTension);
  if (rec !== null) {
    const K = (bending * tributary * thickness * thickness) / (4 * sizes.bReduced);
    rec.line("b'", 'bolt line to the web less half a bolt', 'b − d/2', sizes.bReduced, 'mm', clause);
    rec.line("a'", 'edge plus half a bolt', 'min(a, 1.25 b) + d/2', sizes.aExtended, 'mm', clause);
    rec.line('ρ', 'ratio', "b'/a'", sizes.rho, '', clause);
    rec.line('p', 'length for one bolt', '', tributary, 'mm', clause);
    rec.line('δ', 'net over gross length', '1 − d_h/p', sizes.delta, '', clause);
    rec.line('f', 'bending stress of the plate', bendingText, bending, 'MPa', clause);
    rec.line('K', 'plate alone, one hinge', "f p t²/(4 b')", K, 'N', clause);
    rec.line('B', 'tension the bolt may take', '', boltTension, 'N', clause);
    const formula = 'min(B, K + (B − K)/(1 + ρ), K (1 + δ))';
    rec.line('T', 'pull on one bolt with prying', formula, one, 'N', clause);
    rec.line('n', 'bolts', '', bolts, '', clause);
  }
  return bolts * one;
}
