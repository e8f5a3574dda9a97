import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class AccountModel extends Model<
  InferAttributes<AccountModel>,
  InferCreationAttributes<AccountModel>
> {
  declare id: CreationOptional<number>;
  declare email: string;
  declare name: string;
  declare passwordHash: string;
  /** Where the next session begins. */
  declare workshopId: number;

  static register(sequelize: Sequelize): void {
    AccountModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        email: { type: DataTypes.STRING(254), allowNull: false, unique: 'accounts_email' },
        name: { type: DataTypes.STRING(120), allowNull: false },
        passwordHash: { type: DataTypes.CHAR(60), allowNull: false },
        workshopId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      },
      { sequelize, tableName: 'accounts' },
    );
  }
}
