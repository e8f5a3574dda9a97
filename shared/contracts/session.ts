import * as z from 'zod';

import { lineText, resourceId } from './quantities.ts';

export const role = z.enum(['member', 'librarian', 'admin']);
export type Role = z.infer<typeof role>;

export const email = z
  .email('Give an e-mail address such as name@example.org.')
  .max(254, 'Give at most 254 characters.')
  .transform((value) => value.toLowerCase());

/** Characters as people count them: one outside the basic plane is two units of a string. */
const characters = (text: string): number => Array.from(text).length;

/** What registering takes. Every character of the password matters. */
export const accountDraft = z.strictObject({
  email,
  name: lineText('Give your name.')
    .min(1, 'Give your name.')
    .max(120, 'Give at most 120 characters.'),
  password: z
    .string('Give a password.')
    .refine(
      (text) => characters(text) >= 8,
      'Give a password of at least 8 characters; 12 or more are better.',
    )
    .refine((text) => characters(text) <= 256, 'Give a password of at most 256 characters.'),
});
export type AccountDraft = z.output<typeof accountDraft>;

export const credentials = z.strictObject({
  email,
  password: z
    .string('Give your password.')
    .min(1, 'Give your password.')
    .max(512, 'Give a password of at most 256 characters.'),
});
export type Credentials = z.output<typeof credentials>;

/** A workshop of an account, and the role it has there. */
const membership = z.object({ id: resourceId, name: z.string(), role });
export type Membership = z.infer<typeof membership>;

/** Who is signed in, and in which workshop. */
export const user = z.object({
  id: resourceId,
  email: z.string(),
  name: z.string(),
  /** The workshop the session works in. */
  workshop: membership,
  /** All workshops of this account. */
  workshops: z.array(membership),
});
export type User = z.infer<typeof user>;

/** Goes to another workshop of one's own. */
export const sessionChange = z.strictObject({ workshopId: resourceId });
export type SessionChange = z.infer<typeof sessionChange>;
