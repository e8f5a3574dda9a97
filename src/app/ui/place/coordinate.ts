import type { Reading } from '../quantity/quantity';

export type Axis = 'latitude' | 'longitude';

const LETTERS: Readonly<Record<Axis, string>> = { latitude: 'NS', longitude: 'EW' };

/** Letters of a hemisphere in front or behind, a sign, and what lies between. */
const TYPED = /^(?:([NSEW])(?![a-z]))?\s*([+-])?\s*(.*?)\s*(?:(?<![a-z])([NSEW]))?$/isu;
/** Degrees, minutes and seconds apart by their marks, by colons or by spaces. */
const MARKS = /\s*(?:[°'′’"″”:\u0301]|''|′′)+\s*|\s+|(?<=\d)-(?=\d)/u;
/** "48d12m30s": the last letter means seconds, not the south. */
const LETTERED =
  /^([NSEW]?\s*[+-]?)(\d+)\s*d(?:eg)?\s*(?:([\d.,]+)\s*m(?:in)?\s*)?(?:([\d.,]+)\s*s(?:ec)?)?(?=\s*[NSEW]?$)/iu;

/**
 * Reads "48.2", "48,2 N", "S 33.9", "48° 12′ 30″ N", "48:12:30", "48 12.5 N" and "48d12m30s" as
 * degrees, north and east positive. Whether the figure lies on the globe is the schema's to say.
 */
export function parseCoordinate(text: string, axis: Axis): Reading {
  const plain = text.replaceAll('º', '°').normalize('NFKC').replaceAll('−', '-').trim();
  if (plain === '') return { value: null };
  const [, before, sign, body = '', after] = TYPED.exec(spellOut(plain)) ?? [];
  const letter = (before ?? after)?.toUpperCase();
  if (letter !== undefined && !LETTERS[axis].includes(letter)) return otherAxis(letter, axis);
  if (letter !== undefined && sign !== undefined) return { problem: signAndLetter(letter, axis) };
  if (before !== undefined && after !== undefined) return { problem: expected(axis) };

  const degrees = joinParts(body);
  if (degrees === null) return { problem: expected(axis) };
  const isNegative = sign === '-' || letter === 'S' || letter === 'W';
  return { value: isNegative && degrees !== 0 ? -degrees : degrees };
}

/** Writes degrees as people read them: "48.2°\u00a0N". */
export function formatCoordinate(degrees: number, axis: Axis): string {
  const shown = String(Number(Math.abs(degrees).toFixed(4)));
  return `${shown}°\u00a0${LETTERS[axis][degrees < 0 ? 1 : 0] ?? ''}`;
}

function spellOut(text: string): string {
  return text.replace(
    LETTERED,
    (_all, before: string, degrees: string, minutes?: string, seconds?: string) =>
      [before + degrees, minutes, seconds].filter((part) => part !== undefined).join(' '),
  );
}

/** Degrees, minutes and seconds as degrees; only the last part may be broken. */
function joinParts(body: string): number | null {
  const parts = body.split(MARKS).filter((part) => part !== '');
  if (parts.length === 0 || parts.length > 3) return null;
  if (!parts.every((part) => /^\d+(?:[.,]\d+)?$/u.test(part))) return null;
  const numbers = parts.map((part) => Number(part.replace(',', '.')));
  if (numbers.slice(0, -1).some((number) => !Number.isInteger(number))) return null;
  const [degrees = 0, minutes = 0, seconds = 0] = numbers;
  if (minutes >= 60 || seconds >= 60) return null;
  return Number((degrees + minutes / 60 + seconds / 3600).toFixed(7));
}

function expected(axis: Axis): string {
  return axis === 'latitude'
    ? $localize`Give degrees such as 48.2 or 48° 12′ 30″ N, north positive.`
    : $localize`Give degrees such as 16.4 or 16° 24′ 0″ E, east positive.`;
}

function otherAxis(letter: string, axis: Axis): Reading {
  return {
    problem:
      axis === 'latitude'
        ? $localize`A latitude is N or S; ${letter}:letter: belongs to the longitude.`
        : $localize`A longitude is E or W; ${letter}:letter: belongs to the latitude.`,
  };
}

function signAndLetter(letter: string, axis: Axis): string {
  return axis === 'latitude'
    ? $localize`Give either a sign or ${letter}:letter:, not both: north is positive.`
    : $localize`Give either a sign or ${letter}:letter:, not both: east is positive.`;
}
