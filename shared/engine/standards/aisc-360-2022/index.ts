export { clearDistance, nominalBearing, nominalTearOut } from './bearing.ts';
export { nominalBlockShear, uniformity } from './block-shear.ts';
export { longJointFactor, nominalBoltShear, stressesOf, threadedPartStresses } from './bolt-shear.ts';
export { nominalBoltTension, tensileStressWithShear, tensionBesideShear } from './bolt-tension.ts';
export {
  criticalStress,
  nominalShearRupture,
  nominalShearYield,
  nominalTensileRupture,
  nominalTensileYield,
} from './connected-elements.ts';
export {
  detailing,
  leastEdgeDistance,
  leastFilletLeg,
  leastSpacing,
  standardClearance,
} from './detailing.ts';
export {
  directionalIncrease,
  endLoadedFactor,
  matchingThickness,
  mixedGroup,
  nominalFillet,
} from './fillet-weld.ts';
export {
  asd,
  available,
  type FactorPair,
  type Format,
  lrfd,
  rupture,
  shearYielding,
  yielding,
} from './format.ts';
export { shearLagFactor } from './shear-lag.ts';
export { aisc360Asd, aisc360Lrfd } from './basis.ts';
