import { analyse } from 'chardet';
import iconv from 'iconv-lite';

/** Languages of central Europe by what chardet calls the encoding it finds. */
const CENTRAL = new Set(['ISO-8859-2', 'windows-1250']);
const WESTERN = new Set(['ISO-8859-1', 'windows-1252', 'ISO-8859-15']);
/** Letters that central European text is made of, and those of western text. */
const CENTRAL_LETTERS = /[ąćęłńśźżčďěňřšťůžőűľĺŕăşţđ]/giu;
const WESTERN_LETTERS = /[àâãåæçèêëìîïðñòõøùûÿœ]/giu;

/**
 * Guesses the single-byte encoding of a text by the lines of it that are not plain ASCII. Only a
 * guess: people see by the sample whether it is right, and choose another.
 */
export function guessEncoding(evidence: Buffer): string {
  const isWindows = evidence.some((byte) => byte >= 0x80 && byte <= 0x9f);
  if (isCentral(evidence, isWindows)) return isWindows ? 'windows-1250' : centralOf(evidence);
  if (isWindows) return 'windows-1252';
  return isLatin9(evidence) ? 'ISO-8859-15' : 'windows-1252';
}

function isCentral(evidence: Buffer, isWindows: boolean): boolean {
  const known = analyse(evidence).find(({ name }) => CENTRAL.has(name) || WESTERN.has(name));
  const central = isWindows ? ['windows-1250'] : ['ISO-8859-2', 'windows-1250'];
  const score = Math.max(...central.map((encoding) => plausible(evidence, encoding, true)));
  const western = plausible(evidence, isWindows ? 'windows-1252' : 'ISO-8859-15', false);
  if (score !== western) return score > western;
  return known !== undefined && CENTRAL.has(known.name);
}

/** Of two encodings that differ in few letters, the one that reads more letters amid letters. */
const centralOf = (evidence: Buffer): string =>
  plausible(evidence, 'windows-1250', true) > plausible(evidence, 'ISO-8859-2', true)
    ? 'windows-1250'
    : 'ISO-8859-2';

/** The euro sign and the few letters by which ISO-8859-15 differs, where signs would make no sense. */
const isLatin9 = (evidence: Buffer): boolean =>
  /\p{L}[¦¨´¸¼½¾](?=\p{Ll})|(?<![\p{L}\d])[¦´¼](?=\p{Ll})|¤\s?\d|\d\s?¤/u.test(
    iconv.decode(evidence, 'ISO-8859-1'),
  );

/** Letters of the languages, less the signs that stand inside words. */
function plausible(evidence: Buffer, encoding: string, central: boolean): number {
  const text = iconv.decode(evidence, encoding);
  const fitting = text.match(central ? CENTRAL_LETTERS : WESTERN_LETTERS)?.length ?? 0;
  const odd = text.match(
    /\p{L}[^\p{L}\p{N}\p{P}\p{Z}\p{Cc}](?=\p{L})|\p{Ll}[\p{Lu}](?![\p{Lu}])/gu,
  );
  return fitting - 2 * (odd?.length ?? 0);
}
