import type { OriginFact } from '../chart/chart-origin';
import { captionLines } from './caption';

/** What is written into a picture that leaves the page. */
export interface PictureWords {
  readonly heading: string;
  readonly description: string;
  readonly facts: readonly OriginFact[];
}

/** A picture that needs nothing but itself. */
export interface Picture {
  readonly svg: SVGSVGElement;
  readonly width: number;
  readonly height: number;
}

const SVG = 'http://www.w3.org/2000/svg';
const RDF = 'http://www.w3.org/1999/02/22-rdf-syntax-ns#';
const DC = 'http://purl.org/dc/elements/1.1/';

const FONT = "'Fira Sans', system-ui, sans-serif";
const HEAD = 34;
const LINE = 18;
const SIZE = 12;
const EDGE = 12;

/** What a shape looks like, with the value it has when nothing is said. */
const LOOK: Readonly<Record<string, string>> = {
  fill: 'rgb(0, 0, 0)',
  'fill-opacity': '1',
  stroke: 'none',
  'stroke-width': '1px',
  'stroke-dasharray': 'none',
  'stroke-linecap': 'butt',
  'stroke-linejoin': 'miter',
  'stroke-opacity': '1',
  'paint-order': 'normal',
  'shape-rendering': 'auto',
  'font-size': '16px',
  'font-weight': '400',
  'text-anchor': 'start',
};

/**
 * A copy of a chart that opens alone: the look it has on the page is written into every element,
 * its name stands above it and what it rests on below, once to read and once as metadata.
 */
export function standalonePicture(chart: SVGSVGElement, words: PictureWords): Picture {
  const width = Number(chart.getAttribute('width'));
  const drawn = Number(chart.getAttribute('height'));
  const lines = captionLines(words.facts, width, SIZE);
  const height = HEAD + drawn + EDGE + lines.length * LINE + EDGE;
  const whole = { width: width + 2 * EDGE, height };
  const svg = element('svg', {
    width: whole.width,
    height,
    viewBox: `${-EDGE} 0 ${whole.width} ${height}`,
    'font-family': FONT,
  });
  svg.append(...spoken(words), metadata(words));
  const { ground, ink, quiet } = colours(chart);
  svg.append(element('rect', { x: -EDGE, ...whole, fill: ground }));
  svg.append(text(words.heading, { y: 22, 'font-size': 16, 'font-weight': 500, fill: ink }));
  const place = element('g', { transform: `translate(0,${HEAD})` });
  place.append(...plainCopy(chart).childNodes);
  svg.append(place);
  lines.forEach((line, at) => {
    const y = HEAD + drawn + EDGE + (at + 0.7) * LINE;
    svg.append(text(line, { y, 'font-size': SIZE, fill: quiet, 'xml:space': 'preserve' }));
  });
  return { svg: svg as SVGSVGElement, ...whole };
}

/** The picture as the text of a file. */
export const pictureText = ({ svg }: Picture): string =>
  `<?xml version="1.0" encoding="UTF-8"?>\n${new XMLSerializer().serializeToString(svg)}\n`;

function plainCopy(chart: SVGSVGElement): SVGSVGElement {
  const copy = chart.cloneNode(true) as SVGSVGElement;
  const originals = chart.querySelectorAll('*');
  [...copy.querySelectorAll('*')].forEach((each, at) => {
    const original = originals[at];
    if (original) writeLook(each, getComputedStyle(original));
    for (const { name } of [...each.attributes]) {
      if (name === 'class' || name === 'style' || name.startsWith('_ng'))
        each.removeAttribute(name);
    }
  });
  return copy;
}

function writeLook(shape: Element, style: CSSStyleDeclaration): void {
  const opacity = style.getPropertyValue('opacity');
  if (opacity !== '' && opacity !== '1') shape.setAttribute('opacity', opacity);
  if (shape.tagName === 'g') return;
  for (const [name, usual] of Object.entries(LOOK)) {
    const value = style.getPropertyValue(name);
    if (value === '' || value === usual) shape.removeAttribute(name);
    else shape.setAttribute(name, value);
  }
}

function colours(chart: Element): { ground: string; ink: string; quiet: string } {
  const ground = getComputedStyle(chart.ownerDocument.body).backgroundColor || 'white';
  const ink = getComputedStyle(chart).color || 'black';
  return { ground, ink, quiet: ink };
}

function spoken({ heading, description }: PictureWords): Element[] {
  const [title, sentence] = [element('title'), element('desc')];
  title.textContent = heading;
  sentence.textContent = description;
  return [title, sentence];
}

/** The same words as Dublin Core, for programs that keep pictures. */
function metadata({ heading, description, facts }: PictureWords): Element {
  const about = document.createElementNS(RDF, 'rdf:Description');
  about.setAttributeNS(RDF, 'rdf:about', '');
  const say = (name: string, value: string) => {
    const term = document.createElementNS(DC, `dc:${name}`);
    term.textContent = value;
    about.append(term);
  };
  say('title', heading);
  say('description', description);
  for (const { label, value } of facts) say('source', `${label}: ${value}`);
  const root = document.createElementNS(RDF, 'rdf:RDF');
  root.append(about);
  const holder = element('metadata');
  holder.append(root);
  return holder;
}

function element(
  name: string,
  attributes: Readonly<Record<string, string | number>> = {},
): Element {
  const made = document.createElementNS(SVG, name);
  for (const [key, value] of Object.entries(attributes)) made.setAttribute(key, String(value));
  return made;
}

function text(words: string, attributes: Readonly<Record<string, string | number>>): Element {
  const made = element('text', attributes);
  made.textContent = words;
  return made;
}
