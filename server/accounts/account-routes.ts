import type { Request, Response } from 'express';

import { accountDraft, user, type User } from '../../shared/contracts/session.ts';
import type { Limits } from '../http/limits.ts';
import { route, type Route } from '../http/route.ts';
import type { Accounts } from './accounts.ts';

/** Begins a session for an account. */
interface Door {
  enter(accountId: number, request: Request, response: Response): Promise<User>;
}

export const accountRoutes = (
  accounts: Pick<Accounts, 'register'>,
  door: Door,
  limits: Pick<Limits, 'registering'>,
): Route[] => [
  route({
    method: 'post',
    path: '/api/accounts',
    summary: 'Make an account, with a workshop of its own, and sign in',
    access: 'visitor',
    body: accountDraft,
    status: 201,
    answer: user,
    faults: [409, 429],
    handle: async ({ body, request, response }) => {
      await limits.registering(request.ip ?? '');
      return door.enter(await accounts.register(body), request, response);
    },
  }),
];
