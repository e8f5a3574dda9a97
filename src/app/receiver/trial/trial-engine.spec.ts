import { TestBed } from '@angular/core/testing';

import type { Assessment } from '../../../../shared/contracts/assessment';
import { receiverDraft } from '../../../../shared/contracts/receiver';
import { defaultRaster } from '../../../../shared/radio/channels/raster';
import { assessHeld, heldStations } from './held-assessment';
import { TRIAL_WORKER, TrialEngine, type TrialWorker } from './trial-engine';
import type { HeldList, TrialMessage, TrialReply } from './trial-messages';

const defaultReceiver = receiverDraft.parse({
  ifHz: 455_000,
  selectivity: { kind: 'widths', b6Hz: 6000, b60Hz: 22_000 },
  bands: [{ name: 'MW', lowHz: 550_000, highHz: 1_600_000, oscillator: 'above' }],
});
const fieldOf = (station: number, frequencyHz: number, fieldDb: number | null) => ({
  station,
  name: `Station ${station}`,
  frequencyHz,
  latitude: null,
  longitude: null,
  distanceM: 50_000,
  groundDb: fieldDb,
  skyDb: null,
  fieldDb,
  notes: [],
});
const heldList: HeldList = {
  site: {
    latitude: null,
    longitude: null,
    ground: null,
    noise: 'rural',
    indoors: false,
    noiseFloorDb: null,
    ituRegion: 1,
  },
  raster: defaultRaster(1),
  fields: [fieldOf(1, 455_000, 90), fieldOf(2, 1_503_000, 80), fieldOf(3, 603_000, null)],
};

/** A worker that answers when it is told to. */
class FakeWorker implements TrialWorker {
  readonly posted: TrialMessage[] = [];
  onmessage: ((event: MessageEvent<TrialReply>) => void) | null = null;
  onerror = null;

  postMessage(message: TrialMessage): void {
    this.posted.push(message);
  }

  reply(reply: TrialReply): void {
    this.onmessage?.(new MessageEvent('message', { data: reply }));
  }
}

const turn = () => new Promise((resolve) => setTimeout(resolve));
const question = (ifHz: number) => ({
  receiver: { ...defaultReceiver, ifHz },
  period: 'night' as const,
  limit: 10,
});
const judged = (usable: number): TrialReply => ({
  kind: 'judged',
  assessment: { verdict: { usable } } as Assessment,
});

function open() {
  const worker = new FakeWorker();
  TestBed.configureTestingModule({
    providers: [{ provide: TRIAL_WORKER, useValue: () => Promise.resolve(worker) }],
  });
  return { worker, engine: TestBed.inject(TrialEngine) };
}

describe('the engine beside the page', () => {
  it('is sent a list once, and of the questions that wait only the newest', async () => {
    const { worker, engine } = open();
    const answers: string[] = [];
    const ask = (name: string, ifHz: number) =>
      engine.assess(heldList, question(ifHz)).subscribe({
        next: ({ verdict }) => answers.push(`${name} ${verdict.usable}`),
      });
    const first = ask('first', 1000);
    ask('second', 2000);
    ask('third', 3000);
    await turn();
    first.unsubscribe();
    worker.reply(judged(1));
    await turn();
    worker.reply(judged(3));
    await turn();

    expect(worker.posted.map(({ kind }) => kind)).toEqual(['hold', 'assess', 'assess']);
    expect(answers).toEqual(['third 3']);
  });

  it('completes without an answer when it fails, and goes on', async () => {
    const { worker, engine } = open();
    let isComplete = false;
    engine.assess(heldList, question(1000)).subscribe({ complete: () => (isComplete = true) });
    await turn();
    worker.reply({ kind: 'failed', message: 'x' });

    expect(isComplete).toBe(true);
  });
});

describe('assessHeld', () => {
  it('judges from the fields alone', () => {
    const { bands, skipped } = assessHeld(heldList, heldStations(heldList), question(455_000));

    expect(bands).toHaveLength(1);
    expect(skipped.map(({ station }) => station)).toEqual([3]);
    expect(bands[0]?.responses[0]?.fieldDb).toBeGreaterThan(50);
  });
});
