import { pageOf, pageQuery } from '../../shared/contracts/paging.ts';
import { suppliedRaster } from '../../shared/contracts/raster.ts';
import { region, regionDraft } from '../../shared/contracts/region.ts';
import { route, type Route } from '../http/route.ts';
import type { Regions } from './regions.ts';
import { suppliedRasters } from './supplied-rasters.ts';

const path = '/api/regions';

export const regionRoutes = (regions: Regions): Route[] => [
  route({
    method: 'get',
    path: '/api/rasters',
    summary: 'Rasters of the ITU Regions to begin with, each with its source',
    access: 'member',
    query: pageQuery,
    answer: pageOf(suppliedRaster),
    handle: ({ query }) => suppliedRasters(query),
  }),
  route({
    method: 'get',
    path,
    summary: 'The regions of the workshop',
    access: 'member',
    query: pageQuery,
    answer: pageOf(region),
    handle: ({ actor, query }) => regions.list(actor, query),
  }),
  route({
    method: 'post',
    path,
    summary: 'Add a region; without a raster it gets that of its ITU Region',
    access: 'librarian',
    body: regionDraft,
    status: 201,
    answer: region,
    handle: ({ actor, body }) => regions.add(actor, body),
  }),
  route({
    method: 'get',
    path: `${path}/:id`,
    summary: 'A region',
    access: 'member',
    answer: region,
    faults: [404],
    handle: ({ actor, id }) => regions.get(actor, id()),
  }),
  route({
    method: 'put',
    path: `${path}/:id`,
    summary:
      'Change name, ITU Region and rasters of a region; an edition is judged by the one of its date',
    access: 'librarian',
    body: regionDraft,
    answer: region,
    faults: [404, 409],
    handle: ({ actor, id, body }) => regions.change(actor, id(), body),
  }),
  route({
    method: 'delete',
    path: `${path}/:id`,
    summary: 'Remove a region with its editions; plans keep what they were judged against',
    access: 'librarian',
    status: 204,
    faults: [404, 409],
    handle: ({ actor, id }) => regions.remove(actor, id()),
  }),
];
