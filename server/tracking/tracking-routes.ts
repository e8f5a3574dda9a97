import { trackingAnswer, trackingRequest } from '../../shared/contracts/tracking.ts';
import type { Engine } from '../computing/engine.ts';
import { sendComputed, whenClientLeaves } from '../http/computed-answer.ts';
import { route, type Route } from '../http/route.ts';

export const trackingRoutes = (engine: Pick<Engine, 'run'>): Route[] => [
  route({
    method: 'post',
    path: '/api/tracking',
    summary: 'Design the coils, trimmers and padder by which oscillator and signal circuits track',
    access: 'visitor',
    body: trackingRequest,
    answer: trackingAnswer,
    computing: true,
    faults: [429],
    handle: async ({ actor, body, response }) => {
      const signal = whenClientLeaves(response);
      sendComputed(
        response,
        await engine.run('designTracking', body, { signal, isVisitor: !actor }),
      );
    },
  }),
];
