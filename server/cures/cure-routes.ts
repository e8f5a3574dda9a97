import { curesAnswer, curesRequest } from '../../shared/contracts/cures.ts';
import { sendComputed, whenClientLeaves } from '../http/computed-answer.ts';
import { route, type Route } from '../http/route.ts';
import type { Cures } from './cures.ts';

export const cureRoutes = (cures: Pick<Cures, 'find'>): Route[] => [
  route({
    method: 'post',
    path: '/api/cures',
    summary: 'Compare what can be done about unwanted responses: gain, cost, parts and cautions',
    access: 'visitor',
    body: curesRequest,
    answer: curesAnswer,
    computing: true,
    faults: [404, 429],
    handle: async ({ actor, body, response }) => {
      const signal = whenClientLeaves(response);
      sendComputed(response, await cures.find(actor, body, signal));
    },
  }),
];
