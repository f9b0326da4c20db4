import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import { id, instant, reference } from './columns.ts';

export interface SignatureRow extends Model<
  InferAttributes<SignatureRow>,
  InferCreationAttributes<SignatureRow>
> {
  id: CreationOptional<number>;
  revisionId: number;
  personId: number;
  verdict: 'submitted' | 'signed' | 'returned';
  comment: string;
  at: Date;
}

/** What its author and its checkers said of a revision; never altered. */
export const defineSignature = (sequelize: Sequelize) =>
  sequelize.define<SignatureRow>(
    'signature',
    {
      id: id(),
      revisionId: reference(),
      personId: reference(),
      verdict: DataTypes.STRING(10),
      comment: DataTypes.STRING(2000),
      at: instant(),
    },
    { tableName: 'signatures', timestamps: false },
  );
