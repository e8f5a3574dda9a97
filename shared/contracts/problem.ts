import * as z from 'zod';

/** Body of every answer with status 400 or above; follows RFC 9457 (problem details). */
export const problem = z.object({
  /** Stable name that code may branch on, for example `receiver-not-found`. */
  type: z.string(),
  /** One sentence a user can act on. */
  title: z.string(),
  status: z.int(),
  /** Finds this occurrence in the server log. */
  instance: z.string(),
  /** Path of each rejected field and why. */
  issues: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
});
export type Problem = z.infer<typeof problem>;
