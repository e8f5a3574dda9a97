/** What a benchmark in the browser brings in beforehand, by the session of its page. */
import { setTimeout } from 'node:timers/promises';

import type { APIResponse, Page } from 'playwright-core';

async function token(page: Page): Promise<string> {
  const cookies = await page.context().cookies();
  return decodeURIComponent(cookies.find(({ name }) => name === 'XSRF-TOKEN')?.value ?? '');
}

async function body<T>(answer: APIResponse): Promise<T> {
  if (!answer.ok()) throw new Error(`${answer.url()}: ${await answer.text()}`);
  return (await answer.json()) as T;
}

async function send(page: Page, method: 'POST' | 'PUT', path: string, options: object) {
  const { origin } = new URL(page.url());
  const headers = { 'X-XSRF-TOKEN': await token(page), Origin: origin };
  return page.request.fetch(path, { method, headers, ...options });
}

/** Keeps a receiver in the workshop; a site there must be. Answers its id. */
export async function createReceiver(page: Page, receiver: object): Promise<number> {
  const { total } = await body<{ total: number }>(await page.request.get('/api/sites'));
  if (total === 0) {
    const place = { latitude: 47, longitude: 8, ground: 'average', noise: 'rural', ituRegion: 1 };
    await body(await send(page, 'POST', '/api/sites', { data: { name: 'Bench', ...place } }));
  }
  const answer = await send(page, 'POST', '/api/receivers', { data: receiver });
  return (await body<{ id: number }>(answer)).id;
}

/** Imports a list into a region of its own and answers the id of its edition. */
export async function bringList(page: Page, csv: string): Promise<number> {
  const region = await send(page, 'POST', '/api/regions', {
    data: { name: `Bench ${csv.length}`, ituRegion: 1 },
  });
  const { id } = await body<{ id: number }>(region);
  const file = { name: 'list.csv', mimeType: 'text/csv', buffer: Buffer.from(csv) };
  const sent = await send(page, 'POST', `/api/regions/${id}/imports`, { multipart: { file } });
  const path = `/api/regions/${id}/imports/${(await body<{ id: number }>(sent)).id}`;
  await body(await send(page, 'PUT', path, { data: { label: 'Bench' } }));
  await body(await send(page, 'POST', `${path}/commit`, {}));
  for (;;) {
    const { state, editionId } = await body<{ state: string; editionId: number | null }>(
      await page.request.get(path),
    );
    if (state === 'committed' && editionId !== null) return editionId;
    if (state !== 'committing' && state !== 'checking') throw new Error(`The import is ${state}.`);
    await setTimeout(200);
  }
}
