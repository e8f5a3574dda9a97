import {
  correction,
  correctionChange,
  correctionDraft,
  correctionQuery,
} from '../../shared/contracts/correction.ts';
import { pageOf } from '../../shared/contracts/paging.ts';
import { route, type Route } from '../http/route.ts';
import type { Corrections } from './corrections.ts';

const all = '/api/regions/:id/corrections';
const one = `${all}/:correctionId` as const;

export const correctionRoutes = (corrections: Corrections): Route[] => [
  route({
    method: 'get',
    path: all,
    summary: 'What people corrected of a region’s list by hand, the latest first',
    access: 'member',
    query: correctionQuery,
    answer: pageOf(correction),
    faults: [404],
    handle: ({ actor, id, query }) => corrections.list(actor, id(), query),
  }),
  route({
    method: 'post',
    path: all,
    summary:
      'Tick a station as off the air or heard; a librarian also adds and changes stations. No edition is touched',
    access: 'member',
    body: correctionDraft,
    status: 201,
    answer: correction,
    faults: [404, 409],
    handle: ({ actor, id, body }) => corrections.add(actor, id(), body),
  }),
  route({
    method: 'get',
    path: one,
    summary: 'A correction',
    access: 'member',
    answer: correction,
    faults: [404],
    handle: ({ actor, id }) => corrections.get(actor, id(), id('correctionId')),
  }),
  route({
    method: 'put',
    path: one,
    summary: 'Change a correction',
    access: 'member',
    body: correctionChange,
    answer: correction,
    faults: [404],
    handle: ({ actor, id, body }) => corrections.change(actor, id(), id('correctionId'), body),
  }),
  route({
    method: 'delete',
    path: one,
    summary: 'Take a correction back',
    access: 'member',
    status: 204,
    faults: [404],
    handle: ({ actor, id }) => corrections.remove(actor, id(), id('correctionId')),
  }),
];
