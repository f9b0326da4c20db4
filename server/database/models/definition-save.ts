import { DataTypes, type CreationOptional, type Sequelize } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model } from 'sequelize';
import { id, instant, reference } from './columns.ts';

export interface DefinitionSaveRow extends Model<
  InferAttributes<DefinitionSaveRow>,
  InferCreationAttributes<DefinitionSaveRow>
> {
  id: CreationOptional<number>;
  revisionId: number;
  number: number;
  definition: string;
  definitionHash: string;
  personId: number;
  createdAt: CreationOptional<Date>;
}

/** Every saved state of a revision's definition, numbered from 1. */
export const defineDefinitionSave = (sequelize: Sequelize) =>
  sequelize.define<DefinitionSaveRow>(
    'definitionSave',
    {
      id: id(),
      revisionId: reference(),
      number: DataTypes.INTEGER,
      definition: DataTypes.TEXT('long'),
      definitionHash: DataTypes.CHAR(64),
      personId: reference(),
      createdAt: instant(),
    },
    { tableName: 'definition_saves', updatedAt: false },
  );
