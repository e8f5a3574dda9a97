import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** A link to a plan: who made it and when, and who ended it. The row outlives link and plan. */
export class PlanShareModel extends Model<
  InferAttributes<PlanShareModel>,
  InferCreationAttributes<PlanShareModel>
> {
  declare id: CreationOptional<number>;
  declare planId: number | null;
  declare workshopId: number;
  declare tokenHash: string;
  declare sharedBy: number;
  declare sharedAt: Date;
  declare revokedBy: CreationOptional<number | null>;
  declare revokedAt: CreationOptional<Date | null>;

  static register(sequelize: Sequelize): void {
    PlanShareModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        planId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: true },
        workshopId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        tokenHash: { type: DataTypes.CHAR(43), allowNull: false },
        sharedBy: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        sharedAt: { type: DataTypes.DATE(3), allowNull: false },
        revokedBy: { type: DataTypes.INTEGER.UNSIGNED, allowNull: true },
        revokedAt: { type: DataTypes.DATE(3), allowNull: true },
      },
      { sequelize, tableName: 'plan_shares', timestamps: false },
    );
  }
}
