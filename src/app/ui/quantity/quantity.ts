/** A kind of number people type. */
export interface Quantity {
  /** Unit shown beside the field and meant when none is typed; empty for a bare number. */
  readonly unit: string;
  /** Spellings of units and their size in the stored unit; looked up as typed, then lower case. */
  readonly factors: Readonly<Record<string, number>>;
  /** Rounded to a whole number of the stored unit. */
  readonly whole?: boolean;
}

const hertz = {
  hz: 1,
  khz: 1e3,
  'kc/s': 1e3,
  kc: 1e3,
  k: 1e3,
  mhz: 1e6,
  'mc/s': 1e6,
  mc: 1e6,
  m: 1e6,
  ghz: 1e9,
};

/** What can be typed, by name. Stored are Hz, dB, F, H, W, ohms, metres, degrees, fractions and numbers. */
export const quantities = {
  frequency: { unit: 'kHz', factors: hertz, whole: true },
  tone: { unit: 'Hz', factors: hertz, whole: true },
  decibels: { unit: 'dB', factors: { db: 1 } },
  field: { unit: 'dB(μV/m)', factors: { 'db(μv/m)': 1, 'db(uv/m)': 1, 'dbμv/m': 1, db: 1 } },
  capacitance: { unit: 'pF', factors: { pf: 1e-12, nf: 1e-9, μf: 1e-6, uf: 1e-6 } },
  inductance: { unit: 'μH', factors: { nh: 1e-9, μh: 1e-6, uh: 1e-6, mh: 1e-3, h: 1 } },
  power: { unit: 'kW', factors: { w: 1, kw: 1e3, MW: 1e6 } },
  resistance: { unit: 'Ω', factors: { ω: 1, ohm: 1, ohms: 1, k: 1e3, kω: 1e3, kohm: 1e3 } },
  distance: { unit: 'km', factors: { m: 1, km: 1e3 } },
  degrees: { unit: '°', factors: { '°': 1, deg: 1 } },
  percent: { unit: '%', factors: { '%': 0.01 } },
  plain: { unit: '', factors: {} },
} as const satisfies Record<string, Quantity>;

export type QuantityName = keyof typeof quantities;

/** What a text means: a value in the stored unit (null: nothing typed), or why it has none. */
export type Reading = { readonly value: number | null } | { readonly problem: string };

const TYPED = /^([+-]?)(\d[\d ]*)?(?:[.,](\d*))?\s*([^\d\s.,+-].*)?$/u;

/** Reads "455", "455 kHz" and "0,455 MHz" alike: point or comma is the decimal mark. */
export function parseQuantity(text: string, name: QuantityName): Reading {
  const quantity: Quantity = quantities[name];
  const plain = text.normalize('NFKC').replace(/\s+/gu, ' ').replace('−', '-').trim();
  if (plain === '') return { value: null };

  const [, sign = '', whole = '', decimals = '', unit = ''] = TYPED.exec(plain) ?? [];
  if (whole === '' && decimals === '') return { problem: unreadable(quantity) };
  const factor = factorOf(quantity, unit);
  if (factor === undefined) return { problem: unknownUnit(quantity, unit) };

  const typed = Number(`${sign}${whole.replaceAll(' ', '')}.${decimals}0`);
  const value = Number((typed * factor).toPrecision(15));
  return { value: quantity.whole ? Math.round(value) : value };
}

/** Writes a stored value in the unit shown beside the field, without that unit. */
export function formatQuantity(value: number | null, name: QuantityName): string {
  if (value === null || !Number.isFinite(value)) return '';
  const shown = value / (factorOf(quantities[name], '') ?? 1);
  return String(Number(shown.toPrecision(12)));
}

function factorOf(quantity: Quantity, unit: string): number | undefined {
  const spelled = unit === '' ? quantity.unit : unit;
  if (spelled === '') return 1;
  return quantity.factors[spelled] ?? quantity.factors[spelled.toLowerCase()];
}

function unreadable({ unit }: Quantity): string {
  return unit === ''
    ? $localize`Give a number such as 12 or 12.5, with one decimal mark and no thousands mark.`
    : $localize`Give a number, with ${unit}:unit: or without, with one decimal mark and no thousands mark.`;
}

function unknownUnit({ unit }: Quantity, typed: string): string {
  return unit === ''
    ? $localize`Give a number without a unit: “${typed}:typed:” was not understood.`
    : $localize`The unit “${typed}:typed:” was not understood. Give ${unit}:unit:, or leave the unit out.`;
}
