import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A line of versions towards one blade. `revision` grows with each edit and is the ETag. */
export class Design extends Model<InferAttributes<Design>, InferCreationAttributes<Design>> {
  declare id: CreationOptional<string>;
  declare programmeId: string;
  declare name: string;
  declare revision: CreationOptional<number>;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initDesign(sequelize: Sequelize): void {
  Design.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      programmeId: { type: DataTypes.UUID, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      revision: { type: DataTypes.INTEGER, defaultValue: 1, allowNull: false },
      createdBy: { type: DataTypes.UUID, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      updatedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'Design', tableName: 'designs', underscored: true, timestamps: false },
  );
}
