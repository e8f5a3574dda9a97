import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatDialog } from '@angular/material/dialog';
import { MatInputHarness } from '@angular/material/input/testing';

import { firstValueFrom, throwError } from 'rxjs';

import type { PlanInput } from '../../../../shared/contracts/plan';
import { problemOf } from '../../core/fake-server';
import { FormProblemsHarness } from '../../ui/form-problems/form-problems-harness';
import { keptPlan } from '../plans/plan-sample';
import { KeepPlan, type PlanToKeep } from './keep-plan';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

function open(keep: PlanToKeep['keep']) {
  TestBed.configureTestingModule({ providers: [provideHttpClient()] });
  const fixture = TestBed.createComponent(Page);
  const loader = TestbedHarnessEnvironment.documentRootLoader(fixture);
  const data: PlanToKeep = {
    suggestedName: '555 kHz at Shed',
    draftName: 'plan.1.4.555000',
    choice: { siteId: 4, editionId: 7, everyChannelDb: null, period: 'night', ifHz: 555_000 },
    keep,
  };
  const dialog = TestBed.inject(MatDialog).open(KeepPlan, { data });
  const box = (id: string) => loader.getHarness(MatInputHarness.with({ selector: `#${id}` }));
  const press = async (text: string) =>
    (await loader.getHarness(MatButtonHarness.with({ text }))).click();
  return { loader, dialog, box, press };
}

describe('keeping a plan', () => {
  afterEach(() => localStorage.clear());

  it('sends the choice with name and note', async () => {
    const sent: PlanInput[] = [];
    const { dialog, box, press } = open((draft) => {
      sent.push(draft);
      return Promise.resolve(keptPlan());
    });

    await (await box('note')).setValue('Retune the BFO.');
    await press('Keep the plan');

    expect(sent).toEqual([
      expect.objectContaining({ name: '555 kHz at Shed', note: 'Retune the BFO.', ifHz: 555_000 }),
    ]);
    expect(dialog.getState()).not.toBe(0);
  });

  it('keeps what is typed when the server refuses, and says why', async () => {
    const { loader, box, press } = open(() =>
      firstValueFrom(throwError(() => problemOf(503, 'Not ready yet.'))),
    );

    await (await box('note')).setValue('Retune the BFO.');
    await press('Keep the plan');

    const problems = await loader.getHarness(FormProblemsHarness);
    expect((await problems.title()) ?? (await problems.messages()).join()).toBeTruthy();
    expect(await (await box('note')).getValue()).toBe('Retune the BFO.');
  });

  it('asks for a name', async () => {
    const { loader, box, press } = open(() => Promise.reject(new Error('not asked for')));

    await (await box('name')).setValue('');
    await press('Keep the plan');

    const problems = await loader.getHarness(FormProblemsHarness);
    expect(await problems.messages()).toContain('Give a name.');
  });

  it('brings back what was typed when it is opened again', async () => {
    vi.useFakeTimers({ shouldAdvanceTime: true });
    const first = open(() => Promise.reject(new Error('not asked for')));
    await (await first.box('note')).setValue('Half a note');
    await vi.advanceTimersByTimeAsync(1000);
    first.dialog.close();
    TestBed.resetTestingModule();

    const second = open(() => Promise.reject(new Error('not asked for')));

    expect(await (await second.box('note')).getValue()).toBe('Half a note');
    vi.useRealTimers();
  });
});
