import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { DesignContent } from '@tipward/contract';

/** A saved design; permanent. Its state is read from VersionState. */
export class Version extends Model<InferAttributes<Version>, InferCreationAttributes<Version>> {
  declare id: CreationOptional<string>;
  declare designId: string;
  declare number: number;
  declare parentId: CreationOptional<string | null>;
  declare note: string;
  declare content: DesignContent;
  declare contentHash: string;
  declare specificationIssue: number;
  declare specificationHash: string;
  declare solverVersion: string;
  declare changeSummary: string[];
  declare authorId: string;
  declare savedAt: CreationOptional<Date>;
}

export function initVersion(sequelize: Sequelize): void {
  Version.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      designId: { type: DataTypes.UUID, allowNull: false },
      number: { type: DataTypes.INTEGER, allowNull: false },
      parentId: { type: DataTypes.UUID },
      note: { type: DataTypes.TEXT, allowNull: false },
      content: { type: DataTypes.JSONB, allowNull: false },
      contentHash: { type: DataTypes.TEXT, allowNull: false },
      specificationIssue: { type: DataTypes.INTEGER, allowNull: false },
      specificationHash: { type: DataTypes.TEXT, allowNull: false },
      solverVersion: { type: DataTypes.TEXT, allowNull: false },
      changeSummary: { type: DataTypes.JSONB, allowNull: false },
      authorId: { type: DataTypes.UUID, allowNull: false },
      savedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'Version', tableName: 'versions', underscored: true, timestamps: false },
  );
}
