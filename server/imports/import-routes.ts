import {
  importCheck,
  importLayout,
  importMatching,
  importProposal,
  importState,
} from '../../shared/contracts/list-import.ts';
import { pageOf, pageQuery } from '../../shared/contracts/paging.ts';
import { sendCsv } from '../http/csv-answer.ts';
import { route, type Route } from '../http/route.ts';
import { sendEvents } from './import-events.ts';
import type { Imports } from './imports.ts';
import { rejectsName } from './list-rejects.ts';
import type { Uploads } from './uploads.ts';

const list = '/api/regions/:id/imports';
const one = `${list}/:importId` as const;

export const importRoutes = (imports: Imports, uploads: Uploads): Route[] => [
  route({
    method: 'get',
    path: list,
    summary: 'The imports of a region, the latest first, without their faults',
    access: 'member',
    query: pageQuery,
    answer: pageOf(importState),
    faults: [404],
    handle: ({ actor, id, query }) => imports.list(actor, id(), query),
  }),
  route({
    method: 'post',
    path: list,
    summary: 'Upload a list as CSV; answers how it is proposed to be read',
    access: 'librarian',
    upload: 'file',
    status: 201,
    answer: importProposal,
    faults: [404, 409, 413],
    handle: async ({ actor, id, request, response }) => {
      await imports.admit(actor, id());
      return imports.take(id(), await uploads.receive(request, response));
    },
  }),
  route({
    method: 'get',
    path: one,
    summary: 'How far an import is',
    access: 'member',
    answer: importState,
    faults: [404],
    handle: ({ actor, id }) => imports.state(actor, id(), id('importId')),
  }),
  route({
    method: 'get',
    path: `${one}/events`,
    summary: 'An import as server-sent events, as long as it is being checked or stored',
    access: 'member',
    produces: 'text/event-stream',
    faults: [404],
    handle: async ({ actor, id, response }) => {
      const importId = id('importId');
      const changes = await imports.changes(actor, id(), importId);
      await sendEvents(response, changes, () => imports.state(actor, id(), importId));
    },
  }),
  route({
    method: 'put',
    path: one,
    summary: 'Say how the list is to be read; answers what storing it would do',
    access: 'librarian',
    body: importMatching,
    answer: importCheck,
    faults: [404, 409],
    handle: ({ actor, id, body }) => imports.check(actor, id(), id('importId'), body),
  }),
  route({
    method: 'put',
    path: `${one}/reading`,
    summary: 'Choose encoding, delimiter or decimal mark; answers how the list is read then',
    access: 'librarian',
    body: importLayout,
    answer: importProposal,
    faults: [404, 409],
    handle: ({ actor, id, body }) => imports.layOut(actor, id(), id('importId'), body),
  }),
  route({
    method: 'post',
    path: `${one}/commit`,
    summary: 'Store the good rows as a new edition, all or none; goes on in the background',
    access: 'librarian',
    status: 202,
    answer: importState,
    faults: [404, 409],
    handle: ({ actor, id }) => imports.commit(actor, id(), id('importId')),
  }),
  route({
    method: 'get',
    path: `${one}/rejects`,
    summary: 'The rejected rows with their faults, to mend and import again',
    access: 'member',
    produces: 'text/csv',
    faults: [404, 409],
    handle: async ({ actor, id, response }) => {
      const { rows, delimiter } = await imports.rejects(actor, id(), id('importId'));
      await sendCsv(response, rejectsName(id('importId')), rows, delimiter);
    },
  }),
  route({
    method: 'delete',
    path: one,
    summary: 'Cancel an import, or undo it as a whole where it was committed',
    access: 'librarian',
    status: 204,
    faults: [404],
    handle: ({ actor, id }) => imports.remove(actor, id(), id('importId')),
  }),
];
