import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { DraftContent } from '@tipward/contract';

/** Private work of its author. `revision` grows with each save and is the ETag. */
export class Draft extends Model<InferAttributes<Draft>, InferCreationAttributes<Draft>> {
  declare id: CreationOptional<string>;
  declare designId: string;
  declare authorId: string;
  declare parentVersionId: CreationOptional<string | null>;
  declare revision: CreationOptional<number>;
  declare content: DraftContent;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initDraft(sequelize: Sequelize): void {
  Draft.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      designId: { type: DataTypes.UUID, allowNull: false },
      authorId: { type: DataTypes.UUID, allowNull: false },
      parentVersionId: { type: DataTypes.UUID },
      revision: { type: DataTypes.INTEGER, defaultValue: 1, allowNull: false },
      content: { type: DataTypes.JSONB, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      updatedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'Draft', tableName: 'drafts', underscored: true, timestamps: false },
  );
}
