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

  it.each([
    { kind: 'transformers', count: 2, q: 60, coupling: 1.2 },
    {
      kind: 'table',
      points: [0, 3000, 4500, 10_000].map((offsetHz) => ({
        offsetHz,
        rejectionDb: offsetHz / 200,
      })),
    },
  ] as const)('give back a selectivity by $kind', (selectivity) => {
    const receiver = receiverDraft.parse({ ...whole, selectivity });

    expect(throughTheForm(receiver)).toEqual(receiver);
  });

  it('give back tracking data in full', () => {
    const tracking = {
      ...{ gangMinF: 4e-11, gangMaxF: 4e-10, strayF: 5e-12, trimmer: 'coil' },
      ...{ points: [600e3, 1e6, 1.4e6], fixedPadderF: 4.4e-10, alignHz: [600e3, 1.4e6] },
    };
    const bands = [{ ...whole.bands[0], oscillator: 'above', tracking }];
    const receiver = receiverDraft.parse({ ...whole, bands });

    expect(throughTheForm(receiver)).toEqual(receiver);
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
