import { pageOf, pageQuery } from '../../shared/contracts/paging.ts';
import { member, workshop } from '../../shared/contracts/workshop.ts';
import { route, type Route } from '../http/route.ts';
import type { Members } from './members.ts';
import type { Workshops } from './workshops.ts';

export const workshopRoutes = (
  workshops: Pick<Workshops, 'get'>,
  members: Pick<Members, 'list'>,
): Route[] => [
  route({
    method: 'get',
    path: '/api/workshop',
    summary: 'The workshop the session works in',
    access: 'member',
    answer: workshop,
    handle: ({ actor }) => workshops.get(actor),
  }),
  route({
    method: 'get',
    path: '/api/workshop/members',
    summary: 'The people of the workshop',
    access: 'member',
    query: pageQuery,
    answer: pageOf(member),
    handle: ({ actor, query }) => members.list(actor, query),
  }),
];
