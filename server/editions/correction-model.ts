import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

import type {
  AddedStation,
  ChangedFields,
  CorrectionKind,
} from '../../shared/contracts/correction.ts';

/** A correction by hand to the list of a region. */
export class CorrectionModel extends Model<
  InferAttributes<CorrectionModel>,
  InferCreationAttributes<CorrectionModel>
> {
  declare id: CreationOptional<number>;
  declare regionId: number;
  /** Null once the account is gone. */
  declare authorId: number | null;
  declare kind: CorrectionKind;
  /** Of the station it is about; `+7`: the station that correction 7 added. */
  declare identity: string;
  /** The station as it was listed when it was corrected, or as it was added. */
  declare station: AddedStation;
  declare fields: ChangedFields | null;
  declare note: string;
  declare date: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static register(sequelize: Sequelize): void {
    CorrectionModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        regionId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        authorId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: true },
        kind: { type: DataTypes.STRING(10), allowNull: false },
        identity: { type: DataTypes.CHAR(22), allowNull: false },
        station: { type: DataTypes.JSON, allowNull: false },
        fields: { type: DataTypes.JSON, allowNull: true },
        note: { type: DataTypes.TEXT, allowNull: false },
        date: { type: DataTypes.DATEONLY, allowNull: false },
        createdAt: { type: DataTypes.DATE(3), allowNull: false },
        updatedAt: { type: DataTypes.DATE(3), allowNull: false },
      },
      { sequelize, tableName: 'corrections' },
    );
  }
}
