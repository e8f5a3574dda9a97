import { trackingRequest } from '../../../../../shared/contracts/tracking';
import { schemaIssues, type FormIssue } from '../../../ui/form-problems/form-issues';
import type { ReceiverFields } from '../receiver-form/controls';
import { trackingOf } from '../receiver-form/tracking-controls';

/** What is asked of the server about a band. */
export const askedOf = (ifHz: number | null, band: ReceiverFields['bands'][number]): object => {
  const { lowHz, highHz, oscillator, tracking } = band;
  return { lowHz, highHz, ifHz, oscillator, ...trackingOf(tracking) };
};

const OF_BAND = new Set(['lowHz', 'highHz', 'oscillator']);

/** What is wrong with it, at the fields of the form that it comes from. */
export function issuesOf(asked: object, bandAt: number): FormIssue[] {
  const { error } = trackingRequest.safeParse(asked);
  return error ? schemaIssues(error).map((issue) => atField(issue, bandAt)) : [];
}

/** Where a part of the request stands in the form. */
export function atField({ path, message }: FormIssue, bandAt: number): FormIssue {
  if (path === 'ifHz') return { path, message };
  const within = OF_BAND.has(path) ? path : `tracking.${path}`;
  return { path: `bands.${bandAt}.${within}`, message };
}
