export { alphaB, bearingResistance, edgeFactor, singleLapLimit } from './bearing.ts';
export { blockTearing } from './block-tearing.ts';
export { boltShearResistance, longJointFactor, shearCoefficient, smallBoltFactor } from './bolt-shear.ts';
export {
  boltTensionResistance,
  punchingResistance,
  shearTensionUtilisation,
  tensionBesideShear,
} from './bolt-tension.ts';
export { columnCurveC, compressionResistance, slenderness } from './compression.ts';
export { correlationFactor, filletDirectional, filletSimplified } from './fillet-weld.ts';
export {
  angleByOneLeg,
  equalAngleArea,
  grossYield,
  netSectionResistance,
  oneLegReduction,
} from './tension-member.ts';
export {
  boltsWithFlange,
  flangeYield,
  longestPryingBolt,
  plasticMoment,
  pryingLever,
  tStubResistance,
  tyingFactor,
} from './t-stub.ts';
export { en199318 } from './basis.ts';
