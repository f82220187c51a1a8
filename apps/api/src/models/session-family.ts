import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** One sign-in on one device; every refresh stays in the family, and ending it ends them all. */
export class SessionFamily extends Model<
  InferAttributes<SessionFamily>,
  InferCreationAttributes<SessionFamily>
> {
  declare id: CreationOptional<string>;
  declare personId: string;
  declare createdAt: CreationOptional<Date>;
  declare endedAt: CreationOptional<Date | null>;
  declare endedReason: CreationOptional<string | null>;
}

export function initSessionFamily(sequelize: Sequelize): void {
  SessionFamily.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      personId: { type: DataTypes.UUID, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      endedAt: { type: DataTypes.DATE(3) },
      endedReason: { type: DataTypes.TEXT },
    },
    {
      sequelize,
      modelName: 'SessionFamily',
      tableName: 'session_families',
      underscored: true,
      timestamps: false,
    },
  );
}
