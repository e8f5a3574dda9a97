import { pageOf, pageQuery } from '../../shared/contracts/paging.ts';
import { plan, planDraft, wholePlan } from '../../shared/contracts/plan.ts';
import { route, type Route } from '../http/route.ts';
import type { Plans } from './plans.ts';

const all = '/api/receivers/:id/plans';
const one = `${all}/:planId` as const;

export const planRoutes = (plans: Pick<Plans, 'list' | 'get' | 'keep' | 'remove'>): Route[] => [
  route({
    method: 'get',
    path: all,
    summary: 'The plans kept for a receiver, the newest first',
    access: 'member',
    query: pageQuery,
    answer: pageOf(plan),
    faults: [404],
    handle: ({ actor, id, query }) => plans.list(actor, id(), query),
  }),
  route({
    method: 'post',
    path: all,
    summary: 'Judge a choice of IF and keep it with everything it was judged from',
    access: 'member',
    body: planDraft,
    status: 201,
    answer: wholePlan,
    computing: true,
    faults: [404, 429],
    handle: ({ actor, id, body }) => plans.keep(actor, id(), body),
  }),
  route({
    method: 'get',
    path: one,
    summary: 'A plan, as it was when kept, with all that was heard',
    access: 'member',
    answer: wholePlan,
    faults: [404],
    handle: ({ actor, id }) => plans.get(actor, id(), id('planId')),
  }),
  route({
    method: 'delete',
    path: one,
    summary: 'Delete a plan',
    access: 'member',
    status: 204,
    faults: [403, 404],
    handle: ({ actor, id }) => plans.remove(actor, id(), id('planId')),
  }),
];
