export { bearingResistance } from './bearing.ts';
export { blockResistance, shearPlaneStress, tensionEfficiency } from './block-shear.ts';
export { boltShearResistance, shearCoefficient } from './bolt-shear.ts';
export { boltTensionResistance, shearTensionUtilisation, tensionBesideShear } from './bolt-tension.ts';
export { compressionResistance, slenderness } from './compression.ts';
export { detailing, greatestHole, leastEdgeDistance, leastFilletLeg } from './detailing.ts';
export { angleIncrease, filletBaseMetal, filletWeldMetal, multiOrientationFactor } from './fillet-weld.ts';
export { grossYield, netSectionResistance, oneLegFactor, sideWeldedWidth } from './tension-member.ts';
export { csaS16 } from './basis.ts';
