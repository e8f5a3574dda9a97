import { FakeServer, problemOf } from '../../core/fake-server';
import { FormProblemsHarness } from '../../ui/form-problems/form-problems-harness';
import { openPage } from '../page-for-specs';
import { EDITION } from '../stations-for-specs';
import { EditionEdit } from './edition-edit';

const READ = 'GET /api/editions/5';
const SAVE = 'PUT /api/editions/5';
const REMOVE = 'DELETE /api/editions/5';

async function open(server = new FakeServer().on(READ, () => EDITION)) {
  const page = await openPage(EditionEdit, server, {
    path: 'editions/:id/change',
    url: '/editions/5/change',
  });
  return { ...page, server };
}

describe('EditionEdit', () => {
  it('shows what is stored and saves what was changed', async () => {
    const { server, type, valueOf, press, address } = await open();
    server.on(SAVE, () => ({ ...EDITION, label: 'Late spring' }));
    expect(await valueOf('Name of the edition')).toBe('Spring');
    expect(await valueOf('Date of the list')).toBe('2026-03-01');

    await type('Name of the edition', 'Late spring');
    await press('Save the edition');

    expect(server.sent(SAVE)).toEqual([{ label: 'Late spring', date: '2026-03-01', note: '' }]);
    expect(address()).toBe('/editions/5');
  });

  it('names what is missing and sends nothing', async () => {
    const { server, loader, type, press } = await open();

    await type('Name of the edition', ' ');
    await press('Save the edition');

    const problems = await loader.getHarness(FormProblemsHarness);
    expect(await problems.messages()).toEqual(['Give a name, such as “Spring list”.']);
    expect(server.sent(SAVE)).toEqual([]);
  });

  it('puts what the server objects to beside its field, and keeps what was typed', async () => {
    const { server, loader, type, valueOf, press } = await open();
    const message = 'The region has an edition of that name already.';
    server.on(SAVE, () => problemOf(409, 'Refused.', [{ path: 'label', message }]));

    await type('Name of the edition', 'Winter');
    await press('Save the edition');

    const problems = await loader.getHarness(FormProblemsHarness);
    expect(await problems.messages()).toEqual([message]);
    expect(await valueOf('Name of the edition')).toBe('Winter');
  });

  it('deletes the edition once that is agreed to, and leads to its region', async () => {
    const { server, press, answer, address } = await open();
    server.on(REMOVE, () => null);

    await press('Delete the edition');
    await answer('Keep it');
    expect(server.sent(REMOVE)).toEqual([]);
    await press('Delete the edition');
    await answer('Delete the edition');

    expect(server.sent(REMOVE)).toHaveLength(1);
    expect(address()).toBe('/regions/1');
  });

  it('says why it could not be deleted', async () => {
    const { server, press, answer, texts } = await open();
    server.on(REMOVE, () => problemOf(409, 'A plan was judged against it.'));

    await press('Delete the edition');
    await answer('Delete the edition');

    expect((await texts('app-problem-note')).join(' ')).toContain('A plan was judged against it.');
  });
});
