import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A comment of a review; only its resolution is written later. */
export class ReviewComment extends Model<
  InferAttributes<ReviewComment>,
  InferCreationAttributes<ReviewComment>
> {
  declare id: CreationOptional<string>;
  declare reviewId: string;
  declare authorId: string;
  declare text: string;
  declare stationRadiusM: CreationOptional<number | null>;
  declare replyTo: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare resolvedAt: CreationOptional<Date | null>;
  declare resolvedBy: CreationOptional<string | null>;
}

export function initReviewComment(sequelize: Sequelize): void {
  ReviewComment.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      reviewId: { type: DataTypes.UUID, allowNull: false },
      authorId: { type: DataTypes.UUID, allowNull: false },
      text: { type: DataTypes.TEXT, allowNull: false },
      stationRadiusM: { type: DataTypes.DOUBLE },
      replyTo: { type: DataTypes.UUID },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
      resolvedAt: { type: DataTypes.DATE(3) },
      resolvedBy: { type: DataTypes.UUID },
    },
    { sequelize, modelName: 'ReviewComment', tableName: 'comments', underscored: true, timestamps: false },
  );
}
