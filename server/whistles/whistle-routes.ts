import { whistlesAnswer, whistlesRequest } from '../../shared/contracts/whistles.ts';
import { sendComputed, whenClientLeaves } from '../http/computed-answer.ts';
import { route, type Route } from '../http/route.ts';
import type { Whistles } from './whistles.ts';

export const whistleRoutes = (whistles: Pick<Whistles, 'explain'>): Route[] => [
  route({
    method: 'post',
    path: '/api/whistles',
    summary: 'Find what may whistle at a dial setting, and how to prove it at the bench',
    access: 'visitor',
    body: whistlesRequest,
    answer: whistlesAnswer,
    computing: true,
    faults: [404, 429],
    handle: async ({ actor, body, response }) => {
      const signal = whenClientLeaves(response);
      sendComputed(response, await whistles.explain(actor, body, signal));
    },
  }),
];
