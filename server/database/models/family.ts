import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import { id, instant, lockVersion } from './columns.ts';

export interface FamilyRow extends Model<InferAttributes<FamilyRow>, InferCreationAttributes<FamilyRow>> {
  id: CreationOptional<number>;
  code: string;
  title: string;
  kind: string;
  lockVersion: CreationOptional<number>;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
}

/** A parameterised standard detail, e.g. GP-01. */
export const defineFamily = (sequelize: Sequelize) =>
  sequelize.define<FamilyRow>(
    'family',
    {
      id: id(),
      code: DataTypes.STRING(20),
      title: DataTypes.STRING(120),
      kind: DataTypes.STRING(40),
      lockVersion: lockVersion(),
      createdAt: instant(),
      updatedAt: instant(),
    },
    { tableName: 'families', version: 'lockVersion' },
  );
