import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import { lockVersion } from './columns.ts';

export interface Factors {
  gammaM0: number;
  gammaM1: number;
  gammaM2: number;
}
export interface SettingsRow extends Model<
  InferAttributes<SettingsRow>,
  InferCreationAttributes<SettingsRow>
> {
  id: number;
  firm: string;
  /** kN to which capacities are rounded down; `increment` is a method of every model. */
  incrementKn: number;
  factors: Factors;
  weldSymbols: CreationOptional<'iso-2553' | 'aws-a2.4'>;
  lockVersion: CreationOptional<number>;
}

/** The firm's own settings: one row, number 1. */
export const defineSettings = (sequelize: Sequelize) =>
  sequelize.define<SettingsRow>(
    'settings',
    {
      id: { type: DataTypes.TINYINT, primaryKey: true },
      firm: DataTypes.STRING(120),
      incrementKn: { type: DataTypes.DOUBLE, field: 'increment' },
      factors: DataTypes.JSON,
      weldSymbols: { type: DataTypes.STRING(12), field: 'weld_symbols' },
      lockVersion: lockVersion(),
    },
    { tableName: 'settings', timestamps: false, version: 'lockVersion' },
  );
