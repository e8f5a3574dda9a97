import { planShare, sharedPlan } from '../../shared/contracts/plan.ts';
import type { Limits } from '../http/limits.ts';
import { route, type Route } from '../http/route.ts';
import type { Plans } from './plans.ts';

const share = '/api/receivers/:id/plans/:planId/share';

export const sharedPlanRoutes = (
  plans: Pick<Plans, 'share' | 'unshare' | 'readShared'>,
  limits: Pick<Limits, 'readingShared'>,
): Route[] => [
  route({
    method: 'post',
    path: share,
    summary: 'Make a link by which anyone can read a plan; the link before it ends',
    access: 'member',
    // Not 201: such answers are kept for repeats, and this one holds the secret.
    status: 200,
    answer: planShare,
    faults: [403, 404, 409],
    handle: ({ actor, id }) => plans.share(actor, id(), id('planId')),
  }),
  route({
    method: 'delete',
    path: share,
    summary: 'End the link to a plan',
    access: 'member',
    status: 204,
    faults: [403, 404],
    handle: ({ actor, id }) => plans.unshare(actor, id(), id('planId')),
  }),
  route({
    method: 'get',
    path: '/api/shared-plans/:token',
    summary: 'A plan, read by its link without signing in',
    access: 'visitor',
    answer: sharedPlan,
    faults: [404, 429],
    handle: async ({ request }) => {
      await limits.readingShared(request.ip ?? '');
      return plans.readShared(String(request.params['token']));
    },
  }),
];
