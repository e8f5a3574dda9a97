import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';

import { EditionWriter } from '../../server/editions/edition-writer.ts';
import { importState } from '../../shared/contracts/list-import.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { addRegion, cleanList, upload } from '../support/lists.ts';

let server: ApiServer;
let librarian: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  librarian = await server.newcomer();
});
afterAll(() => server.close());
afterEach(() => vi.restoreAllMocks());

const statesIn = (text: string) =>
  [...text.matchAll(/^data: (.*)$/gm)].map(([, json]) =>
    importState.parse(JSON.parse(json ?? 'null')),
  );

async function checked(rows: number): Promise<string> {
  const { path } = await upload(librarian, await addRegion(librarian), cleanList(rows));
  await librarian.put(path, { label: 'List' }).expect(200);
  return path;
}

describe('the events of an import', () => {
  it('tell its state at once and each change, and end when it rests', async () => {
    const path = await checked(9000);
    const { append } = EditionWriter.prototype;
    vi.spyOn(EditionWriter.prototype, 'append').mockImplementation(async function (
      this: EditionWriter,
      ...given
    ) {
      await append.apply(this, given);
      await new Promise((resolve) => setTimeout(resolve, 300));
    });
    await librarian.post(`${path}/commit`).expect(202);

    const { text, headers } = await librarian.get(`${path}/events`).expect(200);

    expect(headers['content-type']).toMatch(/^text\/event-stream/);
    expect(headers['cache-control']).toBe('no-store, no-transform');
    const states = statesIn(text);
    expect(states[0]?.state).toBe('committing');
    expect(states.at(-1)).toMatchObject({ state: 'committed', progress: 1 });
    const progress = states.map((each) => each.progress);
    expect(progress).toEqual([...progress].sort((a, b) => a - b));
    expect(progress.length).toBeGreaterThan(2);
  });

  it('are one where it rests, and none for a client that knows it already', async () => {
    const path = await checked(3);

    const { text } = await librarian.get(`${path}/events`).expect(200);
    const mark = /^id: (.*)$/m.exec(text)?.[1] ?? '';

    expect(statesIn(text).map(({ state }) => state)).toEqual(['ready']);
    await librarian.get(`${path}/events`).set('Last-Event-ID', mark).expect(204);
  });

  it('are not for another workshop, nor for a visitor', async () => {
    const path = await checked(3);

    await (await server.newcomer()).get(`${path}/events`).expect(404);
    await (await server.visitor()).get(`${path}/events`).expect(401);
  });
});
