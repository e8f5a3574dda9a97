import { beat } from './import-claims.ts';

const BEAT_MS = 500;

/** The worker has lost the job: the import was cancelled, or the worker was thought dead. */
export class JobLost extends Error {}

/** The worker is to stop; the job waits for another. */
export class WorkerStopped extends Error {}

/** How a worker says that it lives and how far it is, and learns that it is no longer wanted. */
export class Pulse {
  private readonly id: number;
  private readonly worker: string;
  private readonly isStopping: () => boolean;
  private next = 0;

  constructor(id: number, worker: string, isStopping: () => boolean) {
    this.id = id;
    this.worker = worker;
    this.isStopping = isStopping;
  }

  /**
   * @throws {JobLost} If the job is another's by now.
   * @throws {WorkerStopped} If the worker is to stop.
   */
  async beat(progress: number): Promise<void> {
    if (this.isStopping()) throw new WorkerStopped();
    if (performance.now() < this.next) return;
    this.next = performance.now() + BEAT_MS;
    // The last hundredth is the end of the job itself.
    if (!(await beat(this.id, this.worker, Math.min(0.99, progress)))) throw new JobLost();
  }
}
