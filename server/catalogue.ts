import { createHash } from 'node:crypto';
import { catalogue, toEngineCatalogue } from '@catalog/index.ts';
import type { EngineCatalogue } from '@shared/engine/index.ts';
import { canonicalJson } from './canonical-json.ts';

let made: { readonly catalogue: EngineCatalogue; readonly hash: string } | undefined;

function make() {
  const engine = toEngineCatalogue(catalogue);
  const hash = createHash('sha256').update(canonicalJson(engine)).digest('hex');
  return { catalogue: engine, hash };
}

/** The reference data as the engine takes it; made once. */
export const engineCatalogue = (): EngineCatalogue => (made ??= make()).catalogue;

/** SHA-256 over it: names the version that a browser keeps. */
export const engineCatalogueHash = (): string => (made ??= make()).hash;
