import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Someone who may sign in. E-mail is stored in lower case. */
export class Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  declare id: CreationOptional<string>;
  declare email: string;
  declare name: string;
  declare isAdministrator: CreationOptional<boolean>;
  declare createdAt: CreationOptional<Date>;
  declare disabledAt: CreationOptional<Date | null>;
  declare lastSeenAt: CreationOptional<Date | null>;
}

export function initPerson(sequelize: Sequelize): void {
  Person.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      email: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      isAdministrator: { type: DataTypes.BOOLEAN, defaultValue: false, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      disabledAt: { type: DataTypes.DATE(3) },
      lastSeenAt: { type: DataTypes.DATE(3) },
    },
    { sequelize, modelName: 'Person', tableName: 'people', underscored: true, timestamps: false },
  );
}
