import { Op } from 'sequelize';

/** Matches text that contains the wanted one, whatever its case; an empty one is in every text. */
export const containing = (wanted: string) => ({
  [Op.like]: `%${wanted.replace(/[\\%_]/g, '\\$&')}%`,
});
