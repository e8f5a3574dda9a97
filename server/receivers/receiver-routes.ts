import { pageOf } from '../../shared/contracts/paging.ts';
import {
  newReceiver,
  receiverChange,
  receiverQuery,
  storedReceiver,
} from '../../shared/contracts/receiver.ts';
import { route, type Route } from '../http/route.ts';
import type { Receivers } from './receivers.ts';

const all = { path: '/api/receivers', access: 'member' } as const;
const one = { path: '/api/receivers/:id', access: 'member' } as const;

export const receiverRoutes = (
  receivers: Pick<Receivers, 'list' | 'get' | 'add' | 'change' | 'remove'>,
): Route[] => [
  route({
    ...all,
    method: 'get',
    summary: 'The receivers of the workshop',
    query: receiverQuery,
    answer: pageOf(storedReceiver),
    handle: ({ actor, query }) => receivers.list(actor, query),
  }),
  route({
    ...all,
    method: 'post',
    summary: 'Keep a receiver',
    body: newReceiver,
    status: 201,
    answer: storedReceiver,
    handle: ({ actor, body }) => receivers.add(actor, body),
  }),
  route({
    ...one,
    method: 'get',
    summary: 'A receiver',
    answer: storedReceiver,
    handle: ({ actor, id }) => receivers.get(actor, id()),
  }),
  route({
    ...one,
    method: 'put',
    summary: 'Change a receiver; a stale version is answered with the stored state',
    body: receiverChange,
    answer: storedReceiver,
    faults: [409],
    handle: ({ actor, id, body }) => receivers.change(actor, id(), body),
  }),
  route({
    ...one,
    method: 'delete',
    summary: 'Delete a receiver and its plans',
    status: 204,
    handle: ({ actor, id }) => receivers.remove(actor, id()),
  }),
];
