import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import { id, instant, reference } from './columns.ts';

export interface ExportRow extends Model<InferAttributes<ExportRow>, InferCreationAttributes<ExportRow>> {
  id: CreationOptional<number>;
  revisionId: number;
  personId: number;
  format: string;
  drawingNumber: string;
  layout: unknown;
  fileHash: string;
  createdAt: CreationOptional<Date>;
}

/** The register of what left for the drawing office; never altered. */
export const defineExport = (sequelize: Sequelize) =>
  sequelize.define<ExportRow>(
    'export',
    {
      id: id(),
      revisionId: reference(),
      personId: reference(),
      format: DataTypes.STRING(10),
      drawingNumber: DataTypes.STRING(40),
      layout: DataTypes.JSON,
      fileHash: DataTypes.CHAR(64),
      createdAt: instant(),
    },
    { tableName: 'exports', updatedAt: false },
  );
