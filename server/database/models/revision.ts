import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import type { RevisionState } from '@shared/contracts/common.ts';
import { id, instant, lockVersion, reference } from './columns.ts';

/** What a finished sweep says of itself; frozen with the cells. */
export interface ResultSummary {
  /** Swept parameters, in the order of the grid: the last varies fastest. */
  readonly axes: readonly { readonly name: string; readonly values: readonly unknown[] }[];
  /** Degrees. */
  readonly angles: readonly number[];
  readonly senses: readonly string[];
  /** kN */
  readonly increment: number;
  /** kN; null when every cell is rejected. */
  readonly lowest: number | null;
  readonly highest: number | null;
  readonly rejected: readonly { readonly rule: string; readonly cells: number }[];
}

export interface RevisionRow extends Model<
  InferAttributes<RevisionRow>,
  InferCreationAttributes<RevisionRow>
> {
  id: CreationOptional<number>;
  familyId: number;
  sequence: number;
  letter: CreationOptional<string | null>;
  state: CreationOptional<RevisionState>;
  /** Canonical JSON, byte for byte what `definitionHash` is taken over. */
  definition: string;
  definitionHash: string;
  engineVersion: CreationOptional<string | null>;
  contentHash: CreationOptional<string | null>;
  variantCount: CreationOptional<number | null>;
  cellCount: CreationOptional<number | null>;
  rejectedCells: CreationOptional<number | null>;
  authorId: number;
  checkerId: CreationOptional<number | null>;
  publisherId: CreationOptional<number | null>;
  lockerId: CreationOptional<number | null>;
  submittedAt: CreationOptional<Date | null>;
  checkedAt: CreationOptional<Date | null>;
  publishedAt: CreationOptional<Date | null>;
  lockedAt: CreationOptional<Date | null>;
  withdrawnReason: CreationOptional<string | null>;
  resultSummary: CreationOptional<ResultSummary | null>;
  lockVersion: CreationOptional<number>;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
}

/** One state of a family's life; frozen by triggers from its publication on. */
export const defineRevision = (sequelize: Sequelize) =>
  sequelize.define<RevisionRow>(
    'revision',
    {
      id: id(),
      familyId: reference(),
      sequence: DataTypes.INTEGER,
      letter: DataTypes.STRING(3),
      state: { type: DataTypes.STRING(12), defaultValue: 'draft' },
      definition: DataTypes.TEXT('long'),
      definitionHash: DataTypes.CHAR(64),
      engineVersion: DataTypes.STRING(20),
      contentHash: DataTypes.CHAR(64),
      variantCount: DataTypes.INTEGER,
      cellCount: DataTypes.INTEGER,
      rejectedCells: DataTypes.INTEGER,
      authorId: reference(),
      checkerId: reference(),
      publisherId: reference(),
      lockerId: reference(),
      submittedAt: instant(),
      checkedAt: instant(),
      publishedAt: instant(),
      lockedAt: instant(),
      withdrawnReason: DataTypes.STRING(2000),
      resultSummary: DataTypes.JSON,
      lockVersion: lockVersion(),
      createdAt: instant(),
      updatedAt: instant(),
    },
    { tableName: 'revisions', version: 'lockVersion' },
  );
