import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** One turbine’s rotor. `revision` grows with each edit and is the ETag. */
export class Programme extends Model<InferAttributes<Programme>, InferCreationAttributes<Programme>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare summary: string;
  declare revision: CreationOptional<number>;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initProgramme(sequelize: Sequelize): void {
  Programme.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      summary: { type: DataTypes.TEXT, allowNull: false },
      revision: { type: DataTypes.INTEGER, defaultValue: 1, allowNull: false },
      createdBy: { type: DataTypes.UUID, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      updatedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'Programme', tableName: 'programmes', underscored: true, timestamps: false },
  );
}
