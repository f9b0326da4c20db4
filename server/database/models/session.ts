import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import { instant, reference } from './columns.ts';

export interface SessionRow extends Model<InferAttributes<SessionRow>, InferCreationAttributes<SessionRow>> {
  id: string;
  personId: number;
  refreshHash: string;
  previousRefreshHash: CreationOptional<string | null>;
  createdAt: Date;
  lastUsedAt: Date;
  expiresAt: Date;
  revokedAt: CreationOptional<Date | null>;
}

/** One sign-in; the refresh token is kept only as its hash. */
export const defineSession = (sequelize: Sequelize) =>
  sequelize.define<SessionRow>(
    'session',
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      personId: reference(),
      refreshHash: DataTypes.CHAR(64),
      previousRefreshHash: DataTypes.CHAR(64),
      createdAt: instant(),
      lastUsedAt: instant(),
      expiresAt: instant(),
      revokedAt: instant(),
    },
    { tableName: 'sessions', timestamps: false },
  );
