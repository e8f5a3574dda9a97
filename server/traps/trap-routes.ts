import { trapAnswer, trapRequest } from '../../shared/contracts/trap.ts';
import { designTrap } from '../../shared/radio/circuits/trap-design.ts';
import { route, type Route } from '../http/route.ts';

/** A trap takes microseconds, so no thread is asked for it. */
export const trapRoutes = (): Route[] => [
  route({
    method: 'post',
    path: '/api/traps',
    summary: 'Design a wave trap: the missing part, preferred values and the loss at frequencies',
    access: 'visitor',
    body: trapRequest,
    answer: trapAnswer,
    computing: true,
    faults: [429],
    handle: ({ body }) => {
      const design = designTrap(body);
      return { ...design.parts, ...design };
    },
  }),
];
