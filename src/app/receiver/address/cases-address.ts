import type { StationSource } from '../trial/station-source';

/** A site with the list that is judged there. */
export interface PlaceAndList {
  readonly siteId: number;
  readonly source: StationSource;
}

/** The computing call takes ten cases; the page's own is one of them. */
export const MOST_OTHERS = 9;
const CASE = /^([1-9]\d{0,14})\.(?:e([1-9]\d{0,14})|a(-?\d{1,3}(?:\.\d{1,3})?))$/;

/** One case as text, equal for equal cases: "4.e7" is site 4 with edition 7, "5.a70" 70 dB assumed. */
export const caseKey = ({ siteId, source }: PlaceAndList): string =>
  source.kind === 'edition' ? `${siteId}.e${source.editionId}` : `${siteId}.a${source.fieldDb}`;

/** Null: there are none. */
export const casesText = (cases: readonly PlaceAndList[]): string | null =>
  cases.map(caseKey).join('_') || null;

/** Reads cases; what makes no sense is left out, and so is what is said twice. */
export function readCases(text: string | null): PlaceAndList[] {
  const said = [...new Set(text?.split('_') ?? [])];
  return said.flatMap((each) => readCase(each) ?? []).slice(0, MOST_OTHERS);
}

function readCase(text: string): PlaceAndList | undefined {
  const [, site, edition, field] = CASE.exec(text) ?? [];
  if (site === undefined) return undefined;
  const source: StationSource =
    edition === undefined
      ? { kind: 'every-channel', fieldDb: Number(field) }
      : { kind: 'edition', editionId: Number(edition) };
  return { siteId: Number(site), source };
}
