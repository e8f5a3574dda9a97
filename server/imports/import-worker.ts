/** Who checks and stores lists: a process of its own, or, in tests, the same one. */
export interface ImportWorker {
  /** Says that there is work, or soon will be. */
  wake(): void;
  /** Ends in good order; work that is not done waits for another. */
  stop(): Promise<void>;
}
