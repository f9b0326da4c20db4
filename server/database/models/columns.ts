import { DataTypes } from 'sequelize';

/* Columns that many tables share; each call is a fresh definition, since Sequelize writes into it. */

export const id = () => ({ type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true });
export const reference = () => DataTypes.BIGINT;
/** A moment in UTC, to the millisecond. */
export const instant = () => DataTypes.DATE(3);
export const lockVersion = () => ({ type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 });
