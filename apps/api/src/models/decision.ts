import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

export type DecisionOutcome = 'approved' | 'changes-requested';

/** The signature under a review, with the hashes of what was signed; permanent. */
export class Decision extends Model<InferAttributes<Decision>, InferCreationAttributes<Decision>> {
  declare id: CreationOptional<string>;
  declare reviewId: string;
  declare versionId: string;
  declare outcome: DecisionOutcome;
  declare note: string;
  declare contentHash: string;
  declare specificationHash: string;
  declare decidedBy: string;
  declare decidedAt: CreationOptional<Date>;
}

export function initDecision(sequelize: Sequelize): void {
  Decision.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      reviewId: { type: DataTypes.UUID, allowNull: false },
      versionId: { type: DataTypes.UUID, allowNull: false },
      outcome: { type: DataTypes.TEXT, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false },
      contentHash: { type: DataTypes.TEXT, allowNull: false },
      specificationHash: { type: DataTypes.TEXT, allowNull: false },
      decidedBy: { type: DataTypes.UUID, allowNull: false },
      decidedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'Decision', tableName: 'decisions', underscored: true, timestamps: false },
  );
}
