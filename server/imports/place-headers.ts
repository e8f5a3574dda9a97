import words from '../../datasets/import-headers.json' with { type: 'json' };
import type { ImportField } from '../../shared/contracts/list-import.ts';
import type { Axis } from './cell-hemisphere.ts';
import { meaningsByWord, plainWords } from './plain-words.ts';

type Part = 'Degrees' | 'Minutes' | 'Seconds' | 'Hemisphere';

/** What a header tells of a coordinate split over columns: whose part, and which, as far as it says. */
interface PartHeader {
  readonly axis: Axis | null;
  readonly part: Part;
}

const AXES = ['latitude', 'longitude'] as const;
const PARTS = ['Degrees', 'Minutes', 'Seconds', 'Hemisphere'] as const;
const partsByWord = meaningsByWord(words.placeParts, (key) => PARTS.find((part) => part === key));
const axesByLetters = meaningsByWord(words.placeLetters, axisNamed);
const axesByWord = meaningsByWord(
  { latitude: words.fields.latitude, longitude: words.fields.longitude },
  axisNamed,
);
/** The signs of degrees, minutes and seconds at a header's end, which are no words. */
const SIGNS: readonly (readonly [RegExp, string])[] = [
  [/[([]?\s*[\u00b0\u00ba]\s*[)\]]?\s*$/, ' deg'],
  [/[([]?\s*(?:["\u201d\u2033]|''|\u2032\u2032)\s*[)\]]?\s*$/, ' sec'],
  [/[([]?\s*['\u2019\u2032]\s*[)\]]?\s*$/, ' min'],
];

function axisNamed(name: string): Axis {
  return name === 'latitude' ? 'latitude' : 'longitude';
}

/**
 * The columns of coordinates that are split over several, by their index: degrees, minutes, seconds
 * and the hemisphere's letter. None where a coordinate has but one column.
 */
export function placeColumns(headers: readonly string[]): ReadonlyMap<number, ImportField> {
  const found = new Map<number, ImportField>();
  const parts = withAxes(headers.map(partOf));
  const at = (axis: Axis, part: Part) =>
    parts.findIndex((each) => each?.axis === axis && each.part === part);
  // Minutes of one coordinate alone are of something else; beside whole degrees none are needed.
  const areSplit = AXES.every(
    (axis) =>
      at(axis, 'Minutes') >= 0 &&
      parts.filter((each) => each?.axis === axis && each.part === 'Degrees').length === 1,
  );
  for (const axis of AXES) {
    for (const part of areSplit ? PARTS : (['Hemisphere'] as const)) {
      const index = at(axis, part);
      if (index >= 0 && at(axis, 'Degrees') >= 0) found.set(index, `${axis}${part}`);
    }
  }
  return found;
}

function partOf(header: string): PartHeader | null {
  const sign = SIGNS.find(([pattern]) => pattern.test(header));
  const text = plainWords(sign ? header.replace(sign[0], sign[1]) : header);
  const lone = partsByWord.get(text);
  if (lone) return { axis: axesByLetters.get(text) ?? null, part: lone };
  const all = text.split(' ');
  for (let from = all.length - 1; from > 0; from--) {
    const [before, behind] = [all.slice(0, from).join(' '), all.slice(from).join(' ')];
    const [axis, part] = [axesByWord.get(before), partsByWord.get(behind)];
    if (axis && part) return { axis, part };
    const [other, lead] = [axesByWord.get(behind), partsByWord.get(before)];
    if (other && lead) return { axis: other, part: lead };
  }
  const axis = axesByWord.get(text);
  return axis ? { axis, part: 'Degrees' } : null;
}

/**
 * Parts that do not say whose they are belong to the coordinate before them; where none is named,
 * to the latitude the first time and to the longitude the second.
 */
function withAxes(parts: readonly (PartHeader | null)[]): (PartHeader | null)[] {
  const free: Axis[] = AXES.filter(
    (axis) => !parts.some((each) => each?.axis === axis && each.part === 'Degrees'),
  );
  let current: Axis | null = null;
  return parts.map((each, index) => {
    if (each?.axis !== null) {
      current = each?.axis ?? null;
      return each;
    }
    const begins = each.part === 'Degrees' && parts[index + 1]?.part === 'Minutes';
    if (begins) current = free.shift() ?? null;
    return current === null ? null : { axis: current, part: each.part };
  });
}
