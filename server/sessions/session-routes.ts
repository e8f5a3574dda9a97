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

const forAll = { path: '/api/session', access: 'visitor' } as const;
const signedIn = { path: '/api/session', access: 'member' } as const;

export const sessionRoutes = (
  sessions: Pick<Sessions, 'user' | 'change'>,
  door: Pick<SessionDoor, 'enter' | 'leave'>,
  accounts: Verifier,
  limits: Pick<Limits, 'whileSigningIn'>,
): Route[] => [
  route({
    ...forAll,
    method: 'post',
    summary: 'Sign in',
    body: credentials,
    answer: user,
    faults: [401, 429],
    handle: async ({ body, request, response }) => {
      const { id } = await limits.whileSigningIn(body.email, request.ip ?? '', () =>
        accounts.verify(body),
      );
      return door.enter(id, request, response);
    },
  }),
  route({
    ...signedIn,
    method: 'get',
    summary: 'Who is signed in, and in which workshop',
    answer: user,
    handle: ({ actor }) => sessions.user(actor),
  }),
  route({
    ...signedIn,
    method: 'put',
    summary: 'Go to another workshop of the account',
    body: sessionChange,
    answer: user,
    faults: [404],
    handle: ({ actor, body }) => sessions.change(actor, body.workshopId),
  }),
  route({
    ...forAll,
    method: 'delete',
    summary: 'Sign out',
    status: 204,
    handle: ({ request, response }) => door.leave(request, response),
  }),
];
