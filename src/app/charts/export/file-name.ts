import type { OriginFact } from '../chart/chart-origin';

const MOST = 110;

const slug = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '');

/** A file name that says which chart of what it is: `around-the-if-fennimore-zelmere-night.svg`. */
export function fileName(heading: string, facts: readonly OriginFact[], ending: string): string {
  const words = [heading, ...facts.map(({ value }) => value)].map(slug).filter(Boolean);
  return `${words.join('-').slice(0, MOST).replace(/-+$/, '')}.${ending}`;
}
