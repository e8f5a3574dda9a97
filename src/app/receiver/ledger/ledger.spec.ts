import { Clipboard } from '@angular/cdk/clipboard';
import { ComponentHarness } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';

import type { JudgedResponse } from '../../charts/band-strip/strip-layout';
import { judgedSample } from '../receiver-page/section-sample';
import { Ledger } from './ledger';

class LedgerHarness extends ComponentHarness {
  static readonly hostSelector = 'app-ledger';

  private readonly rows = this.locatorForAll('tbody tr');

  async text(): Promise<string> {
    return (await this.host()).text();
  }

  async rowTexts(): Promise<string[]> {
    return Promise.all((await this.rows()).map((each) => each.text()));
  }

  async press(text: string): Promise<void> {
    await (await this.locatorFor(MatButtonHarness.with({ text }))()).click();
  }
}

async function open(change: Partial<JudgedResponse> = {}, copies = true) {
  const [response] = judgedSample.bands[0]?.responses ?? [];
  const copy = vi.fn((_text: string) => copies);
  const names = new Map([
    [1, 'Alder'],
    [2, 'Birch'],
  ]);
  TestBed.configureTestingModule({
    providers: [
      { provide: Clipboard, useValue: { copy } },
      {
        provide: MAT_DIALOG_DATA,
        useValue: {
          response: { ...response, ...change },
          ...{ band: 'Range 4', service: 'broadcast', station: undefined, place: null },
          nameOf: (station: number) => names.get(station) ?? '?',
        },
      },
    ],
  });
  const fixture = TestBed.createComponent(Ledger);
  const ledger = await TestbedHarnessEnvironment.harnessForFixture(fixture, LedgerHarness);
  return { ledger, copy };
}

describe('the working', () => {
  it('gives every term in its order, the wanted station, the grade and what it rests on', async () => {
    const { ledger } = await open();

    const rows = await ledger.rowTexts();
    expect(rows.map((text) => /−?[\d.]+ dB(?:\(µV\/m\))?$/.exec(text)?.[0])).toEqual([
      '78.0 dB(µV/m)',
      '−40.0 dB',
      '38.0 dB(µV/m)',
      '22.0 dB',
    ]);
    const text = await ledger.text();
    expect(text).toMatch(/Alder at 610\skHz, Range 4: image/);
    expect(text).toContain('Birch');
    expect(text).toContain('ratio of 17 to 26 dB');
    expect(text).not.toContain('Borderline');
  });

  it('is copied as text that a reader can follow, with its address', async () => {
    const { ledger, copy } = await open();

    await ledger.press('Copy as text');

    const text = copy.mock.calls[0]?.[0] ?? '';
    expect(text).toContain('Signal circuit 1\t−40.0 dB');
    expect(text.split('\n').at(-1)).toBe(document.location.href);
    expect(await ledger.text()).toContain('The working is copied.');
  });

  it('says so where the browser does not copy', async () => {
    const { ledger } = await open({}, false);

    await ledger.press('Copy the link');

    expect(await ledger.text()).toContain('This browser does not let the page copy.');
  });

  it('says that it is borderline, or that no level is known', async () => {
    const { ledger } = await open({ borderline: true, ledger: [] });

    expect(await ledger.text()).toContain('Borderline');
    expect(await ledger.text()).toContain('The level of this product cannot be predicted');
  });
});
