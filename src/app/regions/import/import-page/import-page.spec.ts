import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { FakeServer, problemOf } from '../../../core/fake-server';
import { RegionStore } from '../../region-store';
import { importMatcher } from '../import-matcher';
import { ImportPage } from './import-page';
import { ImportPageHarness } from './import-page-harness';

const IMPORT = '/api/regions/1/imports/7';
const ROWS = { total: 5, new: 3, changed: 0, same: 0, rejected: 2, duplicate: 0 };
const COLUMNS = [
  { header: 'Freq', field: 'frequency', unit: null },
  { header: 'Name', field: 'name', unit: null },
];
const MATCHED = [{ header: 'Freq', field: 'frequency', unit: 'kHz' }, COLUMNS[1]];
const FAULT = { line: 3, column: 'Freq', value: '6l2', expected: 'a frequency in kHz' };

const region = (editable: boolean) => ({
  id: 1,
  name: 'Vale',
  ituRegion: 1,
  raster: [],
  rasters: [],
  editable,
  editions: 0,
});

/** An import on a server that does what it is told. */
class FakeImport {
  state = 'uploaded';
  label: string | null = null;
  columns: unknown = COLUMNS;
  /** What else the proposal says. */
  found: Record<string, unknown> = {};

  readonly server = new FakeServer()
    .on('GET /api/regions/1', () => region(true))
    .on(`GET ${IMPORT}`, () => this.answer())
    .on(`PUT ${IMPORT}`, () => {
      this.state = 'ready';
      this.label ??= 'vale';
      this.columns = MATCHED;
      return { rows: ROWS, faults: [FAULT] };
    })
    .on(`PUT ${IMPORT}/reading`, () => {
      this.found = { ...this.found, encoding: 'ISO-8859-2', sample: [['612', 'F\u010de']] };
      return this.answer().proposal;
    })
    .on(`POST ${IMPORT}/commit`, () => (this.state = 'committed'))
    .on(`DELETE ${IMPORT}`, () => {
      this.state = this.state === 'committed' ? 'undone' : 'cancelled';
      return null;
    });

  private answer() {
    const isChecked = this.state !== 'uploaded';
    return {
      id: 7,
      state: this.state,
      progress: 0,
      rows: isChecked ? ROWS : null,
      faults: this.state === 'ready' ? [FAULT] : [],
      causes: isChecked ? [{ column: 'Freq', expected: FAULT.expected, count: 2, lines: [3] }] : [],
      remarks: isChecked ? [{ message: 'Comments were passed over.', count: 1, lines: [9] }] : [],
      editionId: this.state === 'committed' ? 5 : null,
      reason: null,
      label: this.label,
      date: isChecked ? '2026-03-01' : null,
      proposal: {
        id: 7,
        fileName: 'vale.csv',
        encoding: 'windows-1252',
        delimiter: ';',
        decimalMark: ',',
        columns: this.columns,
        sample: [['612', 'Ferry Point']],
        complete: false,
        ...this.found,
      },
    };
  }
}

async function open(url: string, list = new FakeImport()) {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(withInterceptors([list.server.intercept])),
      provideRouter([
        {
          path: 'regions',
          providers: [RegionStore],
          children: [{ matcher: importMatcher, component: ImportPage }],
        },
      ]),
    ],
  });
  const { fixture } = await RouterTestingHarness.create(url);
  const page = await TestbedHarnessEnvironment.loader(fixture).getHarness(ImportPageHarness);
  return { page, list, root: TestbedHarnessEnvironment.documentRootLoader(fixture) };
}

describe('ImportPage', () => {
  it('begins with the file', async () => {
    const { page } = await open('/regions/1/import');

    expect(await page.step()).toBe('File');
  });

  it('shows what was found and asks for the unit that nobody else knows', async () => {
    const { page } = await open('/regions/1/import/7');

    expect(await page.step()).toBe('Columns');
    const text = await page.text();
    expect(text).toContain('windows-1252, its cells parted by semicolons, with a decimal comma');
    expect(text).toContain('The unit of one column is not said in the file: Freq.');
  });

  it('has every row checked by the columns as matched', async () => {
    const { page, list } = await open('/regions/1/import/7');
    await page.choose('Unit of Freq', 'kHz');

    await page.press('Check every row');

    expect(list.server.sent(`PUT ${IMPORT}`)).toEqual([{ columns: MATCHED, addsTo: null }]);
    expect(await page.step()).toBe('Check');
    const text = await page.text();
    expect(text).toContain('3 of 5 rows can be stored; 2 are rejected.');
    expect(text).toContain('Freq: expected is a frequency in kHz');
    expect(text).toContain('6l2');
    expect(text).toMatch(/Comments were passed over\.\s+Line 9\./);
  });

  it('takes the file apart as chosen, and the sample follows', async () => {
    const { page, list } = await open('/regions/1/import/7');

    await page.chooseLabelled('Encoding', 'ISO-8859-2');

    expect(list.server.sent(`PUT ${IMPORT}/reading`)).toEqual([{ encoding: 'ISO-8859-2' }]);
    expect(await page.text()).toContain('F\u010de');
    expect(await page.text()).toContain('was read as ISO-8859-2');
  });

  it('says why a file cannot be read in the encoding that was chosen', async () => {
    const list = new FakeImport();
    list.server.on(`PUT ${IMPORT}/reading`, () =>
      problemOf(400, 'Some values are not valid.', [
        { path: 'encoding', message: 'The file is not UTF-8.' },
      ]),
    );
    const { page } = await open('/regions/1/import/7', list);

    await page.chooseLabelled('Encoding', 'UTF-8');

    expect(await page.text()).toContain('The file is not UTF-8.');
  });

  it('asks what the letter O means where the file leaves it open', async () => {
    const list = new FakeImport();
    list.found = { letterO: 'open' };
    const { page } = await open('/regions/1/import/7', list);

    await page.chooseLabelled('The letter O beside a longitude means', 'East (German: Ost)');
    await page.press('Check every row');

    expect(list.server.sent(`PUT ${IMPORT}`)).toMatchObject([{ letterO: 'east' }]);
  });

  it('adds mended rows to their edition, unless one says they are the whole list', async () => {
    const list = new FakeImport();
    list.found = { completes: { editionId: 5, label: 'Spring' } };
    const { page } = await open('/regions/1/import/7', list);
    expect(await page.text()).toContain('They complete Spring');

    await page.press('Check every row');
    list.state = 'uploaded';
    await page.goTo('Columns');
    await page.pick('They are the whole list');
    await page.press('Check every row');

    expect(list.server.sent(`PUT ${IMPORT}`)).toMatchObject([{ addsTo: 5 }, { addsTo: null }]);
  });

  it('asks for the unit of a pattern once, for all its bearings', async () => {
    const list = new FakeImport();
    const bearings = ['az0', 'az90', 'az180', 'az270'];
    list.columns = bearings.map((header) => ({ header, field: 'pattern', unit: null }));
    const { page } = await open('/regions/1/import/7', list);
    expect(await page.text()).toContain('and 3 more bearings');

    await page.choose('Unit of az0', 'dB over the power');
    await page.press('Check every row');

    expect(list.server.sent(`PUT ${IMPORT}`)).toMatchObject([
      { columns: bearings.map((header) => ({ header, field: 'pattern', unit: 'dB' })) },
    ]);
  });

  it('stays with the columns when the server asks for something', async () => {
    const list = new FakeImport();
    list.server.on(`PUT ${IMPORT}`, () =>
      problemOf(400, 'Some values are not valid.', [
        { path: 'columns.0.unit', message: 'Say in which unit "Freq" is given.' },
      ]),
    );
    const { page } = await open('/regions/1/import/7', list);

    await page.press('Check every row');

    expect(await page.step()).toBe('Columns');
    expect(await page.text()).toContain('Say in which unit "Freq" is given.');
  });

  it('stores under another name only after a check under that name', async () => {
    const list = new FakeImport();
    list.state = 'ready';
    list.label = 'vale';
    list.columns = MATCHED;
    const { page } = await open('/regions/1/import/7?step=store', list);
    await page.type('Name of the edition', 'Spring');

    await page.press('Store the edition');

    expect(list.server.sent(`PUT ${IMPORT}`)).toEqual([
      { columns: MATCHED, label: 'Spring', date: '2026-03-01' },
    ]);
    expect(list.server.sent(`POST ${IMPORT}/commit`)).toHaveLength(1);
    expect(await page.step()).toBe('Result');
  });

  it('counts anew where another edition came in between', async () => {
    const list = new FakeImport();
    list.state = 'ready';
    list.label = 'vale';
    list.columns = MATCHED;
    list.server.on(`POST ${IMPORT}/commit`, () =>
      problemOf(409, 'Check it again.', [], 'edition-changed'),
    );
    const { page } = await open('/regions/1/import/7?step=store', list);

    await page.press('Store the edition');

    expect(list.server.sent(`PUT ${IMPORT}`)).toHaveLength(1);
    expect(await page.step()).toBe('Store');
    expect(await page.text()).toContain('The counts are new now');
  });

  it('undoes a stored import only after asking', async () => {
    const list = new FakeImport();
    list.state = 'committed';
    const { page, root } = await open('/regions/1/import/7', list);
    await page.press('Undo the import');
    expect(list.server.sent(`DELETE ${IMPORT}`)).toHaveLength(0);

    await (
      await root.getHarness(
        MatButtonHarness.with({ ancestor: '[role=alertdialog]', text: 'Undo the import' }),
      )
    ).click();

    await vi.waitFor(async () => {
      expect(await page.text()).toContain('everything is as it was before the import');
    });
  });

  it('keeps the step in the address, so that a reload goes on there', async () => {
    const list = new FakeImport();
    list.state = 'ready';
    const { page } = await open('/regions/1/import/7', list);

    await page.goTo('Columns');

    expect(TestBed.inject(Router).url).toBe('/regions/1/import/7?step=columns');
    expect(await page.step()).toBe('Columns');
  });

  it('tells a member who imports lists', async () => {
    const list = new FakeImport();
    list.server.on('GET /api/regions/1', () => region(false));
    const { page } = await open('/regions/1/import', list);

    expect(await page.text()).toContain('Only librarians and admins');
  });

  it('offers a new import where the old one is gone', async () => {
    const list = new FakeImport();
    list.server.on(`GET ${IMPORT}`, () => problemOf(404, 'No import with id 7.'));
    const { page } = await open('/regions/1/import/7', list);
    expect(await page.text()).toContain('No import with id 7.');

    await page.press('Begin a new import');

    expect(TestBed.inject(Router).url).toBe('/regions/1/import');
    expect(await page.step()).toBe('File');
  });
});
