import { setTimeout as wait } from 'node:timers/promises';

import { ImportModel } from './import-model.ts';

/** As much of an import as shows that it has changed. */
export type Glance = Pick<ImportModel, 'id' | 'state' | 'progress' | 'updatedAt'>;

const EVERY_MS = 250;

/** Whether a worker is at an import, or will be. */
export const isMoving = ({ state }: Pick<ImportModel, 'state'>): boolean =>
  state === 'checking' || state === 'committing';

/**
 * Sees imports change, whichever process changes them: as long as somebody follows one, the table
 * is looked at a few times a second, once for all who follow.
 */
export class ImportWatch {
  private readonly followers = new Map<number, number>();
  private looking: Promise<ReadonlyMap<number, Glance>> | undefined;
  private hurry = new AbortController();

  /** Looks at once: something is known to have changed. */
  look(): void {
    this.hurry.abort();
  }

  /** The import whenever it has changed, beginning with how it is; ends when it is gone. */
  async *follow(id: number): AsyncGenerator<Glance> {
    this.followers.set(id, (this.followers.get(id) ?? 0) + 1);
    try {
      let seen = '';
      for (;;) {
        const glance = (await this.next()).get(id);
        if (!glance) return;
        const { state, progress, updatedAt } = glance;
        const mark = `${state} ${progress} ${updatedAt.getTime()}`;
        if (mark !== seen) yield glance;
        seen = mark;
      }
    } finally {
      const others = (this.followers.get(id) ?? 1) - 1;
      if (others === 0) this.followers.delete(id);
      else this.followers.set(id, others);
    }
  }

  /** Waits until no worker is at the import any more. */
  async settled(id: number): Promise<void> {
    for await (const glance of this.follow(id)) if (!isMoving(glance)) return;
  }

  private next(): Promise<ReadonlyMap<number, Glance>> {
    this.looking ??= this.lookSoon().finally(() => {
      this.looking = undefined;
    });
    return this.looking;
  }

  private async lookSoon(): Promise<ReadonlyMap<number, Glance>> {
    await wait(EVERY_MS, undefined, { signal: this.hurry.signal }).catch(() => undefined);
    this.hurry = new AbortController();
    const rows = await ImportModel.findAll({
      attributes: ['id', 'state', 'progress', 'updatedAt'],
      where: { id: [...this.followers.keys()] },
    });
    return new Map(rows.map((row) => [row.id, row]));
  }
}
