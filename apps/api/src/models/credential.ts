import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** The password of a person, as a bcrypt hash. None until the invitation is taken up. */
export class Credential extends Model<InferAttributes<Credential>, InferCreationAttributes<Credential>> {
  declare personId: string;
  declare passwordHash: string;
  declare changedAt: CreationOptional<Date>;
}

export function initCredential(sequelize: Sequelize): void {
  Credential.init(
    {
      personId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      passwordHash: { type: DataTypes.TEXT, allowNull: false },
      changedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'Credential', tableName: 'credentials', underscored: true, timestamps: false },
  );
}
