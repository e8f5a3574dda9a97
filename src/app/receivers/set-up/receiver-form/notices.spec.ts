import { setTypes, typicalReceiver } from '../../../core/set-types';
import { receiverControls, type ReceiverFields } from './controls';
import { fieldsOf, writeFields } from './fields';
import { notices } from './notices';

const domestic = setTypes.find(({ id }) => id === 'domestic');
if (!domestic) throw new Error('There is no domestic set.');
const typical = typicalReceiver(domestic);

function noticesOn(change: (fields: ReceiverFields) => void) {
  const form = receiverControls();
  writeFields(form, fieldsOf(typical));
  const fields = form.getRawValue();
  change(fields);
  return notices(fields);
}
const textsOn = (change: (fields: ReceiverFields) => void) =>
  noticesOn(change).map(({ text }) => text);
const bandOf = ({ bands }: ReceiverFields, at: number) => {
  const band = bands[at];
  if (!band) throw new Error(`There is no band ${at}.`);
  return band;
};

describe('what stands out in a set-up', () => {
  it('is nothing in a typical set', () => {
    expect(noticesOn(() => undefined)).toEqual([]);
  });

  it('warns of an IF inside a band, by name', () => {
    const found = noticesOn((fields) => {
      fields.ifHz = 560_000;
    });

    expect(found).toEqual([
      { kind: 'warning', text: expect.stringContaining('inside Medium wave') as string },
    ]);
  });

  it('objects to an oscillator below that would reach zero, also beside an unfinished band', () => {
    const found = noticesOn((fields) => {
      bandOf(fields, 0).oscillator = 'below';
      bandOf(fields, 2).lowHz = null;
    });

    expect(found[0]?.kind).toBe('error');
    expect(found[0]?.text).toContain('Long wave: An oscillator below');
  });

  it('names the right band when one before it is unfinished', () => {
    const [text] = textsOn((fields) => {
      bandOf(fields, 0).lowHz = null;
      bandOf(fields, 1).highHz = 500_000;
    });

    expect(text).toContain('Medium wave: The band must end above');
  });

  it('doubts a shape factor that coils do not reach, unless a filter explains it', () => {
    const narrow = (fields: ReceiverFields) => {
      Object.assign(fields.selectivity, { b6Hz: 6000, b60Hz: 12_000 });
    };
    const filtered = (fields: ReceiverFields) => {
      narrow(fields);
      const filter = { fitted: true, centreHz: 455_000, widthHz: 6000 };
      Object.assign(fields.fixedFilter, filter);
    };

    expect(textsOn(narrow)[0]).toContain('shape factor of 2.0');
    expect(textsOn(filtered)).toEqual([]);
  });

  it.each([
    ['fixedFilter', { fitted: true, centreHz: 470_000, widthHz: 6000 }, 'does not pass the IF'],
    ['bfo', { fitted: true, centreHz: 470_000, rangeHz: 3000 }, 'does not reach the IF'],
    ['trap', { fitted: true, inductanceH: 1e-3, capacitanceF: 2e-10 }, 'resonates at 355.881'],
  ] as const)('sees a %s that stands elsewhere', (part, values, words) => {
    const [text] = textsOn((fields) => {
      Object.assign(fields[part], values);
    });

    expect(text).toContain(words);
  });
});
