import { openSection } from '../receiver-page/section-harness';
import { WhistlePage } from './whistle-page';

const WHISTLES = 'POST /api/whistles';

describe('tracing a whistle', () => {
  it('asks about what the address says, and lists causes with their test and the caution', async () => {
    const { page, server } = await openSection(WhistlePage, '&dial=612000&pitch=1000&slope=2');

    expect(server.sent(WHISTLES).at(-1)).toMatchObject({
      ...{ dialHz: 612_000, pitchHz: 1000, pitchSlope: 2 },
    });
    expect(await page.typed(/^Pitch/)).toBe('1000');
    const [first] = await page.itemTexts();
    expect(first).toMatch(/^Alder on 1730\skHz: image/);
    expect(first).toContain('moves 2 Hz a hertz of dial');
    expect(first).toContain('Put a trap for 1730 kHz in the aerial lead.');
    expect(await page.text()).toContain('high tension');
    expect(await page.text()).toContain('and 2 pairs of stations');
  });

  it('writes what is noted into the address', async () => {
    const { page, query, settle } = await openSection(WhistlePage, '&dial=612000');

    await page.type(/^Pitch/, '1,2 kHz');
    await page.press('Find the causes');
    await settle();

    expect(query()).toMatchObject({ dial: '612000', pitch: '1200' });
    expect(query()['slope']).toBeUndefined();
  });

  it('refuses a setting that no band tunes, in a summary and beside the field', async () => {
    const { page, query, settle } = await openSection(WhistlePage, '&dial=612000');

    await page.type('Dial setting', '30 MHz');
    await page.press('Find the causes');
    await settle(20);

    expect(await page.text()).toContain('Give a frequency that a band of the set tunes.');
    expect(query()['dial']).toBe('612000');
  });

  it('says so where nothing known beats', async () => {
    const { page, server, settle, go } = await openSection(WhistlePage, '&dial=612000');
    server.on(WHISTLES, () => ({
      wanted: { station: null, frequencyHz: 900_000, fieldDb: 60 },
      ...{ noiseDb: 20, skipped: [], causes: [] },
    }));

    await go('/receivers/1/section?site=4&edition=7&dial=900000');
    await settle();

    expect(await page.text()).toContain('Nothing that is known beats here.');
  });
});
