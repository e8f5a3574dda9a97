import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatSelectHarness } from '@angular/material/select/testing';

import { AROUND, openPart, sampleCandidate, sampleServer } from '../choice-page/choice-sample';
import { TrialStore } from '../trial/trial-store';
import { CasesPanel } from './cases-panel';

@Component({
  imports: [CasesPanel],
  providers: AROUND,
  template: '<app-cases-panel />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {
  constructor() {
    inject(TrialStore).areCandidatesShown.set(true);
  }
}

const CANDIDATES = 'POST /api/if-candidates';
const press = async (part: Awaited<ReturnType<typeof openPart>>, text: string | RegExp) => {
  await (await part.loader.getHarness(MatButtonHarness.with({ text }))).click();
  await part.settle();
};

describe('one IF for several sites', () => {
  it('adds a site with its list, judges all at once, and keeps it in the address', async () => {
    const server = sampleServer();
    const part = await openPart(Page, server);
    const [site, list] = await part.loader.getAllHarnesses(MatSelectHarness);
    await site?.clickOptions({ text: 'Loft' });
    await list?.clickOptions({ text: /Coast/ });
    await press(part, 'Add this site');

    expect(part.query().get('also')).toBe('5.e7');
    const together = server.sent(CANDIDATES).find((body) => 'cases' in (body as object));
    expect(together).toMatchObject({
      cases: [
        { site: { latitude: 46 }, editionId: 7 },
        { site: { latitude: 48 }, editionId: 7 },
      ],
    });
  });

  it('says what each site says, and which fares worst', async () => {
    const server = sampleServer();
    let asked = 0;
    server.on(CANDIDATES, () => {
      const { site } = server.sent(CANDIDATES)[asked++] as { site?: { latitude: number } };
      const deficitDb = site?.latitude === 48 ? 9.5 : 2;
      const present = sampleCandidate({ ifHz: 560_000, deficitDb: 40 });
      return { present, candidates: [sampleCandidate({ ifHz: 555_500, deficitDb })], ranking: '' };
    });
    const { text } = await openPart(Page, server, 'site=4&edition=7&also=5.e7&if=555500');

    expect(text()).toContain('Shed Coast, Spring40.0 2.0 −38.0 dB');
    expect(text()).toContain('Loft Coast, Spring40.0 9.5 worst−30.5 dB');
  });

  it('leaves a site out again', async () => {
    const part = await openPart(Page, sampleServer(), 'site=4&edition=7&also=5.e7');
    await press(part, /^Leave out/);

    expect(part.query().get('also')).toBeNull();
    expect(part.text()).toContain('Add the sites of a club');
  });

  it('asks for a site before it adds one', async () => {
    const part = await openPart(Page, sampleServer());
    await press(part, 'Add this site');

    expect(part.text()).toContain('Choose a site first.');
  });
});
