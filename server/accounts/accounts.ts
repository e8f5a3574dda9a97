import { Op, type Sequelize, UniqueConstraintError } from 'sequelize';

import type { AccountDraft, Credentials, Role } from '../../shared/contracts/session.ts';
import { inTransaction } from '../db/transaction.ts';
import { ConflictError, InvalidError, UnauthenticatedError } from '../http/errors.ts';
import { AccountModel } from './account-model.ts';
import { isCommonPassword } from './common-passwords.ts';
import type { Passwords } from './passwords.ts';

/** What the accounts need of the workshops. */
interface WorkshopFounder {
  found(name: string): Promise<number>;
  admit(accountId: number, workshopId: number, role: Role): Promise<void>;
}

export interface Profile {
  readonly id: number;
  readonly email: string;
  readonly name: string;
  readonly workshopId: number;
}

/** Keeps the accounts of people. */
export class Accounts {
  private readonly database: Sequelize;
  private readonly passwords: Passwords;
  private readonly workshops: WorkshopFounder;

  constructor(database: Sequelize, passwords: Passwords, workshops: WorkshopFounder) {
    this.database = database;
    this.passwords = passwords;
    this.workshops = workshops;
    AccountModel.register(database);
  }

  /** Makes an account with a workshop of its own, of which it is the admin. */
  async register(draft: AccountDraft): Promise<number> {
    if (isCommonPassword(draft.password, [draft.email, draft.name])) {
      throw new InvalidError({
        path: 'password',
        message: 'This password is among the first to be guessed. Choose another.',
      });
    }
    const passwordHash = await this.passwords.hash(draft.password);
    try {
      return await inTransaction(this.database, () => this.store(draft, passwordHash));
    } catch (error) {
      if (!(error instanceof UniqueConstraintError)) throw error;
      throw new ConflictError(
        'An account cannot be made with this e-mail address. If it is yours, sign in instead.',
        'account-not-made',
      );
    }
  }

  /** The account these credentials belong to; tells nobody whether the e-mail or the password fails. */
  async verify({ email, password }: Credentials): Promise<Profile> {
    const account = await AccountModel.findOne({ where: { email } });
    const isRight = await this.passwords.verify(password, account?.passwordHash);
    if (!account || !isRight) {
      throw new UnauthenticatedError('E-mail and password do not belong together.');
    }
    return toProfile(account);
  }

  async profile(id: number): Promise<Profile> {
    const account = await AccountModel.findByPk(id);
    if (!account) throw new UnauthenticatedError();
    return toProfile(account);
  }

  async namesOf(ids: readonly number[]): Promise<ReadonlyMap<number, string>> {
    const rows = await AccountModel.findAll({
      attributes: ['id', 'name'],
      where: { id: { [Op.in]: [...new Set(ids)] } },
    });
    return new Map(rows.map(({ id, name }) => [id, name]));
  }

  /** Remembers where the next session begins. */
  async beginIn(id: number, workshopId: number): Promise<void> {
    await AccountModel.update({ workshopId }, { where: { id } });
  }

  async isEmpty(): Promise<boolean> {
    return (await AccountModel.findOne({ attributes: ['id'] })) === null;
  }

  private async store({ email, name }: AccountDraft, passwordHash: string): Promise<number> {
    const workshopId = await this.workshops.found(`Workshop of ${name}`);
    const { id } = await AccountModel.create({ email, name, passwordHash, workshopId });
    await this.workshops.admit(id, workshopId, 'admin');
    return id;
  }
}

const toProfile = ({ id, email, name, workshopId }: AccountModel): Profile => ({
  id,
  email,
  name,
  workshopId,
});
