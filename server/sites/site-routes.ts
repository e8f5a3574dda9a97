import { pageOf, searchQuery } from '../../shared/contracts/paging.ts';
import { namedSite, siteChange, storedSite } from '../../shared/contracts/site.ts';
import { route, type Route } from '../http/route.ts';
import type { Sites } from './sites.ts';

const all = { path: '/api/sites', access: 'member' } as const;
const one = { path: '/api/sites/:id', access: 'member' } as const;

export const siteRoutes = (
  sites: Pick<Sites, 'list' | 'get' | 'add' | 'change' | 'remove'>,
): Route[] => [
  route({
    ...all,
    method: 'get',
    summary: 'The sites of the workshop',
    query: searchQuery,
    answer: pageOf(storedSite),
    handle: ({ actor, query }) => sites.list(actor, query),
  }),
  route({
    ...all,
    method: 'post',
    summary: 'Keep a site',
    body: namedSite,
    status: 201,
    answer: storedSite,
    handle: ({ actor, body }) => sites.add(actor, body),
  }),
  route({
    ...one,
    method: 'get',
    summary: 'A site',
    answer: storedSite,
    handle: ({ actor, id }) => sites.get(actor, id()),
  }),
  route({
    ...one,
    method: 'put',
    summary: 'Change a site',
    body: siteChange,
    answer: storedSite,
    handle: ({ actor, id, body }) => sites.change(actor, id(), body),
  }),
  route({
    ...one,
    method: 'delete',
    summary: 'Delete a site; plans made for it keep a copy',
    status: 204,
    handle: ({ actor, id }) => sites.remove(actor, id()),
  }),
];
