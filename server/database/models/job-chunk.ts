import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import { reference } from './columns.ts';

export interface JobChunkRow extends Model<
  InferAttributes<JobChunkRow>,
  InferCreationAttributes<JobChunkRow>
> {
  jobId: number;
  number: number;
  state: CreationOptional<'waiting' | 'done' | 'failed'>;
  attempts: CreationOptional<number>;
  firstOrdinal: number;
  variantCount: number;
  resultHash: CreationOptional<string | null>;
}

/** A run of variants that is computed and stored as one. */
export const defineJobChunk = (sequelize: Sequelize) =>
  sequelize.define<JobChunkRow>(
    'jobChunk',
    {
      jobId: { type: reference(), primaryKey: true },
      number: { type: DataTypes.INTEGER, primaryKey: true },
      state: { type: DataTypes.STRING(10), defaultValue: 'waiting' },
      attempts: { type: DataTypes.INTEGER, defaultValue: 0 },
      firstOrdinal: DataTypes.INTEGER,
      variantCount: DataTypes.INTEGER,
      resultHash: DataTypes.CHAR(64),
    },
    { tableName: 'job_chunks', timestamps: false },
  );
