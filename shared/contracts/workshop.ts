import * as z from 'zod';

import { resourceId } from './quantities.ts';
import { role } from './session.ts';

/** The workshop the session works in. */
export const workshop = z.object({
  id: resourceId,
  name: z.string(),
  /** The caller's own role. */
  role,
  members: z.int().positive(),
  createdAt: z.iso.datetime(),
});
export type Workshop = z.infer<typeof workshop>;

/** A person of a workshop. */
export const member = z.object({
  id: resourceId,
  name: z.string(),
  role,
  since: z.iso.datetime(),
});
export type Member = z.infer<typeof member>;
