import type { Sequelize } from 'sequelize';
import { defineDefinitionSave } from './definition-save.ts';
import { defineExport } from './export.ts';
import { defineFamily } from './family.ts';
import { defineJob } from './job.ts';
import { defineJobChunk } from './job-chunk.ts';
import { definePerson } from './person.ts';
import { defineRevision } from './revision.ts';
import { defineSession } from './session.ts';
import { defineSettings } from './settings.ts';
import { defineSignature } from './signature.ts';
import { defineVariant } from './variant.ts';

/** All models on one pool. The audit trail has none: it is written and read in one place, by SQL. */
export function defineModels(sequelize: Sequelize) {
  return {
    Person: definePerson(sequelize),
    Session: defineSession(sequelize),
    Family: defineFamily(sequelize),
    Revision: defineRevision(sequelize),
    DefinitionSave: defineDefinitionSave(sequelize),
    Variant: defineVariant(sequelize),
    Signature: defineSignature(sequelize),
    Job: defineJob(sequelize),
    JobChunk: defineJobChunk(sequelize),
    Export: defineExport(sequelize),
    Settings: defineSettings(sequelize),
  };
}
export type Models = ReturnType<typeof defineModels>;
