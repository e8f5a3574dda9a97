import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class IdempotencyKeyModel extends Model<
  InferAttributes<IdempotencyKeyModel>,
  InferCreationAttributes<IdempotencyKeyModel>
> {
  declare accountId: number;
  declare route: string;
  declare keyHash: string;
  declare bodyHash: string;
  declare answer: unknown;
  declare createdAt: CreationOptional<Date>;

  static register(sequelize: Sequelize): void {
    IdempotencyKeyModel.init(
      {
        accountId: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
        route: { type: DataTypes.STRING(120), primaryKey: true },
        keyHash: { type: DataTypes.CHAR(64), primaryKey: true },
        bodyHash: { type: DataTypes.CHAR(64), allowNull: false },
        answer: { type: DataTypes.JSON },
        createdAt: { type: DataTypes.DATE(3), allowNull: false },
      },
      { sequelize, tableName: 'idempotency_keys', updatedAt: false },
    );
  }
}
