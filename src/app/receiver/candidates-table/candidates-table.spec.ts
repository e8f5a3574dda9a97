import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatSelectHarness } from '@angular/material/select/testing';
import { MatSortHarness } from '@angular/material/sort/testing';

import type { CandidateSort } from '../address/choice-view';
import { sampleCandidate } from '../choice-page/choice-sample';
import { CandidatesTable } from './candidates-table';

const candidates = Array.from({ length: 12 }, (_, at) =>
  sampleCandidate({ ifHz: 550_000 + at * 1000, deficitDb: (at * 7) % 12 }),
);

@Component({
  imports: [CandidatesTable],
  template: `
    <div [style.width.px]="width">
      <app-candidates-table
        [answer]="answer"
        [receiver]="{ bfo: null }"
        [period]="'night'"
        [trialHz]="trialHz()"
        [sort]="sort()"
        (sorted)="sort.set($event)"
        (taken)="trialHz.set($event)"
      />
    </div>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {
  static wide = true;
  readonly width = Page.wide ? 1200 : 390;
  readonly answer = { present: candidates[10] ?? never(), candidates, ranking: '550 kHz first.' };
  readonly trialHz = signal(561_000);
  readonly sort = signal<CandidateSort | null>(null);
}

function never(): never {
  throw new Error('There is no such candidate.');
}

function open(isWide: boolean) {
  const width = isWide ? 1200 : 390;
  vi.spyOn(HTMLElement.prototype, 'clientWidth', 'get').mockReturnValue(width);
  Page.wide = isWide;
  const fixture = TestBed.createComponent(Page);
  const host = fixture.nativeElement as HTMLElement;
  const ifs = () =>
    [...host.querySelectorAll('.take, summary strong')].map((each) =>
      Number.parseInt(each.textContent.trim(), 10),
    );
  return {
    page: fixture.componentInstance,
    loader: TestbedHarnessEnvironment.loader(fixture),
    ifs,
  };
}

describe('the table of candidates', () => {
  afterEach(() => vi.restoreAllMocks());

  it('shows the first of the ranking, and what is now and on trial wherever they stand', async () => {
    const { loader, ifs } = open(true);
    await loader.getHarness(MatSortHarness);

    expect(ifs()).toEqual([550, 551, 552, 553, 554, 555, 556, 557, 560, 561]);

    await (await loader.getHarness(MatButtonHarness.with({ text: /other 2 as well/ }))).click();
    expect(ifs()).toHaveLength(12);
  });

  it('is sorted by a column, and says by which to the page', async () => {
    const { page, loader, ifs } = open(true);
    const sort = await loader.getHarness(MatSortHarness);
    const [left] = await sort.getSortHeaders({ label: /Left to be desired/ });
    await left?.click();

    expect(page.sort()).toEqual({ active: 'deficit', direction: 'asc' });
    expect(ifs().slice(0, 3)).toEqual([550, 557, 552]);
  });

  it('puts a row on trial', async () => {
    const { page, loader } = open(true);
    await loader.getHarness(MatSortHarness);
    document.querySelector<HTMLButtonElement>('.take')?.click();

    expect(page.trialHz()).toBe(550_000);
  });

  it('is a list where columns find no room, sorted from the better end', async () => {
    const { page, loader } = open(false);
    expect(await loader.getHarnessOrNull(MatSortHarness)).toBeNull();
    const select = await loader.getHarness(MatSelectHarness);
    await select.clickOptions({ text: /Worst image/ });

    expect(page.sort()).toEqual({ active: 'image', direction: 'desc' });
  });
});
