import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** One refresh token, hashed. Used once; then it names its successor. */
export class RefreshSession extends Model<
  InferAttributes<RefreshSession>,
  InferCreationAttributes<RefreshSession>
> {
  declare id: string;
  declare familyId: string;
  declare tokenHash: string;
  declare createdAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
  declare successorId: CreationOptional<string | null>;
}

export function initRefreshSession(sequelize: Sequelize): void {
  RefreshSession.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      familyId: { type: DataTypes.UUID, allowNull: false },
      tokenHash: { type: DataTypes.TEXT, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      expiresAt: { type: DataTypes.DATE(3), allowNull: false },
      usedAt: { type: DataTypes.DATE(3) },
      successorId: { type: DataTypes.UUID },
    },
    {
      sequelize,
      modelName: 'RefreshSession',
      tableName: 'refresh_sessions',
      underscored: true,
      timestamps: false,
    },
  );
}
