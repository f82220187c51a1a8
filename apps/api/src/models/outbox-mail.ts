import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A message that waits to be sent, or was. */
export class OutboxMail extends Model<InferAttributes<OutboxMail>, InferCreationAttributes<OutboxMail>> {
  declare id: CreationOptional<string>;
  declare kind: string;
  declare toAddress: string;
  declare subject: string;
  declare text: string;
  declare createdAt: CreationOptional<Date>;
  declare queuedAt: CreationOptional<Date | null>;
  declare sentAt: CreationOptional<Date | null>;
  declare attempts: CreationOptional<number>;
  declare lastError: CreationOptional<string | null>;
}

export function initOutboxMail(sequelize: Sequelize): void {
  OutboxMail.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      kind: { type: DataTypes.TEXT, allowNull: false },
      toAddress: { type: DataTypes.TEXT, allowNull: false },
      subject: { type: DataTypes.TEXT, allowNull: false },
      text: { type: DataTypes.TEXT, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      queuedAt: { type: DataTypes.DATE(3) },
      sentAt: { type: DataTypes.DATE(3) },
      attempts: { type: DataTypes.INTEGER, defaultValue: 0, allowNull: false },
      lastError: { type: DataTypes.TEXT },
    },
    { sequelize, modelName: 'OutboxMail', tableName: 'outbox', underscored: true, timestamps: false },
  );
}
