import type * as z from 'zod';

import type { Assessment } from '../../../../shared/contracts/assessment';
import type { FieldStrengthsAnswer } from '../../../../shared/contracts/field-strengths';

/**
 * An answer of the server that this client came from, checked by a sample. Checking megabytes whole
 * takes longer than a frame while a marker is dragged, and the server has made them by the same
 * contract; a sample still tells a server of another version.
 * @throws {ZodError} When the sample is not as the contract says.
 */
export function ofOurServer<A>(schema: z.ZodType<A>, answer: A, sample: (answer: A) => A): A {
  schema.parse(sample(answer));
  return answer;
}

const first = <T>(items: T[]): T[] => items.slice(0, 1);

/** Everything but the long lists, of which the first stands for all. */
export const sampleOfAssessment = (answer: Assessment): Assessment => ({
  ...answer,
  bands: answer.bands.map((band) => ({
    ...band,
    responses: first(band.responses),
    rejection: first(band.rejection),
    totals: first(band.totals),
  })),
});

export const sampleOfFields = ({ fields }: FieldStrengthsAnswer): FieldStrengthsAnswer => ({
  fields: first(fields),
});
