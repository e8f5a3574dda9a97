import type { Service } from '../../../../shared/radio/receiver';
import type { JudgedResponse } from '../../charts/band-strip/strip-layout';

type Grade = NonNullable<JudgedResponse['grade']>;

const broadcast: Readonly<Record<Grade, string>> = {
  imperceptible: $localize`ratio of 40 dB or more: excellent in ITU-R BS.560-4`,
  perceptible: $localize`ratio of 30 to 40 dB: the protection ratio of GE75, from memory`,
  'slightly-annoying': $localize`ratio of 26 to 30 dB: Rio 1981 and 47 CFR 73.37`,
  annoying: $localize`ratio of 17 to 26 dB: least of HF planning, from memory`,
  'very-annoying': $localize`ratio under 17 dB: below every published criterion`,
  hidden: $localize`under the noise, or under what the band itself does in any set`,
};
const others: Readonly<Record<Grade, string>> = {
  imperceptible: $localize`margin of 14 dB or more`,
  perceptible: $localize`margin of 4 to 14 dB`,
  'slightly-annoying': $localize`margin of 0 to 4 dB`,
  annoying: $localize`margin of −9 to 0 dB`,
  'very-annoying': $localize`margin under −9 dB`,
  hidden: broadcast.hidden,
};

/** What a grade rests on; the words are those of ITU-R BS.1284, the match to figures is ours. */
export function gradeBasis(grade: JudgedResponse['grade'], service: Service): string {
  if (grade === null) return $localize`the level of this product is not computed`;
  return service === 'broadcast' ? broadcast[grade] : others[grade];
}
