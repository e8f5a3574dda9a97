import { TestKey } from '@angular/cdk/testing';

import { problemOf } from '../../core/fake-server';
import { openSection } from '../receiver-page/section-harness';
import { benchServer } from '../receiver-page/section-sample';
import { DialPage } from './dial-page';

const WHISTLES = 'POST /api/whistles';

describe('the dial', () => {
  it('lists what is heard, the worst first, and asks for no candidates', async () => {
    const { page, server } = await openSection(DialPage);

    const rows = await page.rowTexts();
    expect(rows).toHaveLength(3);
    expect(rows[0]).toMatch(/^610.*Alder.*image/);
    expect(server.calls.map(({ call }) => call)).not.toContain('POST /api/if-candidates');
  });

  it('filters by what the address says, and writes a filter into it', async () => {
    const { page, query, settle } = await openSection(DialPage, '&cause=breakthrough');
    expect(await page.rowTexts()).toHaveLength(1);

    await page.press('Show all');
    await settle(20);
    expect(query()['cause']).toBeUndefined();
    expect(await page.rowTexts()).toHaveLength(3);

    await (await page.chips('Heard as')).selectChips({ text: /^image/ });
    await settle(20);
    expect(query()['cause']).toBe('image');
  });

  it('opens the working that a row leads to, and closes it with the address', async () => {
    const { page, query, settle, dialogs } = await openSection(DialPage);

    await page.press('Show the working');
    await settle();
    const [ledger] = await dialogs();
    expect(await ledger?.getText()).toContain('Signal circuit 1');
    expect(query()['working']).toContain('response|1');

    await ledger?.close();
    await settle();
    expect(await dialogs()).toHaveLength(0);
    expect(query()['working']).toBeUndefined();
  });

  it('says so where the working that the address names is not among what is heard', async () => {
    const { page } = await openSection(DialPage, '&working=response|99');

    expect((await page.alertTexts()).join()).toContain('is not among what is heard');
  });

  it('keeps the stretch of a band that is shown in the address, and follows it back', async () => {
    const { page, query, settle, go } = await openSection(DialPage, '&zoom=1:700000-800000');
    expect(await page.limit('From')).toBe('700');

    await page.press('Whole range');
    await settle(500);
    expect(query()['zoom']).toBeUndefined();

    await go('/receivers/1/section?site=4&edition=7&zoom=1:900000-950000');
    await settle(20);
    expect(await page.limit('From')).toBe('900');
  });
});

describe('the pointer of the dial', () => {
  it('starts at what is worst and says what is heard there, pairs at zero beat in one line', async () => {
    const { page } = await openSection(DialPage);

    expect(await page.typed('Dial setting')).toBe('610');
    expect(await page.text()).toMatch(/At 610\skHz the set hears Birch, 40 dB over the noise/);
    const items = await page.itemTexts();
    expect(items.filter((text) => text.includes('Alder on 1730'))).toHaveLength(1);
    expect(await page.text()).toContain('and 2 pairs of stations that make the IF between them');
  });

  it('is moved by keys and typed, and asks what is heard at its new place', async () => {
    const { page, query, settle, server } = await openSection(DialPage);
    const pointer = await page.dialPointer();

    await pointer.sendKeys(TestKey.RIGHT_ARROW);
    await pointer.sendKeys({ shift: true }, TestKey.RIGHT_ARROW);
    await settle();
    expect(query()['dial']).toBe('611100');
    expect(await pointer.getAttribute('aria-valuetext')).toMatch(/^611\.1\skHz$/);
    expect(server.sent(WHISTLES).at(-1)).toMatchObject({ dialHz: 611_100 });

    await pointer.sendKeys(TestKey.END);
    await settle();
    expect(query()['dial']).toBe('1600000');

    await page.type('Dial setting', '1,25 MHz');
    await settle();
    expect(query()['dial']).toBe('1250000');
  });

  it('does not move where no band tunes, and says why', async () => {
    const { page, query } = await openSection(DialPage, '&dial=700000');

    await page.type('Dial setting', '30 MHz');

    expect((await page.alertTexts()).join()).toContain('that a band of the set tunes');
    expect(query()['dial']).toBe('700000');
  });

  it('offers to try again when the server cannot say', async () => {
    const server = benchServer().on(WHISTLES, () => problemOf(503, 'Back in a moment.'));
    const { page, settle } = await openSection(DialPage, '', server);
    expect((await page.alertTexts()).join()).toContain('Back in a moment.');

    server.on(WHISTLES, () => ({
      wanted: { station: null, frequencyHz: 610_000, fieldDb: 60 },
      ...{ noiseDb: 20, skipped: [], causes: [] },
    }));
    await page.press('Try again');
    await settle();

    expect(await page.text()).toContain('Nothing of known level beats with it');
  });
});
