import type { BasisId, BasisInfo, PartialFactors } from '../types.ts';
import type { Basis, BasisRegistry } from './basis.ts';
import { aisc360Asd, aisc360Lrfd } from './aisc-360-2022/index.ts';
import { csaS16 } from './csa-s16-2019/index.ts';
import { en199318 } from './en-1993-1-8-2005/index.ts';
import { sans101621 } from './sans-10162-1-2011/index.ts';

/** Every design basis. A new one is a folder and a line here. */
const standards: BasisRegistry = {
  'sans-10162-1-2011': sans101621,
  'csa-s16-2019': csaS16,
  'en-1993-1-8-2005': en199318,
  'aisc-360-2022-lrfd': aisc360Lrfd,
  'aisc-360-2022-asd': aisc360Asd,
};

export const bases: readonly BasisInfo[] = Object.values(standards).map(({ info }) => info);

/** The description of a basis, or undefined when there is none of that name. */
export function findBasis(id: string): BasisInfo | undefined {
  return bases.find((basis) => basis.id === id);
}

/**
 * A basis with a firm's partial factors; what the firm leaves out takes the recommended value.
 * Undefined when there is no such basis.
 */
export function createBasis(id: BasisId, factors?: Partial<PartialFactors> | null): Basis | undefined {
  if (!Object.hasOwn(standards, id)) return undefined;
  const { info, create } = standards[id];
  return create({
    gammaM0: factors?.gammaM0 ?? info.defaultFactors.gammaM0,
    gammaM1: factors?.gammaM1 ?? info.defaultFactors.gammaM1,
    gammaM2: factors?.gammaM2 ?? info.defaultFactors.gammaM2,
  });
}
