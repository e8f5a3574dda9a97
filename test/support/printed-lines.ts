/** The text of a printed page, line by line as it stands on paper. */
import { getDocumentProxy } from 'unpdf';

interface Piece {
  readonly str: string;
  readonly transform: readonly number[];
}

/** A text without its spaces: kerning cuts words into pieces, so a page's own cannot be trusted. */
export const closed = (text: string): string => text.replace(/\s+/g, '');

/** Pieces of text at one height make a line, from left to right. */
function linesOf(pieces: readonly Piece[]): string[] {
  const byHeight = new Map<number, Piece[]>();
  for (const piece of pieces) {
    const height = Math.round(piece.transform[5] ?? 0);
    const near = [height, height - 1, height + 1].find((each) => byHeight.has(each)) ?? height;
    byHeight.set(near, [...(byHeight.get(near) ?? []), piece]);
  }
  return [...byHeight]
    .sort(([a], [b]) => b - a)
    .map(([, line]) =>
      closed(
        line
          .sort((a, b) => (a.transform[4] ?? 0) - (b.transform[4] ?? 0))
          .map(({ str }) => str)
          .join(''),
      ),
    );
}

/** The lines of each page of a PDF, `closed`. A row that a page break cuts stands on no single line. */
export async function printedLines(pdf: Uint8Array): Promise<string[][]> {
  const document = await getDocumentProxy(new Uint8Array(pdf));
  const pages = Array.from({ length: document.numPages }, (_, at) => document.getPage(at + 1));
  return Promise.all(
    pages.map(async (page) => {
      const { items } = (await (await page).getTextContent()) as { items: readonly object[] };
      return linesOf(items.filter((item): item is Piece => 'str' in item));
    }),
  );
}
