import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

export type LinkPurpose = 'invitation' | 'password-reset';

/** A link of an e-mail, hashed, for one use before it expires. */
export class OneTimeLink extends Model<InferAttributes<OneTimeLink>, InferCreationAttributes<OneTimeLink>> {
  declare id: CreationOptional<string>;
  declare personId: string;
  declare purpose: LinkPurpose;
  declare tokenHash: string;
  declare createdAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
}

export function initOneTimeLink(sequelize: Sequelize): void {
  OneTimeLink.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      personId: { type: DataTypes.UUID, allowNull: false },
      purpose: { type: DataTypes.TEXT, allowNull: false },
      tokenHash: { type: DataTypes.TEXT, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      expiresAt: { type: DataTypes.DATE(3), allowNull: false },
      usedAt: { type: DataTypes.DATE(3) },
    },
    {
      sequelize,
      modelName: 'OneTimeLink',
      tableName: 'one_time_links',
      underscored: true,
      timestamps: false,
    },
  );
}
