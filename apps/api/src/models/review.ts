import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A version put before the leads; permanent. Withdrawal and decision are records of their own. */
export class Review extends Model<InferAttributes<Review>, InferCreationAttributes<Review>> {
  declare id: CreationOptional<string>;
  declare ordinal: CreationOptional<number>;
  declare versionId: string;
  declare message: string;
  declare askedBy: string;
  declare askedAt: CreationOptional<Date>;
}

export function initReview(sequelize: Sequelize): void {
  Review.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      ordinal: {
        type: DataTypes.BIGINT,
        autoIncrementIdentity: true,
        autoIncrement: true,
        get(this: Review) {
          // PostgreSQL hands a bigint over as text.
          const text: unknown = this.getDataValue('ordinal');
          return Number(text);
        },
      },
      versionId: { type: DataTypes.UUID, allowNull: false },
      message: { type: DataTypes.TEXT, allowNull: false },
      askedBy: { type: DataTypes.UUID, allowNull: false },
      askedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'Review', tableName: 'reviews', underscored: true, timestamps: false },
  );
}
