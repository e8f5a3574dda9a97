import { FakeServer, problemOf } from '../../core/fake-server';
import { FormProblemsHarness } from '../../ui/form-problems/form-problems-harness';
import { openPage } from '../page-for-specs';
import { correctionOf, EDITION, FERRY_POINT } from '../stations-for-specs';
import { StationEdit } from './station-edit';

const ADD = 'POST /api/regions/1/corrections';
const CHANGE = 'PUT /api/regions/1/corrections/7';

async function open(part: 'new' | '1/change', station: object = FERRY_POINT) {
  localStorage.clear();
  const server = new FakeServer()
    .on('GET /api/editions/5', () => EDITION)
    .on('GET /api/editions/5/stations/1', () => station)
    .on(ADD, () => correctionOf('added'))
    .on(CHANGE, () => correctionOf('added'));
  const path = part === 'new' ? 'stations/new' : 'stations/:stationId/change';
  const page = await openPage(StationEdit, server, {
    path: `editions/:id/${path}`,
    url: `/editions/5/stations/${part}`,
  });
  const problems = async () => (await page.loader.getHarness(FormProblemsHarness)).messages();
  return { ...page, server, problems };
}

describe('StationEdit', () => {
  it('adds a station that the list lacks, apart from the list', async () => {
    const { server, type, press, address } = await open('new');

    await type('Name', 'Harbour Beacon');
    await type('Frequency', '0,405 MHz');
    await type('Locator, or both coordinates at once', '33.4 N 55.2 W');
    await type('Power by day', '50 W');
    await type('Where you know it from', 'By letter');
    await press('Save the station');

    expect(server.sent(ADD)).toEqual([
      {
        kind: 'added',
        station: {
          name: 'Harbour Beacon',
          callSign: '',
          frequencyHz: 405_000,
          latitude: 33.4,
          longitude: -55.2,
          powerDayW: 50,
          powerNightW: null,
          hours: '',
          note: '',
        },
        note: 'By letter',
        date: undefined,
      },
    ]);
    expect(address()).toBe('/editions/5');
  });

  it('names what is missing and sends nothing', async () => {
    const { server, press, problems } = await open('new');

    await press('Save the station');

    expect(await problems()).toContain('Give a frequency, such as 612 kHz.');
    expect(server.sent(ADD)).toEqual([]);
  });

  it('refuses a place that cannot be read', async () => {
    const { server, type, press, problems } = await open('new');

    await type('Name', 'Harbour Beacon');
    await type('Frequency', '405');
    await type('Latitude', '95 N');
    await type('Longitude', '55 W');
    await press('Save the station');

    expect(await problems()).toHaveLength(1);
    expect(server.sent(ADD)).toEqual([]);
  });

  it('keeps of a listed station only what is changed', async () => {
    const { server, type, valueOf, press, address } = await open('1/change');
    expect(await valueOf('Name')).toBe('Ferry Point');

    await type('Power by night', '2 kW');
    await press('Save the station');

    expect(server.sent(ADD)).toEqual([
      { kind: 'changed', stationId: 1, fields: { powerNightW: 2000 }, note: '', date: undefined },
    ]);
    expect(address()).toBe('/editions/5/stations/1');
  });

  it('sends nothing of a station that was left as it is', async () => {
    const { server, press, address } = await open('1/change');

    await press('Save the station');

    expect(server.sent(ADD)).toEqual([]);
    expect(address()).toBe('/editions/5/stations/1');
  });

  it('changes one that was added where it was added', async () => {
    const mark = { id: 7, kind: 'added', date: '2026-03-02', note: '', authorName: 'Ada Quill' };
    const added = { ...FERRY_POINT, corrections: [{ ...mark, editable: true }] };
    const { server, type, press } = await open('1/change', added);

    await type('Name', 'Ferry Quay');
    await press('Save the station');

    expect(server.sent(ADD)).toEqual([]);
    expect(server.sent(CHANGE)).toMatchObject([
      { station: { name: 'Ferry Quay', frequencyHz: 613_500 }, date: '2026-03-02' },
    ]);
  });

  it('keeps what was typed when the server refuses', async () => {
    const { server, type, valueOf, press, problems } = await open('new');
    server.on(ADD, () => problemOf(403, 'Only librarians add stations.'));

    await type('Name', 'Harbour Beacon');
    await type('Frequency', '405');
    await press('Save the station');

    expect(await problems()).toEqual(['Only librarians add stations.']);
    expect(await valueOf('Name')).toBe('Harbour Beacon');
  });
});
