import {
  type FieldStrengthsAnswer,
  fieldStrengthsAnswer,
} from '../../../../shared/contracts/field-strengths';
import { ofOurServer, sampleOfFields } from './sampled-answer';

const field = {
  station: 1,
  name: 'Alder',
  frequencyHz: 549_000,
  latitude: null,
  longitude: null,
  distanceM: null,
  groundDb: null,
  skyDb: null,
  fieldDb: 61.2,
  notes: [],
};
const take = (answer: unknown) =>
  ofOurServer(fieldStrengthsAnswer, answer as FieldStrengthsAnswer, sampleOfFields);

describe('an answer of our own server', () => {
  it('is taken as it is when its first items are as the contract says', () => {
    const answer = { fields: [field, { ...field, station: 2 }] };

    expect(take(answer)).toBe(answer);
  });

  it('is refused when they are not', () => {
    expect(() => take({ fields: [{ ...field, fieldDb: 'loud' }] })).toThrow(/fieldDb/);
  });

  it('is taken when it is empty', () => {
    expect(take({ fields: [] })).toEqual({ fields: [] });
  });
});
