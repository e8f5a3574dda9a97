import {
  fieldStrengthsAnswer,
  fieldStrengthsRequest,
} from '../../shared/contracts/field-strengths.ts';
import { sendComputed, whenClientLeaves } from '../http/computed-answer.ts';
import { route, type Route } from '../http/route.ts';
import type { FieldStrengths } from './field-strengths.ts';

export const fieldStrengthRoutes = (fieldStrengths: Pick<FieldStrengths, 'compute'>): Route[] => [
  route({
    method: 'post',
    path: '/api/field-strengths',
    summary: 'Field strength of each station at a site',
    access: 'visitor',
    body: fieldStrengthsRequest,
    answer: fieldStrengthsAnswer,
    computing: true,
    faults: [404, 429],
    handle: async ({ actor, body, response }) => {
      const signal = whenClientLeaves(response);
      sendComputed(response, await fieldStrengths.compute(actor, body, signal));
    },
  }),
];
