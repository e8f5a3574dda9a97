import {
  HttpClient,
  HttpErrorResponse,
  provideHttpClient,
  withInterceptors,
} from '@angular/common/http';
import { TestBed } from '@angular/core/testing';

import { FakeServer, problemOf } from '../../core/fake-server';
import { watchImport } from './watch-import';

const URL = '/api/regions/1/imports/7';

const stateOf = (state: string, progress = 0) => ({
  id: 7,
  state,
  progress,
  rows: null,
  faults: [],
  editionId: null,
  reason: null,
  label: null,
  date: null,
  proposal: {
    id: 7,
    fileName: 'vale.csv',
    encoding: 'UTF-8',
    delimiter: ',',
    decimalMark: '.',
    columns: [],
    sample: [],
    complete: true,
  },
});

/** What is seen until the watch ends, when the server answers so, one after the other. */
async function watched(...answers: unknown[]) {
  vi.useFakeTimers();
  const server = new FakeServer().on(`GET ${URL}`, () => answers.shift());
  TestBed.configureTestingModule({
    providers: [provideHttpClient(withInterceptors([server.intercept]))],
  });
  const seen: string[] = [];
  watchImport(TestBed.inject(HttpClient), URL).subscribe({
    next: ({ state, progress }) => seen.push(`${state} ${progress}`),
    error: (error: unknown) =>
      seen.push(error instanceof HttpErrorResponse ? `refused ${error.status}` : 'fault'),
    complete: () => seen.push('end'),
  });
  await vi.advanceTimersByTimeAsync(60_000);
  vi.useRealTimers();
  return { seen, asked: server.calls.length };
}

describe('watchImport', () => {
  it('asks once for an import that rests', async () => {
    const { seen, asked } = await watched(stateOf('ready'));

    expect(seen).toEqual(['ready 0', 'end']);
    expect(asked).toBe(1);
  });

  it('asks again while the import moves, until it rests', async () => {
    const { seen } = await watched(
      stateOf('committing', 0.2),
      stateOf('committing', 0.8),
      stateOf('committed', 1),
    );

    expect(seen).toEqual(['committing 0.2', 'committing 0.8', 'committed 1', 'end']);
  });

  it('outlasts a server that is away for a while', async () => {
    const { seen } = await watched(
      stateOf('committing', 0.2),
      problemOf(503, 'Soon back.'),
      problemOf(0, ''),
      stateOf('committed', 1),
    );

    expect(seen).toEqual(['committing 0.2', 'committed 1', 'end']);
  });

  it('ends with what the server refuses', async () => {
    const { seen } = await watched(problemOf(404, 'No import with id 7.'));

    expect(seen).toEqual(['refused 404']);
  });
});
