import { AsyncLocalStorage } from 'node:async_hooks';
import { randomUUID } from 'node:crypto';
import { setTimeout as wait } from 'node:timers/promises';

import { isDatabaseAway } from '../db/database-faults.ts';
import type { Logger } from '../logger.ts';
import { BadListError } from './bad-list-error.ts';
import { runCheck } from './check-job.ts';
import { failCheck, failCommit, giveBack, hasWaitingJobs, takeJob } from './import-claims.ts';
import type { ImportModel } from './import-model.ts';
import type { ImportWorker } from './import-worker.ts';
import { JobLost, Pulse, WorkerStopped } from './pulse.ts';
import { type ListWriter, runStore, type StoreTools } from './store-job.ts';

/** What the jobs need beside the table they wait in. */
export interface JobTools extends StoreTools {
  readonly editions: ListWriter & { clearSome(): Promise<boolean> };
  readonly uploads: StoreTools['uploads'] & {
    removeSpool(storedName: string): Promise<void>;
    remove(storedName: string): Promise<void>;
  };
}

/** A long list must not keep a short one waiting. */
const LANES = 2;
const DATABASE_PATIENCE_MS = 20_000;
const LOCKED_MS = 50;

/** Does what waits in the table of imports: checks and stores lists, clears undone editions. */
export class ImportJobs implements ImportWorker {
  private readonly tools: JobTools;
  private readonly log: Logger;
  private readonly onChange: (importId: number) => void;
  private readonly worker: string;
  /** Runs jobs outside the request that asked for them, and outside that request's transaction. */
  private readonly apart = AsyncLocalStorage.snapshot();
  private readonly lanes = new Set<Promise<void>>();
  private wakings = 0;
  private isStopping = false;

  constructor(
    tools: JobTools,
    log: Logger,
    onChange: (importId: number) => void,
    worker: string = randomUUID(),
  ) {
    this.tools = tools;
    this.log = log;
    this.onChange = onChange;
    this.worker = worker;
  }

  get isIdle(): boolean {
    return this.lanes.size === 0;
  }

  wake(): void {
    this.wakings += 1;
    if (this.isStopping || this.lanes.size >= LANES) return;
    const lane: Promise<void> = this.apart(() => this.work())
      .catch((error: unknown) => this.log.warn({ error }, 'import jobs cannot be looked for'))
      .finally(() => this.lanes.delete(lane));
    this.lanes.add(lane);
  }

  /** Gives back what is under way: another worker begins it anew. */
  async stop(): Promise<void> {
    this.isStopping = true;
    await Promise.all(this.lanes);
  }

  /** Goes on until nothing waits; who wakes it meanwhile is seen to. */
  private async work(): Promise<void> {
    for (let seen = -1; seen !== this.wakings && !this.isStopping;) {
      seen = this.wakings;
      let isMore = true;
      while (isMore) isMore = await this.next();
    }
  }

  /** Does one thing that waits; false when nothing does, or it is time to stop. */
  private async next(): Promise<boolean> {
    if (this.isStopping) return false;
    const job = await takeJob(this.tools.database, this.worker);
    if (!job) return (await this.isHeldBack()) || this.tools.editions.clearSome();
    this.onChange(job.id);
    await this.run(job);
    this.onChange(job.id);
    return true;
  }

  /** A job that could not be taken as somebody has its row locked for a moment is waited for. */
  private async isHeldBack(): Promise<boolean> {
    if (!(await hasWaitingJobs())) return false;
    await wait(LOCKED_MS);
    return true;
  }

  private async run(job: ImportModel): Promise<void> {
    const pulse = new Pulse(job.id, this.worker, () => this.isStopping);
    const { uploads } = this.tools;
    try {
      await (job.state === 'checking' ? runCheck : runStore)(this.tools, job, pulse);
      if (job.state === 'committing') await this.tidy(job);
    } catch (error) {
      if (error instanceof JobLost) await uploads.removeSpool(job.storedName);
      else await this.leave(job, error);
    }
  }

  /** The file of a stored list is kept only for its rejected rows. */
  private async tidy({ storedName, counts }: ImportModel): Promise<void> {
    const { uploads } = this.tools;
    if (counts?.rejected === 0) await uploads.remove(storedName);
    else await uploads.removeSpool(storedName);
  }

  /** Leaves a job unfinished; a database that is away is waited for, so that it can be told. */
  private async leave(job: ImportModel, error: unknown): Promise<void> {
    const patience = performance.now() + DATABASE_PATIENCE_MS;
    for (;;) {
      try {
        await this.end(job, error);
        return;
      } catch (away) {
        // The lease ends by itself then, and another worker takes the job.
        if (performance.now() > patience || !isDatabaseAway(away)) return;
        await wait(200);
      }
    }
  }

  private async end({ id, state }: ImportModel, error: unknown): Promise<void> {
    if (error instanceof WorkerStopped) await giveBack(id, this.worker, true);
    else if (isDatabaseAway(error)) await giveBack(id, this.worker, false);
    else {
      const fail = state === 'checking' ? failCheck : failCommit;
      await fail({ id, worker: this.worker }, this.reason(id, state, error));
    }
  }

  private reason(id: number, state: ImportModel['state'], error: unknown): string {
    if (error instanceof BadListError) return error.message;
    this.log.error({ error, importId: id }, 'import failed');
    return state === 'checking'
      ? 'The list could not be checked. Check it again.'
      : 'The list could not be stored, and nothing of it was. Commit it again.';
  }
}
