import type { Drafts } from '../../../core/drafts';
import * as z from 'zod';

/** Unsaved fields, and the version of the receiver they were changed from. */
const unsaved = z.object({ version: z.int().nullable(), fields: z.unknown() });
export type UnsavedFields = z.infer<typeof unsaved>;

/** The draft of one receiver's set-up in this browser. */
export class ReceiverDraftKeeper {
  private readonly drafts: Drafts;
  private readonly name: string;

  constructor(drafts: Drafts, id: number | undefined) {
    this.drafts = drafts;
    this.name = `receiver.${id ?? 'new'}`;
  }

  read(): UnsavedFields | undefined {
    return unsaved.safeParse(this.drafts.read(this.name)).data;
  }

  write(draft: UnsavedFields): void {
    this.drafts.write(this.name, draft);
  }

  remove(): void {
    this.drafts.remove(this.name);
  }
}
