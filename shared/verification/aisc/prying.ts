import * as aisc from '../../engine/standards/aisc-360-2022/index.ts';
import {
  extendedEdge,
  netShare,
  pryingPull,
  reducedLever,
  singleCurvature,
} from '../../engine/standards/prying.ts';
import { type Check, rounding } from '../check.ts';
import { COMPANION, Rows } from './formats.ts';

/** Kips, inches and ksi throughout: the functions take any set of units that belongs together. */
const { asd, lrfd, rupture, yielding } = aisc;
const LRFD = 'aisc-360-2022-lrfd';
const ASD = 'aisc-360-2022-asd';

const hanger = {
  source: `${COMPANION}, Example II.D-1`,
  inputs: 'WT6x17.5, t_w 0.300, b_f 6.56, gage 3.5, 3/4 in. Group 120, hole 13/16, p 4.5, F_u 65',
  clause: 'Manual Part 9',
};
const of = (state: string, unit: string) => ({ ...hanger, state, unit });
const b = (3.5 - 0.3) / 2;
const lever = reducedLever(b, 0.75);
const edge = extendedEdge((6.56 - 3.5) / 2, b, 0.75);
const delta = netShare(13 / 16, 4.5);
const roundedLever = rounding("b'", 1.23, 1.225);
/** Thicknesses go with the root of b'. */
const underRoot = { what: roundedLever.what, share: Math.sqrt(1.23 / 1.225) - 1 };

const sizes = new Rows('prying');
sizes.value(of("b'", 'in.'), '1.23', () => lever);
sizes.value(of("a'", 'in.'), '1.91', () => edge);
sizes.add(of('ρ', ''), LRFD, '0.644', () => lever / edge, roundedLever);
sizes.value(of('δ', ''), '0.819', () => delta);

/** Least thickness for a pull on one bolt: the pull of a thin flange goes with its square. */
const thicknessFor = (pull: number, format: aisc.Format, share: number) => {
  const B = aisc.available(format, aisc.nominalBoltTension({ Fnt: 90, Ab: 0.442 }), rupture);
  const K = singleCurvature(aisc.available(format, 65, yielding), 4.5, 0.01, lever);
  return Math.sqrt(pull / (pryingPull(B, K, lever / edge, share) / (0.01 * 0.01)));
};
const least = of('least flange with prying, pull of 60 (LRFD) and 40 (ASD) on 4 bolts', 'in.');
sizes.add(least, LRFD, '0.393', () => thicknessFor(15, lrfd, delta), underRoot);
sizes.add(least, ASD, '0.393', () => thicknessFor(10, asd, delta), underRoot);
const without = of('flange from which nothing pries', 'in.');
sizes.add(without, LRFD, '0.529', () => thicknessFor(15, lrfd, 0), underRoot);
sizes.add(without, ASD, '0.530', () => thicknessFor(10, asd, 0), underRoot);

const combined = new Rows('j3-share');
const bolt = {
  source: `${COMPANION}, Example J.3`,
  inputs: '3/4 in. Group 120-N, A_b 0.442, V 7.996 (LRFD), 5.33 (ASD), by shares of the strengths',
  clause: 'J3.8',
  state: 'bolt tension with shear',
  unit: 'kip',
};
const kept = (format: aisc.Format, V: number) =>
  aisc.tensionBesideShear(
    aisc.available(format, 90 * 0.442, rupture),
    V / aisc.available(format, 54 * 0.442, rupture),
  );
combined.add(bolt, LRFD, '25.5', () => kept(lrfd, 1.2 * 1.33 + 1.6 * 4));
combined.add(bolt, ASD, '17.0', () => kept(asd, 1.33 + 4));

/** Prying on a hanger, and tension beside shear as the bases take it. */
export const prying: readonly Check[] = [...sizes.list, ...combined.list];
