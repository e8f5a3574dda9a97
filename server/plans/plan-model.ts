import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

import type { Plan, WholePlan } from '../../shared/contracts/plan.ts';

/** What a plan keeps as it was, whatever becomes of receiver, site and edition. */
export type PlanSnapshot = Pick<
  Plan,
  | 'note'
  | 'period'
  | 'siteName'
  | 'site'
  | 'editionLabel'
  | 'everyChannelDb'
  | 'receiver'
  | 'results'
> &
  // Plans of old lack these.
  Partial<Pick<Plan, 'edition' | 'savedReceiver'>> & {
    readonly regionId?: number | null;
    /** Which stations computing took: it changes with corrections by hand. */
    readonly listVersion?: string;
  };

/** The stations a plan names and all that was heard; read only with a single plan. */
export type PlanWorking = Pick<WholePlan, 'stations' | 'judged'>;

export class PlanModel extends Model<
  InferAttributes<PlanModel>,
  InferCreationAttributes<PlanModel>
> {
  declare id: CreationOptional<number>;
  declare receiverId: number;
  declare ownerId: number;
  declare siteId: number | null;
  declare editionId: number | null;
  declare name: string;
  declare ifHz: number;
  declare snapshot: PlanSnapshot;
  /** Null: kept before plans held it. */
  declare working: CreationOptional<PlanWorking | null>;
  declare createdAt: CreationOptional<Date>;

  static register(sequelize: Sequelize): void {
    PlanModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        receiverId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        ownerId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        siteId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: true },
        editionId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: true },
        name: { type: DataTypes.STRING(120), allowNull: false },
        ifHz: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        snapshot: { type: DataTypes.JSON, allowNull: false },
        working: { type: DataTypes.JSON, allowNull: true },
        createdAt: { type: DataTypes.DATE(3), allowNull: false },
      },
      { sequelize, tableName: 'plans' },
    );
  }
}
