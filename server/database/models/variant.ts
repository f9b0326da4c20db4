import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import { reference } from './columns.ts';

export interface VariantRow extends Model<InferAttributes<VariantRow>, InferCreationAttributes<VariantRow>> {
  revisionId: number;
  ordinal: number;
  paramsHash: string;
  params: unknown;
  /** kg */
  mass: number;
  boltCount: number;
  /** mm3 of weld metal */
  weldVolume: number;
  /** kN, the lowest of all its cells; null when every cell is rejected. */
  lowest: CreationOptional<number | null>;
  /** Float32 little-endian, senses x angles, kN rounded down; NaN where there is none. */
  capacities: Buffer;
  /** Uint8, senses x angles: index of the limit state, or 255 - k for rule k of the legend. */
  governing: Buffer;
}

/** One combination of the swept parameters with all its cells, packed. */
export const defineVariant = (sequelize: Sequelize) =>
  sequelize.define<VariantRow>(
    'variant',
    {
      revisionId: { type: reference(), primaryKey: true },
      ordinal: { type: DataTypes.INTEGER, primaryKey: true },
      paramsHash: DataTypes.CHAR(32),
      params: DataTypes.JSON,
      mass: DataTypes.DOUBLE,
      boltCount: DataTypes.INTEGER,
      weldVolume: DataTypes.DOUBLE,
      lowest: DataTypes.DOUBLE,
      capacities: DataTypes.BLOB('long'),
      governing: DataTypes.BLOB('long'),
    },
    { tableName: 'variants', timestamps: false },
  );
