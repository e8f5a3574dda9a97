import { pageOf, pageQuery } from '../../shared/contracts/paging.ts';
import { edition } from '../../shared/contracts/region.ts';
import { listedStation, stationQuery } from '../../shared/contracts/station-list.ts';
import { route, type Route } from '../http/route.ts';
import type { Editions } from './editions.ts';

export const editionRoutes = (editions: Editions): Route[] => [
  route({
    method: 'get',
    path: '/api/editions',
    summary: 'The editions of all regions of the workshop, the newest first',
    access: 'member',
    query: pageQuery,
    answer: pageOf(edition),
    handle: ({ actor, query }) => editions.list(actor, query),
  }),
  route({
    method: 'get',
    path: '/api/regions/:id/editions',
    summary: 'The editions of a region, the newest first',
    access: 'member',
    query: pageQuery,
    answer: pageOf(edition),
    faults: [404],
    handle: ({ actor, id, query }) => editions.listOf(actor, id(), query),
  }),
  route({
    method: 'get',
    path: '/api/editions/:id',
    summary: 'An edition',
    access: 'member',
    answer: edition,
    faults: [404],
    handle: ({ actor, id }) => editions.get(actor, id()),
  }),
  route({
    method: 'get',
    path: '/api/editions/:id/stations',
    summary:
      'The stations of an edition by frequency; search in name, call sign or frequency in kHz',
    access: 'member',
    query: stationQuery,
    answer: pageOf(listedStation),
    faults: [404],
    handle: ({ actor, id, query }) => editions.stations(actor, id(), query),
  }),
];
