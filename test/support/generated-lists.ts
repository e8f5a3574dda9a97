import fc from 'fast-check';
import iconv from 'iconv-lite';

/** A station as a generated list tells it. */
export interface GeneratedStation {
  readonly name: string;
  readonly frequencyHz: number;
  readonly latitude: number;
  readonly longitude: number;
  readonly powerDayW: number;
  readonly powerNightW: number;
}

/** How a generated list is written. */
interface Style {
  readonly encoding: 'utf8' | 'utf16le' | 'windows-1250' | 'windows-1252';
  readonly marked: boolean;
  readonly delimiter: ',' | ';' | '\t' | '|';
  readonly mark: '.' | ',';
  readonly end: '\n' | '\r\n' | '\r';
  readonly titles: number;
  readonly unit: 'kHz' | 'MHz';
  readonly place: 'decimal' | 'letters' | 'signs' | 'parts' | 'beside' | 'together';
}

const PLACE_HEADERS: Readonly<Record<Style['place'], readonly string[]>> = {
  decimal: ['Latitude', 'Longitude'],
  letters: ['Latitude', 'Longitude'],
  signs: ['Latitude', 'Longitude'],
  parts: ['Lat Deg', 'Lat Min', 'Lat Sec', 'N/S', 'Lon Deg', 'Lon Min', 'Lon Sec', 'E/W'],
  beside: ['Latitude', 'N/S', 'Longitude', 'E/W'],
  together: ['Coordinates'],
};
const LETTERS = [
  'a',
  'b',
  'c',
  'd',
  'm',
  'n',
  'r',
  's',
  't',
  'z',
  ' ',
  "'",
  '"',
  ',',
  ';',
  '|',
  '\u00e4',
  '\u00f6',
  '\u00e9',
];

const station: fc.Arbitrary<GeneratedStation> = fc.record({
  name: fc
    .array(fc.constantFrom(...LETTERS), { minLength: 1, maxLength: 20 })
    .map((letters) => `S${letters.join('')}e`.replace(/ +/g, ' ')),
  frequencyHz: fc.integer({ min: 150, max: 1700 }).map((kilohertz) => kilohertz * 1000),
  latitude: degrees(90),
  longitude: degrees(180),
  powerDayW: fc.integer({ min: 0, max: 500 }).map((tenths) => tenths * 100),
  powerNightW: fc.integer({ min: 0, max: 500 }).map((tenths) => tenths * 100),
});

/** Whole minutes: what degrees and minutes can tell as well as decimals. */
function degrees(most: number): fc.Arbitrary<number> {
  return fc.integer({ min: -most * 60, max: most * 60 }).map((minutes) => minutes / 60);
}

const style: fc.Arbitrary<Style> = fc.record({
  encoding: fc.constantFrom('utf8', 'utf16le', 'windows-1250', 'windows-1252'),
  marked: fc.boolean(),
  delimiter: fc.constantFrom(',', ';', '\t', '|'),
  mark: fc.constantFrom('.', ','),
  end: fc.constantFrom('\n', '\r\n', '\r'),
  titles: fc.integer({ min: 0, max: 3 }),
  unit: fc.constantFrom('kHz', 'MHz'),
  place: fc.constantFrom('decimal', 'letters', 'signs', 'parts', 'beside', 'together'),
});

/** A list that says what its stations are, in any style. */
export const writtenList = fc
  .record({ stations: fc.array(station, { minLength: 2, maxLength: 30 }), style })
  .map((list) => ({ ...list, content: written(list.stations, list.style) }));

/** A list that something has happened to. */
export const spoiltList = fc
  .record({
    list: writtenList,
    cuts: fc.array(
      fc.tuple(fc.double({ min: 0, max: 1, noNaN: true }), fc.uint8Array({ maxLength: 6 })),
      {
        minLength: 1,
        maxLength: 5,
      },
    ),
    kept: fc.double({ min: 0.05, max: 1, noNaN: true }),
  })
  .map(({ list, cuts, kept }) => spoilt(list.content, cuts, kept));

function written(stations: readonly GeneratedStation[], style: Style): Buffer {
  const titles = Array.from({ length: style.titles }, (_, index) => `Title ${index}`);
  const headers = [
    'Station',
    `Frequency (${style.unit})`,
    ...PLACE_HEADERS[style.place],
    'Power day (kW)',
    'Power night (kW)',
  ];
  const rows = stations.map((each) => cellsOf(each, style));
  const lines = [headers, ...rows].map((cells) =>
    cells.map((cell) => quoted(cell, style.delimiter)).join(style.delimiter),
  );
  const text = [...titles, ...lines, ''].join(style.end);
  return iconv.encode(text, style.encoding, {
    addBOM: style.marked && style.encoding.startsWith('utf'),
  });
}

const cellsOf = (each: GeneratedStation, style: Style): string[] => [
  each.name,
  decimal(style.unit === 'kHz' ? each.frequencyHz / 1e3 : each.frequencyHz / 1e6, style),
  ...placeCells(each, style),
  decimal(each.powerDayW / 1e3, style),
  decimal(each.powerNightW / 1e3, style),
];

const decimal = (value: number, { mark }: Style): string => String(value).replace('.', mark);

function placeCells({ latitude, longitude }: GeneratedStation, style: Style): string[] {
  const cells = [angle(latitude, 'NS', style), angle(longitude, 'EW', style)];
  return style.place === 'together' ? [cells.flat().join(' ')] : cells.flat();
}

function angle(value: number, letters: string, style: Style): string[] {
  if (style.place === 'decimal') return [decimals(value, style)];
  const letter = letters.charAt(value < 0 ? 1 : 0);
  if (style.place === 'beside') return [decimals(Math.abs(value), style), letter];
  const minutes = Math.round(Math.abs(value) * 60);
  const [whole, rest] = [Math.floor(minutes / 60), minutes % 60];
  if (style.place === 'parts') return [String(whole), String(rest), '0', letter];
  if (style.place === 'letters') return [`${letter} ${whole} ${rest} 00`];
  return [`${whole}\u00b0${String(rest).padStart(2, '0')}'00"${letter}`];
}

const decimals = (value: number, { mark }: Style): string => value.toFixed(7).replace('.', mark);

const quoted = (cell: string, delimiter: string): string =>
  cell.includes(delimiter) || cell.includes('"') ? `"${cell.replaceAll('"', '""')}"` : cell;

function spoilt(
  content: Buffer,
  cuts: readonly (readonly [number, Uint8Array])[],
  kept: number,
): Buffer {
  let bytes = content.subarray(0, Math.ceil(content.length * kept));
  for (const [share, wedge] of cuts) {
    const at = Math.floor(share * bytes.length);
    bytes = Buffer.concat([bytes.subarray(0, at), wedge, bytes.subarray(at + wedge.length)]);
  }
  return bytes;
}
