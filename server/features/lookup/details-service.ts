import type { z } from 'zod';
import type { lookupDetailsResponse } from '@shared/contracts/lookup.ts';
import type { App } from '../../context.ts';
import type { FamilyRow } from '../../database/models/family.ts';
import type { RevisionRow } from '../../database/models/revision.ts';
import { derivedParametersOf, fixedParametersOf, nameParameter, withResults } from '../results/service.ts';

type Details = z.input<typeof lookupDetailsResponse>['details'];

/** Every family's revision in force, with what is to be chosen. */
export async function listDetails(app: App): Promise<Details> {
  const { Family, Revision } = app.db.models;
  const revisions = await Revision.findAll({ where: { state: ['published', 'locked'] } });
  const ids = revisions.map(({ familyId }) => familyId);
  const families = await Family.findAll({ where: { id: ids }, order: [['code', 'ASC']] });
  return families.flatMap((family) =>
    revisions.filter(({ familyId }) => familyId === family.id).map((row) => presentDetail(row, family)),
  );
}

function presentDetail(row: RevisionRow, family: FamilyRow): Details[number] {
  const swept = withResults(row, family);
  return {
    familyId: family.id,
    code: family.code,
    title: family.title,
    revisionId: row.id,
    letter: row.letter ?? '',
    state: row.state,
    shortHash: row.contentHash?.slice(0, 12) ?? '',
    basis: swept.basis.title,
    senses: [...swept.senses],
    angleMinimum: swept.kind.angleRange.minimum,
    angleMaximum: swept.kind.angleRange.maximum,
    choices: swept.axes.map(({ name, values }) => ({ ...nameParameter(swept, name), values: [...values] })),
    fixed: fixedParametersOf(swept).map(({ name, label, unit, value }) => ({ name, label, unit, value })),
    derived: derivedParametersOf(swept).map(({ name, label, unit, expression }) => ({
      name,
      label,
      unit,
      expression,
    })),
  };
}
