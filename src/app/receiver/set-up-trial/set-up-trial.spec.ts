import { HttpErrorResponse, provideHttpClient, withInterceptors } from '@angular/common/http';
import { computed, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';

import { receiverDraft, storedReceiver } from '../../../../shared/contracts/receiver';
import { FakeServer, problemOf } from '../../core/fake-server';
import { ReceiverStore } from '../receiver-page/receiver-store';
import { applyChanges } from './changes';
import { ChangesAddress } from './changes-address';
import { SetUpTrial } from './set-up-trial';

const when = '2026-03-01T10:00:00.000Z';
const stored = storedReceiver.parse({
  ...{ id: 1, version: 1, ownerName: 'Ottil Marrow', editable: true },
  ...{ createdAt: when, updatedAt: when },
  name: 'Bench set',
  ifHz: 560_000,
  selectivity: { kind: 'widths', b6Hz: 3000, b60Hz: 12_000 },
  bands: [{ name: 'Range 4', lowHz: 600_000, highHz: 1_600_000, oscillator: 'above' }],
});
const PUT = 'PUT /api/receivers/1';

/** A receiver's page without the page: its address can be gone to. */
function arrange(server = new FakeServer()) {
  const address = signal<{ setUp?: string | undefined; ifHz?: number | undefined }>({});
  const receiver = signal(stored);
  const changes = () => TestBed.inject(ChangesAddress).read(address().setUp) ?? {};
  const store = {
    id: signal('1'),
    address,
    receiver: { value: receiver, reload: vi.fn() },
    trialReceiver: computed(() => {
      const { data } = receiverDraft.safeParse(applyChanges(trial.saved() ?? {}, changes()));
      return data;
    }),
    isTrialLost: signal(false),
    go: (change: object) => {
      address.update((now) => ({ ...now, ...change }));
      // The bar on the page reads it whenever the address changes.
      trial.canUndo();
      return Promise.resolve();
    },
  };
  TestBed.configureTestingModule({
    providers: [
      SetUpTrial,
      provideHttpClient(withInterceptors([server.intercept])),
      { provide: ReceiverStore, useValue: store },
    ],
  });
  const trial = TestBed.inject(SetUpTrial);
  trial.canUndo();
  const tryOut = (change: object) =>
    trial.change(receiverDraft.parse({ ...trial.onTrial(), ...change }));
  return { trial, store, address, tryOut };
}

describe('a set-up on trial', () => {
  it('differs from the saved one, and is undone and redone', async () => {
    const { trial, tryOut } = arrange();

    await tryOut({ ifRange: 0.1 });
    await tryOut({ strayDb: null });
    expect(trial.differences().map(({ field }) => field)).toContain('IF can be moved by');

    await trial.undo();
    expect(trial.onTrial()?.strayDb).not.toBeNull();
    expect(trial.onTrial()?.ifRange).toBe(0.1);
    await trial.undo();
    expect(trial.isChanged()).toBe(false);
    expect(trial.canUndo()).toBe(false);
    await trial.redo();
    expect(trial.onTrial()?.ifRange).toBe(0.1);
  });

  it('that is too long for an address is kept in the tab under a short key', async () => {
    const { trial, tryOut, address } = arrange();
    const band = stored.bands[0];
    const bands = Array.from({ length: 15 }, (_, at) => ({ ...band, name: `Range ${at}` }));

    await tryOut({ bands });

    expect(address().setUp).toMatch(/^~[\da-z]{4,20}$/);
    expect(trial.onTrial()?.bands).toHaveLength(15);
  });

  it('is taken over with one press, from the version it was tried on', async () => {
    const server = new FakeServer().on(PUT, () => ({ ...stored, version: 2, ifRange: 0.1 }));
    const { trial, tryOut, address, store } = arrange(server);
    await tryOut({ ifRange: 0.1 });

    await trial.takeOver();

    expect(server.sent(PUT)).toEqual([expect.objectContaining({ version: 1, ifRange: 0.1 })]);
    expect(store.receiver.reload).toHaveBeenCalled();
    expect(address().setUp).toBeUndefined();
  });

  it('stays on trial where somebody saved meanwhile, whose state is shown', async () => {
    const current = { ...stored, version: 2, name: 'Renamed' };
    const refused = problemOf(409, 'Somebody changed this receiver in the meantime.');
    const error = { ...(refused.error as object), current };
    const server = new FakeServer().on(PUT, () => new HttpErrorResponse({ status: 409, error }));
    const { trial, tryOut } = arrange(server);
    await tryOut({ ifRange: 0.1 });

    await trial.takeOver();

    expect(trial.conflict()?.name).toBe('Renamed');
    expect(trial.onTrial()?.ifRange).toBe(0.1);
    server.on(PUT, () => ({ ...stored, version: 3 }));
    await trial.takeOver(trial.conflict()?.version);
    expect(server.sent(PUT).at(-1)).toMatchObject({ version: 2, ifRange: 0.1 });
  });

  it('stays on trial when the server is away, and says so', async () => {
    const server = new FakeServer().on(PUT, () => new HttpErrorResponse({ status: 0 }));
    const { trial, tryOut } = arrange(server);
    await tryOut({ ifRange: 0.1 });

    await trial.takeOver();

    expect(trial.refusal()?.type).toBe('server-unreachable');
    expect(trial.isChanged()).toBe(true);
  });

  it('stays on trial in its address when the session has ended, to be taken over after sign-in', async () => {
    const server = new FakeServer().on(PUT, () => problemOf(401, 'Sign in again.'));
    const { trial, tryOut, address } = arrange(server);
    await tryOut({ ifRange: 0.1 });
    const kept = address().setUp;

    await trial.takeOver();
    expect(trial.refusal()?.title).toBe('Sign in again.');
    expect(address().setUp).toBe(kept);
    expect(trial.isBusy()).toBe(false);

    server.on(PUT, () => ({ ...stored, version: 2, ifRange: 0.1 }));
    await trial.takeOver();
    expect(trial.refusal()).toBeNull();
    expect(server.sent(PUT)).toHaveLength(2);
  });

  it('goes on from what the other has saved, with the same fields on trial', async () => {
    const current = { ...stored, version: 2, name: 'Renamed' };
    const refused = problemOf(409, 'Somebody changed this receiver in the meantime.');
    const error = { ...(refused.error as object), current };
    const server = new FakeServer().on(PUT, () => new HttpErrorResponse({ status: 409, error }));
    const { trial, tryOut, store } = arrange(server);
    await tryOut({ ifRange: 0.1 });
    await trial.takeOver();

    trial.goOnFromTheirs();
    store.receiver.value.set(storedReceiver.parse(current));

    expect(trial.conflict()).toBeNull();
    expect(trial.onTrial()).toMatchObject({ name: 'Renamed', ifRange: 0.1 });
  });
});
