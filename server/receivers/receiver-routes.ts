import { pageOf } from '../../shared/contracts/paging.ts';
import {
  newReceiver,
  receiverChange,
  receiverQuery,
  storedReceiver,
} from '../../shared/contracts/receiver.ts';
import { route, type Route } from '../http/route.ts';
import type { Receivers } from './receivers.ts';

const all = '/api/receivers';
const one = '/api/receivers/:id';

export const receiverRoutes = (
  receivers: Pick<Receivers, 'list' | 'get' | 'add' | 'change' | 'remove'>,
): Route[] => [
  route({
    method: 'get',
    path: all,
    summary: 'The receivers of the workshop',
    access: 'member',
    query: receiverQuery,
    answer: pageOf(storedReceiver),
    handle: ({ actor, query }) => receivers.list(actor, query),
  }),
  route({
    method: 'post',
    path: all,
    summary: 'Keep a receiver',
    access: 'member',
    body: newReceiver,
    status: 201,
    answer: storedReceiver,
    handle: ({ actor, body }) => receivers.add(actor, body),
  }),
  route({
    method: 'get',
    path: one,
    summary: 'A receiver',
    access: 'member',
    answer: storedReceiver,
    faults: [404],
    handle: ({ actor, id }) => receivers.get(actor, id()),
  }),
  route({
    method: 'put',
    path: one,
    summary: 'Change a receiver; a stale version is answered with the stored state',
    access: 'member',
    body: receiverChange,
    answer: storedReceiver,
    faults: [403, 404, 409],
    handle: ({ actor, id, body }) => receivers.change(actor, id(), body),
  }),
  route({
    method: 'delete',
    path: one,
    summary: 'Delete a receiver and its plans',
    access: 'member',
    status: 204,
    faults: [403, 404],
    handle: ({ actor, id }) => receivers.remove(actor, id()),
  }),
];
