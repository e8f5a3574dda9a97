import { assessmentRequest } from '../../../shared/contracts/assessment';
import { candidatesRequest } from '../../../shared/contracts/candidates';
import { fieldStrengthsRequest } from '../../../shared/contracts/field-strengths';
import { setTypes } from '../core/set-types';
import { assessmentQuestion, candidatesQuestion, fieldsQuestion, type Trial } from './trial';

const trials = setTypes.flatMap((type) =>
  [110_000, 455_000, 1_600_000, 10_700_000].map((ifHz): Trial => ({
    type,
    ifHz,
    ituRegion: 1,
    noise: 'city',
    period: 'night',
  })),
);

describe('a visitor’s questions', () => {
  it.each(trials)('about "$type.name" on $ifHz Hz are what the server accepts', (trial) => {
    const candidates = candidatesRequest.parse(candidatesQuestion(trial));

    expect(candidates.fromHz).toBeLessThan(trial.ifHz);
    expect(candidates.toHz).toBeGreaterThan(trial.ifHz);
    expect(candidates.fromHz % candidates.stepHz).toBe(0);
    expect(assessmentRequest.parse(assessmentQuestion(trial, 460_000)).receiver.ifHz).toBe(460_000);
    expect(fieldStrengthsRequest.parse(fieldsQuestion(trial)).everyChannelDb).toBe(70);
  });
});
