import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** The answer given to a request that carried an Idempotency-Key; status null while it still runs. */
export class IdempotencyKey extends Model<
  InferAttributes<IdempotencyKey>,
  InferCreationAttributes<IdempotencyKey>
> {
  declare personId: string;
  declare operation: string;
  declare key: string;
  declare requestHash: string;
  declare createdAt: CreationOptional<Date>;
  declare status: CreationOptional<number | null>;
  declare body: CreationOptional<{ answer: unknown } | null>;
  declare etag: CreationOptional<string | null>;
}

export function initIdempotencyKey(sequelize: Sequelize): void {
  IdempotencyKey.init(
    {
      personId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      operation: { type: DataTypes.TEXT, primaryKey: true, allowNull: false },
      key: { type: DataTypes.TEXT, primaryKey: true, allowNull: false },
      requestHash: { type: DataTypes.TEXT, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      status: { type: DataTypes.INTEGER },
      body: { type: DataTypes.JSONB },
      etag: { type: DataTypes.TEXT },
    },
    {
      sequelize,
      modelName: 'IdempotencyKey',
      tableName: 'idempotency_keys',
      underscored: true,
      timestamps: false,
    },
  );
}
