import { pictureText, standalonePicture } from './picture';

const words = {
  heading: 'Around the IF',
  description: 'Two stations & a < sign.',
  facts: [
    { label: 'Receiver', value: 'Fennimore' },
    { label: 'Site', value: 'Zelmere' },
  ],
};

function chart(): SVGSVGElement {
  const host = document.createElement('div');
  host.innerHTML = `<svg width="640" height="200" class="x" _ngcontent-a="">
    <g transform="translate(10,10)"><!-- c --><circle class="mark" style="fill: rgb(1, 2, 3)" cx="1" cy="2" r="3"></circle>
    <circle class="mark" cx="5" cy="2" r="3"></circle><text class="t">560 Alder</text></g></svg>`;
  document.body.append(host);
  return host.querySelector('svg') as SVGSVGElement;
}

describe('a chart as a picture of its own', () => {
  const saved = () => {
    const text = pictureText(standalonePicture(chart(), words));
    return new DOMParser().parseFromString(text, 'image/svg+xml');
  };

  it('parses alone and has every mark with its look', () => {
    const read = saved();

    expect(read.querySelector('parsererror')).toBeNull();
    expect(read.documentElement.namespaceURI).toBe('http://www.w3.org/2000/svg');
    expect(read.querySelectorAll('circle')).toHaveLength(2);
    expect(read.querySelector('circle')?.getAttribute('fill')).toBe('rgb(1, 2, 3)');
    expect(read.querySelector('[class], [style]')).toBeNull();
    expect(read.documentElement.getAttribute('font-family')).toContain('Fira Sans');
  });

  it('says to people and to programs what it rests on', () => {
    const read = saved();
    const texts = [...read.querySelectorAll('text')].map((each) => each.textContent);

    expect(texts).toContain('Around the IF');
    expect(texts).toContain('Receiver: Fennimore   Site: Zelmere');
    expect(read.querySelector('desc')?.textContent).toBe(words.description);
    const sources = [...read.getElementsByTagName('dc:source')].map((each) => each.textContent);
    expect(sources).toEqual(['Receiver: Fennimore', 'Site: Zelmere']);
  });
});
