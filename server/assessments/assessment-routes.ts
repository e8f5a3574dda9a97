import { assessment, assessmentRequest } from '../../shared/contracts/assessment.ts';
import { candidatesAnswer, candidatesRequest } from '../../shared/contracts/candidates.ts';
import { route, type Route } from '../http/route.ts';
import type { Assessments } from './assessments.ts';

export const assessmentRoutes = (assessments: Assessments): Route[] => [
  route({
    method: 'post',
    path: '/api/assessments',
    summary: 'Judge a receiver at a site against stations, by day or by night',
    access: 'visitor',
    body: assessmentRequest,
    answer: assessment,
    computing: true,
    faults: [404, 429],
    handle: ({ actor, body }) => assessments.assess(actor, body),
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
    handle: ({ actor, body }) => assessments.judgeCandidates(actor, body),
  }),
];
