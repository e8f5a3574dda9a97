import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class SessionModel extends Model<
  InferAttributes<SessionModel>,
  InferCreationAttributes<SessionModel>
> {
  declare id: string;
  declare accountId: number;
  declare workshopId: number;
  declare seenAt: Date;
  declare createdAt: CreationOptional<Date>;

  static register(sequelize: Sequelize): void {
    SessionModel.init(
      {
        id: { type: DataTypes.CHAR(36), primaryKey: true },
        accountId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        workshopId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        seenAt: { type: DataTypes.DATE(3), allowNull: false },
        createdAt: { type: DataTypes.DATE(3), allowNull: false },
      },
      { sequelize, tableName: 'sessions', updatedAt: false },
    );
  }
}
