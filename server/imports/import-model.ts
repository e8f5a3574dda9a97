import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

import type { ImportCheck, ImportFault, ImportState } from '../../shared/contracts/list-import.ts';
import type { ListReading } from './list-reading.ts';

/** What a check found beside counts and faults. */
type Findings = Pick<ImportCheck, 'causes' | 'remarks'>;

export class ImportModel extends Model<
  InferAttributes<ImportModel>,
  InferCreationAttributes<ImportModel>
> {
  declare id: CreationOptional<number>;
  declare regionId: number;
  declare state: ImportState['state'];
  /** As the user calls the file, and as we do. */
  declare fileName: string;
  declare storedName: string;
  /** Equal for files with the same column headers. */
  declare headerKey: CreationOptional<string | null>;
  declare reading: ListReading;
  declare sample: string[][];
  declare label: CreationOptional<string | null>;
  declare date: CreationOptional<string | null>;
  declare counts: CreationOptional<ImportCheck['rows'] | null>;
  declare faults: CreationOptional<ImportFault[] | null>;
  declare findings: CreationOptional<Findings | null>;
  /** The edition the counts were made against. */
  declare baseEditionId: CreationOptional<number | null>;
  declare editionId: CreationOptional<number | null>;
  /** The region while committing; unique, so that a region takes one list at a time. */
  declare committingRegionId: CreationOptional<number | null>;
  /** Who checks or commits, and until when it counts as alive. */
  declare worker: CreationOptional<string | null>;
  declare leaseUntil: CreationOptional<Date | null>;
  /** How many workers have taken the job. */
  declare attempts: CreationOptional<number>;
  declare progress: number;
  declare reason: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static register(sequelize: Sequelize): void {
    ImportModel.init(
      {
        id: { type: DataTypes.INTEGER.UNSIGNED, autoIncrement: true, primaryKey: true },
        regionId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
        state: { type: DataTypes.STRING, allowNull: false },
        fileName: { type: DataTypes.STRING(255), allowNull: false },
        storedName: { type: DataTypes.CHAR(36), allowNull: false },
        headerKey: { type: DataTypes.CHAR(22), allowNull: true },
        reading: { type: DataTypes.JSON, allowNull: false },
        sample: { type: DataTypes.JSON, allowNull: false },
        label: { type: DataTypes.STRING(120), allowNull: true },
        date: { type: DataTypes.DATEONLY, allowNull: true },
        counts: { type: DataTypes.JSON, allowNull: true },
        faults: { type: DataTypes.JSON, allowNull: true },
        findings: { type: DataTypes.JSON, allowNull: true },
        baseEditionId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: true },
        editionId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: true },
        committingRegionId: { type: DataTypes.INTEGER.UNSIGNED, allowNull: true, unique: true },
        worker: { type: DataTypes.CHAR(36), allowNull: true },
        leaseUntil: { type: DataTypes.DATE(3), allowNull: true },
        attempts: { type: DataTypes.TINYINT.UNSIGNED, allowNull: false, defaultValue: 0 },
        progress: { type: DataTypes.DOUBLE, allowNull: false },
        reason: { type: DataTypes.STRING(500), allowNull: true },
        createdAt: { type: DataTypes.DATE(3), allowNull: false },
        updatedAt: { type: DataTypes.DATE(3), allowNull: false },
      },
      { sequelize, tableName: 'imports' },
    );
  }
}
