import type { JudgedResponse } from './strip-layout';

const words: Readonly<Record<NonNullable<JudgedResponse['grade']>, string>> = {
  imperceptible: $localize`imperceptible`,
  perceptible: $localize`perceptible`,
  'slightly-annoying': $localize`slightly annoying`,
  annoying: $localize`annoying`,
  'very-annoying': $localize`very annoying`,
  hidden: $localize`hidden`,
};

/** The grade of a response in words; what hides it is named. */
export function gradeWord({ grade, hidden }: Pick<JudgedResponse, 'grade' | 'hidden'>): string {
  if (hidden === 'noise') return $localize`hidden by noise`;
  if (hidden === 'band') return $localize`hidden by the band`;
  return grade === null ? $localize`not graded` : words[grade];
}
