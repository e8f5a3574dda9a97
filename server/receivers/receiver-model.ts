import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

import type { ReceiverDraft } from '../../shared/contracts/receiver.ts';

export class ReceiverModel extends Model<
  InferAttributes<ReceiverModel>,
  InferCreationAttributes<ReceiverModel>
> {
  declare id: CreationOptional<number>;
  declare workshopId: number;
  declare ownerId: number;
  /** Copies of what is searched and sorted by; the definition has them too. */
  declare name: string;
  declare ifHz: number;
  declare definition: ReceiverDraft;
  /** Counts changes, so that a stale one is noticed. */
  declare version: number;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static register(sequelize: Sequelize): void {
    ReceiverModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        workshopId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        ownerId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        name: { type: DataTypes.STRING(120), allowNull: false },
        ifHz: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        definition: { type: DataTypes.JSON, allowNull: false },
        version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        createdAt: { type: DataTypes.DATE(3), allowNull: false },
        updatedAt: { type: DataTypes.DATE(3), allowNull: false },
      },
      { sequelize, tableName: 'receivers' },
    );
  }
}
