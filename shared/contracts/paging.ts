import * as z from 'zod';

/** Which page of a list is asked for; pages count from 1. */
export const pageQuery = z.strictObject({
  page: z.coerce.number().int().min(1).max(1_000_000).default(1),
  pageSize: z.coerce.number().int().min(1).max(500).default(50),
});
export type PageQuery = z.infer<typeof pageQuery>;

/** A page of those whose name contains a text, whatever its case. */
export const searchQuery = pageQuery.extend({
  search: z.string().trim().max(120, 'Give at most 120 characters.').default(''),
});
export type SearchQuery = z.infer<typeof searchQuery>;

/** A page of a list and the number of rows in all. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({ items: z.array(item), total: z.int().nonnegative() });

/** A page of a list and the number of rows in all. */
export interface Page<T> {
  readonly items: T[];
  readonly total: number;
}
