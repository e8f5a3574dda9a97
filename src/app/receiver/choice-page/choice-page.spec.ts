import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButtonHarness } from '@angular/material/button/testing';

import { IfMarkerHarness } from '../../charts/choice-chart/if-marker-harness';
import { AROUND, openPart, sampleServer } from './choice-sample';
import { ChoicePage } from './choice-page';

@Component({
  imports: [ChoicePage],
  providers: AROUND,
  template: '<app-choice-page />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {}

const verdict = { usable: 3, harmed: [], emptyDial: null, deficitDb: 0 };

describe('the choice of IF', () => {
  it('moves everything along with a candidate that is taken', async () => {
    const part = await openPart(Page, sampleServer());
    const put = MatButtonHarness.with({ text: 'Put 555 kHz on trial' });
    await (await part.loader.getHarness(put)).click();
    await part.settle();

    expect(part.query().get('if')).toBe('555000');
    expect(part.text()).toContain('With the IF at 555 kHz');
    expect(part.text()).toContain('The choice holds from 554.5 to 555.5 kHz');
    expect(part.text()).toContain('555 kHz by day and by night');
    expect(await (await part.loader.getHarness(IfMarkerHarness)).value()).toBe('555\u00a0kHz');
  });

  it('writes the range in view into the address, and opens with it', async () => {
    const part = await openPart(Page, sampleServer(), 'site=4&edition=7&view=550000-570000');
    const zoom = MatButtonHarness.with({ selector: '[aria-label="Zoom in"]' });
    await (await part.loader.getHarness(zoom)).click();
    await part.settle();
    await part.settle();

    expect(part.query().get('view')).toBe('553750-566250');
  });

  it('says that no station is in reach, and what to do', async () => {
    const server = sampleServer().on('POST /api/field-strengths', () => ({ fields: [] }));
    const { text } = await openPart(Page, server);

    expect(text()).toContain('No station is in reach by night');
    expect(text()).toContain('import a list');
  });

  it('counts stations without a power, and leads to the list', async () => {
    const skipped = [1, 2].map((station) => ({ station, reason: 'no power at night' }));
    const server = sampleServer().on('POST /api/assessments', () => ({
      verdict,
      warnings: [],
      skipped,
      bands: [],
    }));
    const { text } = await openPart(Page, server);

    expect(text()).toContain('Left out: 2 (no power at night)');
    expect(text()).toContain('Look at the list');
  });

  it('judges a moment where the address names one', async () => {
    const server = sampleServer();
    await openPart(Page, server, 'site=4&edition=7&period=night&at=2026-12-21T18:30:00Z');

    expect(server.sent('POST /api/assessments').at(-1)).toMatchObject({
      period: '2026-12-21T18:30:00Z',
    });
  });
});
