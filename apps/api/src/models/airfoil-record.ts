import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Airfoil, PolarData } from '@tipward/contract';

/** An airfoil with its polars; permanent. */
export class AirfoilRecord extends Model<
  InferAttributes<AirfoilRecord>,
  InferCreationAttributes<AirfoilRecord>
> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare thicknessPct: number;
  declare note: string;
  declare outline: Airfoil['outline'];
  declare polars: PolarData[];
  declare polarSetHash: string;
  declare addedBy: string;
  declare addedAt: CreationOptional<Date>;
}

export function initAirfoilRecord(sequelize: Sequelize): void {
  AirfoilRecord.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      thicknessPct: { type: DataTypes.DOUBLE, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false },
      outline: { type: DataTypes.JSONB, allowNull: false },
      polars: { type: DataTypes.JSONB, allowNull: false },
      polarSetHash: { type: DataTypes.TEXT, allowNull: false },
      addedBy: { type: DataTypes.UUID, allowNull: false },
      addedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'AirfoilRecord', tableName: 'airfoils', underscored: true, timestamps: false },
  );
}
