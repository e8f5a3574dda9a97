import { assessment, assessmentRequest } from '../../shared/contracts/assessment.ts';
import {
  breakthroughHoursAnswer,
  breakthroughHoursRequest,
} from '../../shared/contracts/breakthrough-hours.ts';
import { candidatesAnswer, candidatesRequest } from '../../shared/contracts/candidates.ts';
import { sendComputed, whenClientLeaves } from '../http/computed-answer.ts';
import { route, type Route } from '../http/route.ts';
import type { Assessments } from './assessments.ts';

export const assessmentRoutes = (assessments: Assessments): Route[] => [
  route({
    method: 'post',
    path: '/api/assessments',
    summary: 'Judge a receiver at a site against stations, by day, by night or at a moment',
    access: 'visitor',
    body: assessmentRequest,
    answer: assessment,
    computing: true,
    faults: [404, 429],
    handle: async ({ actor, body, response }) => {
      const signal = whenClientLeaves(response);
      sendComputed(response, await assessments.assess(actor, body, signal));
    },
  }),
  route({
    method: 'post',
    path: '/api/breakthrough-hours',
    summary:
      'Worst breakthrough and image in every half-hour of a day (UTC); above 20000 stations every hour',
    access: 'visitor',
    body: breakthroughHoursRequest,
    answer: breakthroughHoursAnswer,
    computing: true,
    faults: [404, 429],
    handle: async ({ actor, body, response }) => {
      const signal = whenClientLeaves(response);
      sendComputed(response, await assessments.breakthroughHours(actor, body, signal));
    },
  }),
  route({
    method: 'post',
    path: '/api/if-candidates',
    summary: 'Judge intermediate frequencies and put them in order',
    access: 'visitor',
    body: candidatesRequest,
    answer: candidatesAnswer,
    computing: true,
    faults: [404, 429],
    handle: async ({ actor, body, response }) => {
      const signal = whenClientLeaves(response);
      sendComputed(response, await assessments.judgeCandidates(actor, body, signal));
    },
  }),
];
