/** A face the page declares, and where its file is. */
interface Face {
  readonly weight: string;
  readonly range: string;
  readonly address: string;
}

const FAMILY = 'Fira Sans';

/**
 * The page's own faces as rules that carry their files, for a picture that is opened elsewhere.
 * Only faces that hold letters of the text are taken; one that cannot be had is left out.
 */
export async function embeddedFonts(text: string): Promise<string> {
  const needed = pageFaces().filter(({ range }) => holdsAny(range, text));
  const rules = await Promise.all(needed.map((face) => ruleOf(face).catch(() => '')));
  return rules.join('');
}

function pageFaces(): Face[] {
  return [...document.styleSheets].flatMap((sheet) =>
    [...sheet.cssRules]
      .filter((rule) => rule instanceof CSSFontFaceRule)
      .filter(({ style }) => style.getPropertyValue('font-family').includes(FAMILY))
      .flatMap(({ style }) => {
        const file = /url\("?([^")]+)"?\)/.exec(style.getPropertyValue('src'))?.[1];
        if (file === undefined) return [];
        return {
          weight: style.getPropertyValue('font-weight'),
          range: style.getPropertyValue('unicode-range'),
          address: new URL(file, sheet.href ?? document.baseURI).href,
        };
      }),
  );
}

/** Whether a `unicode-range` holds a letter of the text; the range of no rule holds all. */
export function holdsAny(range: string, text: string): boolean {
  if (range === '') return true;
  const spans = [...range.matchAll(/U\+([0-9A-F?]+)(?:-([0-9A-F]+))?/gi)].map(
    ([, low = '', high]) => [
      parseInt(low.replaceAll('?', '0'), 16),
      parseInt(high ?? low.replaceAll('?', 'F'), 16),
    ],
  );
  return [...new Set(text)].some((letter) => {
    const code = letter.codePointAt(0) ?? 0;
    return spans.some(([low = 0, high = 0]) => code >= low && code <= high);
  });
}

async function ruleOf({ weight, address }: Face): Promise<string> {
  const bytes = new Uint8Array(await (await fetch(address)).arrayBuffer());
  const letters = Array.from(bytes, (byte) => String.fromCharCode(byte)).join('');
  const source = `data:font/woff2;base64,${btoa(letters)}`;
  return `@font-face{font-family:'${FAMILY}';font-weight:${weight};src:url(${source})}`;
}
