import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** A station of an edition; written in bulk by the edition's writer, never changed. */
export class StationModel extends Model<
  InferAttributes<StationModel>,
  InferCreationAttributes<StationModel>
> {
  declare id: CreationOptional<number>;
  declare editionId: number;
  declare name: string;
  declare callSign: string;
  declare frequencyHz: number;
  declare latitude: number | null;
  declare longitude: number | null;
  declare powerDayW: number | null;
  declare powerNightW: number | null;
  /** 36 gains joined by commas. */
  declare patternDb: CreationOptional<string | null>;
  declare hours: string;
  declare note: string;
  /** Equal for the same station in another edition. */
  declare identity: string;
  /** Equal where nothing changed. */
  declare fingerprint: string;

  static register(sequelize: Sequelize): void {
    StationModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        editionId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        name: { type: DataTypes.STRING(200), allowNull: false },
        callSign: { type: DataTypes.STRING(40), allowNull: false },
        frequencyHz: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        latitude: { type: DataTypes.DOUBLE, allowNull: true },
        longitude: { type: DataTypes.DOUBLE, allowNull: true },
        powerDayW: { type: DataTypes.DOUBLE, allowNull: true },
        powerNightW: { type: DataTypes.DOUBLE, allowNull: true },
        patternDb: { type: DataTypes.STRING(300), allowNull: true },
        hours: { type: DataTypes.STRING(200), allowNull: false },
        note: { type: DataTypes.STRING(1000), allowNull: false },
        identity: { type: DataTypes.CHAR(22), allowNull: false },
        fingerprint: { type: DataTypes.CHAR(22), allowNull: false },
      },
      { sequelize, tableName: 'stations', timestamps: false },
    );
  }
}
