import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import type { Role } from '@shared/contracts/common.ts';
import { id, instant, lockVersion } from './columns.ts';

export interface PersonRow extends Model<InferAttributes<PersonRow>, InferCreationAttributes<PersonRow>> {
  id: CreationOptional<number>;
  email: string;
  name: string;
  role: Role;
  state: CreationOptional<'active' | 'disabled'>;
  passwordHash: string;
  lastSignInAt: CreationOptional<Date | null>;
  lockVersion: CreationOptional<number>;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
}

/** Everyone who may sign in, or could once. */
export const definePerson = (sequelize: Sequelize) =>
  sequelize.define<PersonRow>(
    'person',
    {
      id: id(),
      email: DataTypes.STRING(254),
      name: DataTypes.STRING(120),
      role: DataTypes.STRING(20),
      state: { type: DataTypes.STRING(10), defaultValue: 'active' },
      passwordHash: DataTypes.STRING(200),
      lastSignInAt: instant(),
      lockVersion: lockVersion(),
      createdAt: instant(),
      updatedAt: instant(),
    },
    { tableName: 'people', version: 'lockVersion' },
  );
