import "server-only";
import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";

/** A calculation kept under a short address so that it can be sent to a phone; deleted a year after it was last opened. */
export class ShortLink extends Model<InferAttributes<ShortLink>, InferCreationAttributes<ShortLink>> {
  declare id: string; // ten base62 characters from a secure source: 59 bits, so that nobody finds another's by trying
  declare calculator: string;
  declare operation: string; // its path under /api/v1, since a calculator may have several
  declare version: string;
  declare locale: string;
  declare inputs: unknown;
  declare answer: unknown;
  declare createdAt: CreationOptional<Date>;
  declare lastOpenedAt: CreationOptional<Date>;
}

export function defineShortLink(sequelize: Sequelize): void {
  ShortLink.init({
    id: { type: DataTypes.CHAR(10, true), primaryKey: true, allowNull: false },
    calculator: { type: DataTypes.STRING(40), allowNull: false },
    operation: { type: DataTypes.STRING(40), allowNull: false },
    version: { type: DataTypes.STRING(20), allowNull: false },
    locale: { type: DataTypes.STRING(10), allowNull: false },
    inputs: { type: DataTypes.JSON, allowNull: false },
    answer: { type: DataTypes.JSON, allowNull: false },
    createdAt: { type: DataTypes.DATE(3), allowNull: false },
    lastOpenedAt: { type: DataTypes.DATE(3), allowNull: false, defaultValue: DataTypes.NOW },
  }, { sequelize, tableName: "short_links", underscored: true, updatedAt: false, indexes: [{ name: "short_links_last_opened_at", fields: ["last_opened_at"] }] });
}
