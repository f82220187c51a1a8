import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** One link of the audit chain; permanent. */
export class AuditEventRecord extends Model<
  InferAttributes<AuditEventRecord>,
  InferCreationAttributes<AuditEventRecord>
> {
  declare sequence: number;
  declare at: Date;
  declare actorId: CreationOptional<string | null>;
  declare action: string;
  declare subjectKind: string;
  declare subjectId: CreationOptional<string | null>;
  declare programmeId: CreationOptional<string | null>;
  declare detail: Record<string, unknown>;
  declare previousHash: string;
  declare hash: string;
}

export function initAuditEventRecord(sequelize: Sequelize): void {
  AuditEventRecord.init(
    {
      sequence: {
        type: DataTypes.BIGINT,
        primaryKey: true,
        allowNull: false,
        get(this: AuditEventRecord) {
          // PostgreSQL hands a bigint over as text.
          const text: unknown = this.getDataValue('sequence');
          return Number(text);
        },
      },
      at: { type: DataTypes.DATE(3), allowNull: false },
      actorId: { type: DataTypes.UUID },
      action: { type: DataTypes.TEXT, allowNull: false },
      subjectKind: { type: DataTypes.TEXT, allowNull: false },
      subjectId: { type: DataTypes.TEXT },
      programmeId: { type: DataTypes.UUID },
      detail: { type: DataTypes.JSONB, allowNull: false },
      previousHash: { type: DataTypes.TEXT, allowNull: false },
      hash: { type: DataTypes.TEXT, allowNull: false },
    },
    {
      sequelize,
      modelName: 'AuditEventRecord',
      tableName: 'audit_events',
      underscored: true,
      timestamps: false,
    },
  );
}
