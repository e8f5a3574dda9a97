import { pageOf, searchQuery } from '../../shared/contracts/paging.ts';
import { namedSite, siteChange, storedSite } from '../../shared/contracts/site.ts';
import { route, type Route } from '../http/route.ts';
import type { Sites } from './sites.ts';

const all = '/api/sites';
const one = '/api/sites/:id';

export const siteRoutes = (
  sites: Pick<Sites, 'list' | 'get' | 'add' | 'change' | 'remove'>,
): Route[] => [
  route({
    method: 'get',
    path: all,
    summary: 'The sites of the workshop',
    access: 'member',
    query: searchQuery,
    answer: pageOf(storedSite),
    handle: ({ actor, query }) => sites.list(actor, query),
  }),
  route({
    method: 'post',
    path: all,
    summary: 'Keep a site',
    access: 'member',
    body: namedSite,
    status: 201,
    answer: storedSite,
    handle: ({ actor, body }) => sites.add(actor, body),
  }),
  route({
    method: 'get',
    path: one,
    summary: 'A site',
    access: 'member',
    answer: storedSite,
    faults: [404],
    handle: ({ actor, id }) => sites.get(actor, id()),
  }),
  route({
    method: 'put',
    path: one,
    summary: 'Change a site',
    access: 'member',
    body: siteChange,
    answer: storedSite,
    faults: [403, 404],
    handle: ({ actor, id, body }) => sites.change(actor, id(), body),
  }),
  route({
    method: 'delete',
    path: one,
    summary: 'Delete a site; plans made for it keep a copy',
    access: 'member',
    status: 204,
    faults: [403, 404],
    handle: ({ actor, id }) => sites.remove(actor, id()),
  }),
];
