import { openSection } from '../receiver-page/section-harness';
import { RejectionPage } from './rejection-page';

describe('rejection along the dial', () => {
  it('shows image and IF rejection of each band, as the set is', async () => {
    const { page, server } = await openSection(RejectionPage);

    const text = await page.text();
    expect(text).toContain('Image rejection, Range 4');
    expect(text).toContain('IF rejection, Range 4');
    expect(text).toMatch(/Least: as it is, [\d.]+ dB at \d+ kHz\./);
    expect(server.calls.map(({ call }) => call)).not.toContain('POST /api/if-candidates');
  });

  it('lays the changes that are chosen beside it, and writes them into the address', async () => {
    const { page, query, settle } = await openSection(RejectionPage, '&with=trap');
    expect(await page.text()).toMatch(/Least: as it is, .*; best trap for the IF, /);

    await (await page.chips('Changes to the set')).selectChips({ text: 'one more circuit' });
    await settle(20);

    expect(query()['with']).toBe('one-more-circuit,trap');
    expect(await page.text()).toMatch(/; one more circuit, [\d.]+ dB/);
  });

  it('shows the stretch of a band that the address names, in both of its charts', async () => {
    const { page, query, settle } = await openSection(RejectionPage, '&zoom=1:700000-800000');
    expect([await page.limit('From'), await page.limit('to')]).toEqual(['700', '800']);

    await page.press('Whole range');
    await settle(500);

    expect(query()['zoom']).toBeUndefined();
    expect(await page.limit('to')).toBe('1600');
  });
});
