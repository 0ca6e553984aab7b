import { DataTypes } from 'sequelize';

/**
 * Column definitions shared by the models; times keep their milliseconds. Each use gets its own object, as
 * Sequelize writes the column's name into it.
 */
export const column = {
  get id() {
    return { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true };
  },
  get number() {
    return { type: DataTypes.INTEGER.UNSIGNED, allowNull: false };
  },
  get optionalNumber() {
    return { type: DataTypes.INTEGER.UNSIGNED, allowNull: true };
  },
  get decimal() {
    return { type: DataTypes.DECIMAL(13, 5), allowNull: false };
  },
  get optionalDecimal() {
    return { type: DataTypes.DECIMAL(13, 5), allowNull: true };
  },
  get string() {
    return { type: DataTypes.STRING, allowNull: false };
  },
  get optionalString() {
    return { type: DataTypes.STRING, allowNull: true };
  },
  get text() {
    return { type: DataTypes.TEXT, allowNull: false };
  },
  get optionalText() {
    return { type: DataTypes.TEXT, allowNull: true };
  },
  get boolean() {
    return { type: DataTypes.BOOLEAN, allowNull: false };
  },
  get optionalBoolean() {
    return { type: DataTypes.BOOLEAN, allowNull: true };
  },
  get day() {
    return { type: DataTypes.DATEONLY, allowNull: false };
  },
  get optionalDay() {
    return { type: DataTypes.DATEONLY, allowNull: true };
  },
  get instant() {
    return { type: DataTypes.DATE(3), allowNull: false };
  },
  get optionalInstant() {
    return { type: DataTypes.DATE(3), allowNull: true };
  },
  get json() {
    return { type: DataTypes.JSON, allowNull: false };
  },
  get optionalJson() {
    return { type: DataTypes.JSON, allowNull: true };
  },
};
