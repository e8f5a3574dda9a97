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
  return { seen, asked: server.calls.length };
}

/** Stands for the browser's own: what the server tells is said by the spec. */
class FakeEvents {
  static readonly CLOSED = 2;
  static opened: FakeEvents[] = [];
  readyState = 1;
  onmessage?: (event: { data: string }) => void;
  onerror?: () => void;
  readonly url: string;

  constructor(url: string) {
    this.url = url;
    FakeEvents.opened.push(this);
  }

  close(): void {
    this.readyState = FakeEvents.CLOSED;
  }

  tell(state: unknown): void {
    this.onmessage?.({ data: JSON.stringify(state) });
  }

  /** @param isFinal Whether the browser will not try again by itself. */
  breakOff(isFinal: boolean): void {
    this.readyState = isFinal ? FakeEvents.CLOSED : 0;
    this.onerror?.();
  }
}

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

describe('watchImport where the browser takes events', () => {
  beforeEach(() => {
    FakeEvents.opened = [];
    vi.stubGlobal('EventSource', FakeEvents);
  });
  afterEach(() => vi.unstubAllGlobals());

  it('asks once and is told the rest, over a connection that was lost meanwhile', async () => {
    setTimeout(() => {
      const [events] = FakeEvents.opened;
      events?.tell(stateOf('committing', 0.5));
      events?.breakOff(false);
      events?.tell(stateOf('committing', 0.5));
      events?.tell(stateOf('committed', 1));
    }, 20);
    const { seen, asked } = await watched(stateOf('committing', 0.2));

    expect(seen).toEqual([
      'committing 0.2',
      'committing 0.5',
      'committing 0.5',
      'committed 1',
      'end',
    ]);
    expect(asked).toBe(1);
    expect(FakeEvents.opened.map(({ url, readyState }) => [url, readyState])).toEqual([
      [`${URL}/events`, FakeEvents.CLOSED],
    ]);
  });

  it('asks again and again where events are refused', async () => {
    setTimeout(() => FakeEvents.opened[0]?.breakOff(true), 20);
    const { seen } = await watched(
      stateOf('committing', 0.2),
      stateOf('committing', 0.8),
      stateOf('committed', 1),
    );

    expect(seen).toEqual(['committing 0.2', 'committing 0.8', 'committed 1', 'end']);
  });

  it('opens no events for an import that rests', async () => {
    await watched(stateOf('ready'));

    expect(FakeEvents.opened).toEqual([]);
  });
});

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
