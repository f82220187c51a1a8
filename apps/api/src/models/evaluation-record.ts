import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Evaluation } from '@tipward/contract';

/** What the solver said of a content under a specification; permanent, one for each solver version. */
export class EvaluationRecord extends Model<
  InferAttributes<EvaluationRecord>,
  InferCreationAttributes<EvaluationRecord>
> {
  declare id: CreationOptional<string>;
  declare contentHash: string;
  declare specificationHash: string;
  declare solverVersion: string;
  declare evaluation: Evaluation;
  declare evaluatedAt: CreationOptional<Date>;
}

export function initEvaluationRecord(sequelize: Sequelize): void {
  EvaluationRecord.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      contentHash: { type: DataTypes.TEXT, allowNull: false },
      specificationHash: { type: DataTypes.TEXT, allowNull: false },
      solverVersion: { type: DataTypes.TEXT, allowNull: false },
      evaluation: { type: DataTypes.JSONB, allowNull: false },
      evaluatedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    {
      sequelize,
      modelName: 'EvaluationRecord',
      tableName: 'evaluations',
      underscored: true,
      timestamps: false,
    },
  );
}
