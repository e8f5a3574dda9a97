import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';

import type { Role } from '../../shared/contracts/session.ts';

export class WorkshopModel extends Model<
  InferAttributes<WorkshopModel>,
  InferCreationAttributes<WorkshopModel>
> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare createdAt: CreationOptional<Date>;

  static register(sequelize: Sequelize): void {
    WorkshopModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        name: { type: DataTypes.STRING(160), allowNull: false },
        createdAt: { type: DataTypes.DATE(3), allowNull: false },
      },
      { sequelize, tableName: 'workshops' },
    );
  }
}

/** An account's place in a workshop. */
export class MembershipModel extends Model<
  InferAttributes<MembershipModel>,
  InferCreationAttributes<MembershipModel>
> {
  declare accountId: number;
  declare workshopId: number;
  declare role: Role;
  declare createdAt: CreationOptional<Date>;
  declare workshop?: NonAttribute<WorkshopModel>;

  static register(sequelize: Sequelize): void {
    MembershipModel.init(
      {
        accountId: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
        workshopId: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
        role: { type: DataTypes.ENUM('member', 'librarian', 'admin'), allowNull: false },
        createdAt: { type: DataTypes.DATE(3), allowNull: false },
      },
      { sequelize, tableName: 'memberships' },
    );
    MembershipModel.belongsTo(WorkshopModel, { as: 'workshop', foreignKey: 'workshopId' });
  }
}
