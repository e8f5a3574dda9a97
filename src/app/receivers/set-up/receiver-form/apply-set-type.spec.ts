import { setTypes } from '../../../core/set-types';
import { applyCircuits, applySetType } from './apply-set-type';
import { receiverControls } from './controls';

const typeOf = (wanted: string) => {
  const found = setTypes.find(({ id }) => id === wanted);
  if (!found) throw new Error(`There is no type of set "${wanted}".`);
  return found;
};
const communications = typeOf('communications');
const marine = typeOf('marine');

describe('the type of set', () => {
  it('fills in everything that is typical of it', () => {
    const form = receiverControls();

    applySetType(form, communications);

    const { ifHz, selectivity, bands, strayDb } = form.getRawValue();
    expect(ifHz).toBe(455_000);
    expect(selectivity).toMatchObject({ b6Hz: 6000, b60Hz: 22_000 });
    expect(strayDb).toMatchObject({ if: 75, image: 75 });
    expect(bands.map(({ name }) => name)).toEqual(communications.bands.map(({ name }) => name));
  });

  it('brings the loop of a portable along, and takes it away with the type', () => {
    const form = receiverControls();

    applySetType(form, typeOf('portable'));
    expect(form.getRawValue().aerial.kind).toBe('loop');

    applySetType(form, communications);
    expect(form.getRawValue().aerial.kind).toBe('plain');
  });

  it('leaves alone what the user has changed', () => {
    const form = receiverControls();
    applySetType(form, communications);
    form.controls.ifHz.setValue(560_000);
    form.controls.ifHz.markAsDirty();
    form.controls.bands.at(0).controls.lowHz.setValue(550_000);
    form.controls.bands.at(0).controls.lowHz.markAsDirty();

    applySetType(form, marine);

    expect(form.controls.ifHz.value).toBe(560_000);
    expect(form.controls.bands).toHaveLength(communications.bands.length);
    expect(form.controls.strayDb.value).toMatchObject({ if: 88 });
    expect(form.controls.bands.at(0).controls.circuits).toHaveLength(marine.circuits.length);
  });

  it('follows a band to other frequencies, unless its circuits are the user’s own', () => {
    const form = receiverControls();
    applySetType(form, communications);
    const [own, other] = form.controls.bands.controls;
    if (!own || !other) throw new Error('The type has too few bands.');
    own.controls.circuits.at(0).controls.qLow.setValue(33);
    own.controls.circuits.markAsDirty();
    for (const { controls } of [own, other]) {
      controls.lowHz.setValue(30_000_000);
      controls.highHz.setValue(40_000_000);
    }

    applyCircuits(form, communications);

    expect(own.controls.circuits.value[0]).toMatchObject({ qLow: 33 });
    expect(other.controls.circuits.value[0]).toEqual({ qLow: 40, qHigh: 40 });
  });
});
