import type { Role } from '../../../../shared/contracts/session';
import { FakeServer, problemOf } from '../../core/fake-server';
import { openPage } from '../page-for-specs';
import { EDITION, FERRY_POINT, NOWHERE } from '../stations-for-specs';
import { StationPage } from './station-page';

const EDITION_READ = 'GET /api/editions/5';
const READ = 'GET /api/editions/5/stations/2';
const REMOVE = 'DELETE /api/regions/1/corrections/7';

async function open(
  station: object = NOWHERE,
  { query = '', role = 'librarian' }: { query?: string; role?: Role } = {},
) {
  const server = new FakeServer()
    .on(EDITION_READ, () => EDITION)
    .on(`${READ}${query}`, () => station);
  const page = await openPage(StationPage, server, {
    path: 'editions/:id/stations/:stationId',
    url: `/editions/5/stations/2${query}`,
    role,
  });
  return { ...page, server };
}

describe('StationPage', () => {
  it('says what counts and what is listed', async () => {
    const { texts } = await open();

    expect(await texts('h1')).toEqual(['QXB, 613.5 kHz']);
    expect(await texts('dd')).toContain('250 W – listed: 1 kW');
  });

  it('says what was corrected, by whom and why', async () => {
    const { texts } = await open();

    const [mark] = await texts('app-station-corrections li');
    expect(mark).toContain('changed by hand: Ada Quill, 2 Mar 2026');
    expect(mark).toContain('By letter');
  });

  it('takes a correction back once that is agreed to, and shows what is listed', async () => {
    const { server, press, answer, texts } = await open();
    server.on(REMOVE, () => null).on(READ, () => ({ ...NOWHERE.official, id: 2 }));

    await press(/Take back/);
    await answer('Take it back');

    expect(server.sent(REMOVE)).toHaveLength(1);
    expect(await texts('app-station-corrections .quiet')).toEqual([
      'Nobody has corrected this station. It stands as it was imported.',
    ]);
  });

  it('leaves with a station that is in the list no more', async () => {
    const added = { ...NOWHERE, corrections: [{ ...NOWHERE.corrections[0], kind: 'added' }] };
    const { server, press, answer, address } = await open(added);
    server.on(REMOVE, () => null);

    await press(/Take back/);
    await answer('Take it back');

    expect(address()).toBe('/editions/5');
  });

  it('says what stands out: off the air, off the raster, its field at the site', async () => {
    const heard = { ...FERRY_POINT, id: 2, offAir: true, distanceM: 34_600, fieldDb: 71.4 };
    const { texts } = await open(heard, { query: '?site=3' });

    const [offAir, offRaster] = await texts('.standing');
    expect(offAir).toContain('Noted as off the air');
    expect(offRaster).toContain('Off the raster');
    expect((await texts('dd')).at(-1)).toMatch(/34\.6.km, 71\.4/);
  });

  it('lets members note what they heard, and librarians alone change the row', async () => {
    const { element, texts } = await open(NOWHERE, { role: 'member' });

    expect(await texts('app-tick-form h2')).toEqual(['Found by ear']);
    expect(element.querySelector('a[href$="/change"]')).toBeNull();
  });

  it('leads back when there is no such station', async () => {
    const server = new FakeServer()
      .on(EDITION_READ, () => EDITION)
      .on(READ, () => problemOf(404, 'The edition holds no such station.'));
    const { texts } = await openPage(StationPage, server, {
      path: 'editions/:id/stations/:stationId',
      url: '/editions/5/stations/2',
    });

    const [note] = await texts('app-problem-note');
    expect(note).toContain('The edition holds no such station.');
    expect(note).toContain('Back to the edition');
  });
});
