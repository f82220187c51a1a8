import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Requirement, Specification } from '@tipward/contract';

/** An issue of a programme’s specification with its requirements; permanent. */
export class SpecificationIssue extends Model<
  InferAttributes<SpecificationIssue>,
  InferCreationAttributes<SpecificationIssue>
> {
  declare id: CreationOptional<string>;
  declare programmeId: string;
  declare issue: number;
  declare note: string;
  declare specification: Specification;
  declare requirements: Requirement[];
  declare specificationHash: string;
  declare issuedBy: string;
  declare issuedAt: CreationOptional<Date>;
}

export function initSpecificationIssue(sequelize: Sequelize): void {
  SpecificationIssue.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      programmeId: { type: DataTypes.UUID, allowNull: false },
      issue: { type: DataTypes.INTEGER, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false },
      specification: { type: DataTypes.JSONB, allowNull: false },
      requirements: { type: DataTypes.JSONB, allowNull: false },
      specificationHash: { type: DataTypes.TEXT, allowNull: false },
      issuedBy: { type: DataTypes.UUID, allowNull: false },
      issuedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    {
      sequelize,
      modelName: 'SpecificationIssue',
      tableName: 'specification_issues',
      underscored: true,
      timestamps: false,
    },
  );
}
