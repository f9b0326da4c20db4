import fc from 'fast-check';
import { boltCases, boltLines, weldCases } from '../engine/support/group-cases.ts';
import {
  centreHolds,
  elasticBalances,
  elasticIsBelow,
  fallsWithDistance,
  turnsAlong,
  weldCentreHolds,
} from '../engine/support/group-properties.ts';
import { fuzzer, type Fuzzer } from './fuzzer.ts';

const angles = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true });
const further = fc.double({ min: 0, max: 500, noNaN: true });

export const groupFuzzers: readonly Fuzzer[] = [
  fuzzer(
    'bolt-centre',
    'bolts by the instantaneous centre: found for every pattern and load, in balance',
    boltCases,
    centreHolds,
  ),
  fuzzer(
    'bolt-elastic',
    'elastic bolt forces: in balance, and not above the instantaneous centre',
    boltLines,
    (given) => {
      elasticBalances(given);
      elasticIsBelow(given);
    },
  ),
  fuzzer(
    'bolt-turned',
    'a turned bolt group has the same coefficient',
    fc.tuple(boltLines, angles),
    ([given, turn]) => turnsAlong(given, turn),
  ),
  fuzzer(
    'bolt-distance',
    'a bolt group carries no more of a load farther away',
    fc.tuple(boltLines, further),
    ([given, more]) => fallsWithDistance(given, more),
  ),
  fuzzer(
    'weld-centre',
    'welds by the instantaneous centre: found for every shape and load line',
    weldCases,
    weldCentreHolds,
  ),
];
