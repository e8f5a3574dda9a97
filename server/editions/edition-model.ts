import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class EditionModel extends Model<
  InferAttributes<EditionModel>,
  InferCreationAttributes<EditionModel>
> {
  declare id: CreationOptional<number>;
  /** In the database null once the edition was undone: only the writer, which clears it, meets that. */
  declare regionId: number;
  declare label: string;
  declare date: string;
  /** Name of the file it came from. */
  declare source: string;
  declare note: string;
  declare stations: number;
  declare createdAt: CreationOptional<Date>;

  static register(sequelize: Sequelize): void {
    EditionModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        regionId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: true },
        label: { type: DataTypes.STRING(120), allowNull: false },
        date: { type: DataTypes.DATEONLY, allowNull: false },
        source: { type: DataTypes.STRING(255), allowNull: false },
        note: { type: DataTypes.TEXT, allowNull: false },
        stations: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        createdAt: { type: DataTypes.DATE(3), allowNull: false },
      },
      { sequelize, tableName: 'editions' },
    );
  }
}
