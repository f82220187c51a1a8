import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { manifestEntry } from '@tipward/contract';
import type { z } from 'zod';

export type ManifestEntry = z.infer<typeof manifestEntry>;

/** A released version with its package; permanent. The highest sequence of a programme is in force. Leave `package` out of lists. */
export class Release extends Model<InferAttributes<Release>, InferCreationAttributes<Release>> {
  declare id: CreationOptional<string>;
  declare programmeId: string;
  declare versionId: string;
  declare sequence: number;
  declare letter: string;
  declare effectivity: string;
  declare note: string;
  declare package: Buffer;
  declare packageSha256: string;
  declare packageBytes: number;
  declare manifest: ManifestEntry[];
  declare releasedBy: string;
  declare releasedAt: CreationOptional<Date>;
}

export function initRelease(sequelize: Sequelize): void {
  Release.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4, allowNull: false },
      programmeId: { type: DataTypes.UUID, allowNull: false },
      versionId: { type: DataTypes.UUID, allowNull: false },
      sequence: { type: DataTypes.INTEGER, allowNull: false },
      letter: { type: DataTypes.TEXT, allowNull: false },
      effectivity: { type: DataTypes.TEXT, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false },
      package: { type: DataTypes.BLOB, allowNull: false },
      packageSha256: { type: DataTypes.TEXT, allowNull: false },
      packageBytes: { type: DataTypes.INTEGER, allowNull: false },
      manifest: { type: DataTypes.JSONB, allowNull: false },
      releasedBy: { type: DataTypes.UUID, allowNull: false },
      releasedAt: { type: DataTypes.DATE(3), defaultValue: DataTypes.NOW, allowNull: false },
    },
    { sequelize, modelName: 'Release', tableName: 'releases', underscored: true, timestamps: false },
  );
}
