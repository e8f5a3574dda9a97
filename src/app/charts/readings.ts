/** Numbers as charts, tables and sentences show them. */

const MINUS = '\u2212';

function fixed(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals);
  return value < 0 && Number(text) !== 0 ? MINUS + text : text;
}

/** A frequency in kilohertz without needless zeros: 554, 553.5, 818.333. */
export function kilohertz(hz: number): string {
  const [whole = '0', fraction = ''] = fixed(hz / 1000, 3).split('.');
  const kept = fraction.replace(/0+$/, '');
  return kept === '' ? whole : `${whole}.${kept}`;
}

const MEGAHERTZ_FROM = 3_000_000;

/** The unit in which a band that ends there is read, and how a frequency is written in it. */
export const bandUnit = (highHz: number) =>
  highHz < MEGAHERTZ_FROM
    ? { unit: $localize`kHz`, write: kilohertz }
    : { unit: $localize`MHz`, write: (hz: number) => kilohertz(hz / 1000) };

/** A level or ratio to a tenth of a decibel, without its unit. */
export const tenths = (db: number): string => fixed(db, 1);

/** A level or ratio in whole decibels, as sentences say it, without its unit. */
export const whole = (db: number): string => fixed(db, 0);

/** A level that may be missing, to a tenth of a decibel with its unit; a dash when missing. */
export const decibels = (db: number | null | undefined): string =>
  db === null || db === undefined ? '\u2013' : $localize`${tenths(db)}:value: dB`;

/** The same for a field strength. */
export const field = (db: number | null | undefined): string =>
  db === null || db === undefined ? '\u2013' : $localize`${tenths(db)}:value: dB(µV/m)`;

/** A change with its sign: +3.2 dB, −16.0 dB. */
export const change = (db: number): string =>
  $localize`${(db > 0 ? '+' : '') + tenths(db)}:value: dB`;

/** A fraction as a percentage with its sign. */
export const percent = (fraction: number): string =>
  `${fraction > 0 ? '+' : ''}${fixed(fraction * 100, 2)} %`;

/** A distance in kilometres, without its unit; a dash when missing. */
export const kilometres = (metres: number | null): string =>
  metres === null ? '\u2013' : fixed(metres / 1000, metres < 100_000 ? 1 : 0);

/** A distance in kilometres with its unit; a dash when missing. */
export const distance = (metres: number | null): string =>
  metres === null ? kilometres(null) : $localize`${kilometres(metres)}:value: km`;
