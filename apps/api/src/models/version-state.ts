import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { VersionState as State } from '@tipward/contract';

/** A view, read only: the state of each version, derived from its reviews and releases. */
export class VersionState extends Model<
  InferAttributes<VersionState>,
  InferCreationAttributes<VersionState>
> {
  declare versionId: string;
  declare programmeId: string;
  declare designId: string;
  declare authorId: string;
  declare reviewId: CreationOptional<string | null>;
  declare outcome: CreationOptional<string | null>;
  declare releaseId: CreationOptional<string | null>;
  declare letter: CreationOptional<string | null>;
  declare state: State;
}

export function initVersionState(sequelize: Sequelize): void {
  VersionState.init(
    {
      versionId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      programmeId: { type: DataTypes.UUID, allowNull: false },
      designId: { type: DataTypes.UUID, allowNull: false },
      authorId: { type: DataTypes.UUID, allowNull: false },
      reviewId: { type: DataTypes.UUID },
      outcome: { type: DataTypes.TEXT },
      releaseId: { type: DataTypes.UUID },
      letter: { type: DataTypes.TEXT },
      state: { type: DataTypes.TEXT, allowNull: false },
    },
    {
      sequelize,
      modelName: 'VersionState',
      tableName: 'version_states',
      underscored: true,
      timestamps: false,
    },
  );
}
