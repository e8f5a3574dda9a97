/** What is done with rows that are not rejected, where it does not go without saying. */
export const REMARKS = {
  title: 'Lines above the column headers were passed over.',
  aside: 'Comments and closing lines were passed over.',
  header: 'The column headers, said again, were passed over.',
  short: 'Rows shorter than the header: the cells that are missing were read as empty.',
  merged: 'Two rows of a station, one by day and one by night, were read as one.',
  dayOnly: 'Rows by day that have none by night: the station was taken as silent by night.',
  nightOnly: 'Rows by night that have none by day: the station was taken as silent by day.',
  critical: 'The power in critical hours is neither that by day nor by night and was left out.',
  patterns: 'The pattern by night differs from that by day: the one by day was taken.',
} as const;

export type RemarkKind = keyof typeof REMARKS;
