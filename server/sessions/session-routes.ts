import {
  credentials,
  type Credentials,
  sessionChange,
  user,
} from '../../shared/contracts/session.ts';
import type { Limits } from '../http/limits.ts';
import { route, type Route } from '../http/route.ts';
import type { SessionDoor } from './session-door.ts';
import type { Sessions } from './sessions.ts';

interface Verifier {
  verify(credentials: Credentials): Promise<{ id: number }>;
}

const path = '/api/session';

export const sessionRoutes = (
  sessions: Pick<Sessions, 'user' | 'change'>,
  door: Pick<SessionDoor, 'enter' | 'leave'>,
  accounts: Verifier,
  limits: Pick<Limits, 'signingIn' | 'signedIn'>,
): Route[] => [
  route({
    method: 'post',
    path,
    summary: 'Sign in',
    access: 'visitor',
    body: credentials,
    answer: user,
    faults: [401, 429],
    handle: async ({ body, request, response }) => {
      const address = request.ip ?? '';
      await limits.signingIn(body.email, address);
      const { id } = await accounts.verify(body);
      await limits.signedIn(body.email, address);
      return door.enter(id, request, response);
    },
  }),
  route({
    method: 'get',
    path,
    summary: 'Who is signed in, and in which workshop',
    access: 'member',
    answer: user,
    handle: ({ actor }) => sessions.user(actor),
  }),
  route({
    method: 'put',
    path,
    summary: 'Go to another workshop of the account',
    access: 'member',
    body: sessionChange,
    answer: user,
    faults: [404],
    handle: ({ actor, body }) => sessions.change(actor, body.workshopId),
  }),
  route({
    method: 'delete',
    path,
    summary: 'Sign out',
    access: 'visitor',
    status: 204,
    handle: ({ request, response }) => door.leave(request, response),
  }),
];
