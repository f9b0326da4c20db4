import type { Sheet } from '@shared/contracts/revisions.ts';
import { findKind, toRadians } from '@shared/engine/index.ts';
import type { BasisId, DetailGeometry, EngineCatalogue, ParameterValue } from '@shared/engine/types.ts';

/** The detail of a sheet drawn by the engine, or null where it cannot be: an unknown kind, faulty values. */
export function sheetGeometry(sheet: Sheet, kind: string, catalogue: EngineCatalogue): DetailGeometry | null {
  const values = Object.fromEntries(
    sheet.parameters.map(({ name, value }) => [name, value as ParameterValue]),
  );
  const prepared = findKind(kind)?.prepare(values, sheet.basis.id as BasisId, catalogue);
  return prepared?.ok ? prepared.detail.geometry(toRadians(sheet.angle)) : null;
}
