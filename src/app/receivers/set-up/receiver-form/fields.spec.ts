import { receiverDraft } from '../../../../../shared/contracts/receiver';
import { setTypes, typicalReceiver } from '../../../core/set-types';
import { receiverControls } from './controls';
import { fieldsOf, receiverOf, writeFields } from './fields';

const whole = receiverDraft.parse({
  name: 'Kestrel',
  ifHz: 470_000,
  selectivity: { kind: 'widths', b6Hz: 6000, b60Hz: 22_000 },
  strayDb: null,
  audioCornerHz: null,
  bfo: { centreHz: 470_000, rangeHz: 3000, pitchHz: 800 },
  trap: {
    kind: 'series',
    inductanceH: 1e-3,
    capacitanceF: 1.1e-10,
    q: 60,
    sourceOhms: 400,
    loadOhms: 1000,
  },
  fixedFilter: { kind: 'ceramic', centreHz: 470_000, widthHz: 6000 },
  aerial: { kind: 'loop' },
  bands: [
    {
      name: 'Medium wave',
      lowHz: 520_000,
      highHz: 1_610_000,
      oscillator: 'below',
      circuits: [],
      assumedWantedDb: 50,
      tracking: { gangMinF: 1e-11, gangMaxF: 4e-10, trimmer: 'gang', points: 'best' },
    },
    { name: 'Short wave', lowHz: 6e6, highHz: 18e6, oscillator: 'above' },
  ],
});

function throughTheForm(receiver: Parameters<typeof fieldsOf>[0]): unknown {
  const form = receiverControls();
  writeFields(form, fieldsOf(receiver));
  return receiverDraft.parse(receiverOf(form.getRawValue()));
}

describe('the fields of a set-up', () => {
  it('give back a receiver unchanged, also what has no field of its own', () => {
    expect(throughTheForm(whole)).toEqual(whole);
  });

  it.each(setTypes)('give back a typical "$name" unchanged', (type) => {
    const typical = typicalReceiver(type);

    expect(throughTheForm(typical)).toEqual(typical);
  });

  it('carry along a selectivity known in another way', () => {
    const selectivity = { kind: 'transformers', count: 2, q: 60, coupling: 1 } as const;

    expect(throughTheForm({ ...whole, selectivity })).toMatchObject({ selectivity });
  });

  it('come back from a draft as they were left, complete or not', () => {
    const form = receiverControls();
    form.patchValue({ name: 'Half', ifHz: null });
    const left: unknown = JSON.parse(JSON.stringify(form.getRawValue()));
    const again = receiverControls();

    expect(writeFields(again, left)).toBe(true);
    expect(again.getRawValue()).toEqual(form.getRawValue());
  });

  it.each([null, 'text', { bands: 3 }, { bands: [] }])('refuse a draft like %o', (draft) => {
    expect(writeFields(receiverControls(), draft)).toBe(false);
  });
});
