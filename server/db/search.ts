import { Op, type WhereOptions } from 'sequelize';

/** Rows whose name contains the text, whatever its case; all rows where none is asked for. */
export const nameContains = (text: string): WhereOptions =>
  text === '' ? {} : { name: { [Op.like]: `%${text.replace(/[\\%_]/g, '\\$&')}%` } };
