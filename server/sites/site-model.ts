import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

import type { NamedSite } from '../../shared/contracts/site.ts';

export class SiteModel extends Model<
  InferAttributes<SiteModel>,
  InferCreationAttributes<SiteModel>
> {
  declare id: CreationOptional<number>;
  declare workshopId: number;
  declare ownerId: number;
  declare name: string;
  declare latitude: number | null;
  declare longitude: number | null;
  declare ground: NamedSite['ground'];
  declare noise: NamedSite['noise'];
  declare indoors: boolean;
  declare noiseFloorDb: number | null;
  declare ituRegion: NamedSite['ituRegion'];

  static register(sequelize: Sequelize): void {
    SiteModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        workshopId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        ownerId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        name: { type: DataTypes.STRING(120), allowNull: false },
        latitude: DataTypes.DOUBLE,
        longitude: DataTypes.DOUBLE,
        ground: DataTypes.ENUM('sea', 'wet', 'average', 'dry', 'poor'),
        noise: DataTypes.ENUM('city', 'residential', 'rural', 'quiet'),
        indoors: { type: DataTypes.BOOLEAN, allowNull: false },
        noiseFloorDb: DataTypes.DOUBLE,
        ituRegion: { type: DataTypes.TINYINT.UNSIGNED, allowNull: false },
      },
      { sequelize, tableName: 'sites' },
    );
  }
}
