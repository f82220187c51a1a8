import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Role } from '@tipward/contract';

/** The role of a person in a programme. */
export class Membership extends Model<InferAttributes<Membership>, InferCreationAttributes<Membership>> {
  declare programmeId: string;
  declare personId: string;
  declare role: Role;
  declare createdAt: CreationOptional<Date>;
}

export function initMembership(sequelize: Sequelize): void {
  Membership.init(
    {
      programmeId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      personId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      role: { type: DataTypes.TEXT, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'Membership', tableName: 'memberships', underscored: true, timestamps: false },
  );
}
