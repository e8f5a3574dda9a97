import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

import type { DatedRaster } from '../../shared/contracts/raster.ts';
import type { ItuRegion } from '../../shared/radio/site.ts';

export class RegionModel extends Model<
  InferAttributes<RegionModel>,
  InferCreationAttributes<RegionModel>
> {
  declare id: CreationOptional<number>;
  declare workshopId: number;
  declare name: string;
  declare ituRegion: ItuRegion;
  /** The earliest first. */
  declare rasters: DatedRaster[];

  static register(sequelize: Sequelize): void {
    RegionModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        workshopId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        name: { type: DataTypes.STRING(120), allowNull: false },
        ituRegion: { type: DataTypes.TINYINT.UNSIGNED, allowNull: false },
        rasters: { type: DataTypes.JSON, allowNull: false },
      },
      { sequelize, modelName: 'Region', tableName: 'regions' },
    );
  }
}
