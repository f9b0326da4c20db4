export { bearingResistance } from './bearing.ts';
export { blockTearing } from './block-shear.ts';
export { boltShearResistance, longJointFactor } from './bolt-shear.ts';
export { boltTensionResistance, shearTensionUtilisation, tensionBesideShear } from './bolt-tension.ts';
export { compressionResistance, slenderness } from './compression.ts';
export { leastEdgeDistance, leastFilletLeg } from './detailing.ts';
export { angleIncrease, filletBaseMetal, filletWeldMetal } from './fillet-weld.ts';
export { grossYield, netSectionResistance, oneLegFactor } from './tension-member.ts';
export { sans101621 } from './basis.ts';
