import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A review taken back before it was decided; permanent. */
export class ReviewWithdrawal extends Model<
  InferAttributes<ReviewWithdrawal>,
  InferCreationAttributes<ReviewWithdrawal>
> {
  declare reviewId: string;
  declare withdrawnBy: string;
  declare withdrawnAt: CreationOptional<Date>;
}

export function initReviewWithdrawal(sequelize: Sequelize): void {
  ReviewWithdrawal.init(
    {
      reviewId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      withdrawnBy: { type: DataTypes.UUID, allowNull: false },
      withdrawnAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    {
      sequelize,
      modelName: 'ReviewWithdrawal',
      tableName: 'review_withdrawals',
      underscored: true,
      timestamps: false,
    },
  );
}
