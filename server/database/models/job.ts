import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import { id, instant, reference } from './columns.ts';

export type JobState = 'queued' | 'running' | 'done' | 'failed' | 'cancelled';

export interface JobRow extends Model<InferAttributes<JobRow>, InferCreationAttributes<JobRow>> {
  id: CreationOptional<number>;
  kind: CreationOptional<'sweep'>;
  revisionId: number;
  requestedBy: number;
  spec: unknown;
  specHash: string;
  state: CreationOptional<JobState>;
  priority: CreationOptional<number>;
  attempts: CreationOptional<number>;
  runAfter: CreationOptional<Date | null>;
  leaseOwner: CreationOptional<string | null>;
  leaseUntil: CreationOptional<Date | null>;
  /** Raised with each claim: a write that carries an older one is refused. */
  fence: CreationOptional<number>;
  chunkCount: number;
  chunksDone: CreationOptional<number>;
  cancelRequested: CreationOptional<boolean>;
  error: CreationOptional<string | null>;
  createdAt: CreationOptional<Date>;
  startedAt: CreationOptional<Date | null>;
  finishedAt: CreationOptional<Date | null>;
}

/** Work that outlives a request; at most one live job a revision. */
export const defineJob = (sequelize: Sequelize) =>
  sequelize.define<JobRow>(
    'job',
    {
      id: id(),
      kind: { type: DataTypes.STRING(20), defaultValue: 'sweep' },
      revisionId: reference(),
      requestedBy: reference(),
      spec: DataTypes.JSON,
      specHash: DataTypes.CHAR(64),
      state: { type: DataTypes.STRING(10), defaultValue: 'queued' },
      priority: { type: DataTypes.INTEGER, defaultValue: 0 },
      attempts: { type: DataTypes.INTEGER, defaultValue: 0 },
      runAfter: instant(),
      leaseOwner: DataTypes.STRING(80),
      leaseUntil: instant(),
      fence: { type: DataTypes.BIGINT, defaultValue: 0 },
      chunkCount: DataTypes.INTEGER,
      chunksDone: { type: DataTypes.INTEGER, defaultValue: 0 },
      cancelRequested: { type: DataTypes.BOOLEAN, defaultValue: false },
      error: DataTypes.STRING(2000),
      createdAt: instant(),
      startedAt: instant(),
      finishedAt: instant(),
    },
    { tableName: 'jobs', updatedAt: false },
  );
