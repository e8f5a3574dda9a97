import type { BreakthroughHoursAnswer } from '../../../../shared/contracts/breakthrough-hours';
import { hoursSentence, minutesOf } from './hours-words';

const heard = (levelDb: number) =>
  ({ ratioDb: 10, levelDb, grade: 'annoying', station: 1, dialHz: 612_000 }) as const;
const at = (hour: number) => `2026-12-21T${String(hour).padStart(2, '0')}:00:00.000Z`;
const day = (
  breakthrough: readonly (number | null)[],
  image: readonly (number | null)[],
  turns: Partial<BreakthroughHoursAnswer> = {},
): BreakthroughHoursAnswer => ({
  hours: breakthrough.map((level, hour) => ({
    at: at(hour),
    breakthrough: level === null ? null : heard(level),
    image: image[hour] == null ? null : heard(image[hour]),
  })),
  rises: [],
  falls: [],
  ...turns,
});
const words = (answer: BreakthroughHoursAnswer) => hoursSentence(answer, () => 'Alder');

describe('the hours in words', () => {
  it('say when breakthrough rises and falls, and when each is loudest', () => {
    const answer = day([30, 12, 41.2], [20, null, 25], { rises: [at(2)], falls: [at(1)] });

    expect(words(answer)).toBe(
      'Breakthrough has risen by 02:00 and has fallen by 01:00 UTC; it is loudest at 02:00, ' +
        'Alder with 41 dB(µV/m). The worst image is loudest at 02:00, Alder with 25 dB(µV/m).',
    );
  });

  it('say so when nothing changes, or nothing is heard', () => {
    expect(words(day([30, 30], [null, null]))).toBe(
      'Breakthrough is as strong at every hour: Alder with 30 dB(µV/m). ' +
        'No image is heard all day.',
    );
    expect(words(day([null], [null]))).toBe(
      'Neither breakthrough nor an image is heard at any hour of this day.',
    );
  });
});

describe('minutesOf', () => {
  it('counts from midnight UTC', () => {
    expect(minutesOf('2026-12-21T06:30:00.000Z')).toBe(390);
  });
});
