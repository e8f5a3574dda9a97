import type { UrlMatcher } from '@angular/router';

/** `:id/import` and `:id/import/:importId` are one page: the second goes on where the first ended. */
export const importMatcher: UrlMatcher = (segments) => {
  const [id, word, importId] = segments;
  if (id === undefined || word?.path !== 'import' || segments.length > 3) return null;
  return { consumed: segments, posParams: importId ? { id, importId } : { id } };
};
