import { readFileSync } from 'node:fs';

import { parse } from 'csv-parse/sync';
import type { Browser, Page, Response } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';

import type { Assessment } from '../../shared/contracts/assessment.ts';
import type { CandidatesAnswer } from '../../shared/contracts/candidates.ts';
import type { FieldStrengthsAnswer } from '../../shared/contracts/field-strengths.ts';
import { keepPicture, openBrowser, openPage, signIn } from '../support/browser.ts';

const RECEIVER = 'Fennimore 12-valve communications receiver, IF 560';
const POSITIONS = 20;

/** A level as readouts write it. */
const tenths = (db: number): string => {
  const text = Math.abs(db).toFixed(1);
  return db < 0 && Number(text) !== 0 ? `\u2212${text}` : text;
};

interface Answers {
  readonly 'field-strengths': FieldStrengthsAnswer;
  readonly 'if-candidates': CandidatesAnswer;
  readonly assessments: Assessment;
}

describe('the charts of a receiver', () => {
  let browser: Browser;
  let page: Page;
  const answers: Partial<Answers> = {};
  const faults: string[] = [];

  const keepAnswer = async (response: Response) => {
    const name = /field-strengths$|if-candidates$|assessments$/.exec(response.url())?.[0];
    if (name === undefined || !response.ok()) return;
    const { limit, stepHz } = response.request().postDataJSON() as Record<string, unknown>;
    // The verdict alone, and the IF on trial alone, are asked for besides.
    if (limit !== 1 && stepHz !== 1) Object.assign(answers, { [name]: await response.json() });
  };
  const answer = <K extends keyof Answers>(name: K): Answers[K] => {
    const found = answers[name];
    if (!found) throw new Error(`The page did not ask for ${name}.`);
    return found;
  };
  const plot = (host: string) => page.locator(`${host} [role="application"]`);

  /** What each of the first positions of a chart says, by label, with its title. */
  const readouts = async (host: string, index = 0): Promise<Record<string, string>[]> => {
    const read: Record<string, string>[] = [];
    const surface = plot(host).nth(index);
    await surface.press('Home');
    for (let at = 0; at < POSITIONS; at++) {
      const shown = page.locator(`${host} app-plot-readout`);
      await shown.waitFor();
      // One reading of one frame: the readout is drawn anew after each key.
      read.push(
        await shown.evaluate(async (readout) => {
          await new Promise((drawn) => requestAnimationFrame(() => requestAnimationFrame(drawn)));
          const texts = (selector: string) =>
            [...readout.querySelectorAll<HTMLElement>(selector)].map((each) => each.innerText);
          const values = texts('dd');
          return {
            title: texts('.title')[0] ?? '',
            ...Object.fromEntries(texts('dt').map((label, i) => [label, values[i] ?? ''])),
          };
        }),
      );
      await surface.press('ArrowRight');
    }
    await surface.press('Escape');
    return read;
  };

  beforeAll(async () => {
    browser = await openBrowser();
    page = await openPage(browser, inject('productUrl'));
    page.on('response', (response) => void keepAnswer(response));
    page.on('console', (message) => {
      if (message.type() === 'error') faults.push(message.text());
    });
    const member = inject('demoSignIns').find(({ role }) => role === 'member');
    if (!member) throw new Error('The demo club has no member.');
    await signIn(page, member);
    await page.getByRole('link', { name: RECEIVER, exact: true }).click();
    await plot('app-candidate-lane').waitFor();
    await page.waitForLoadState('networkidle');
  });

  afterAll(() => browser.close());

  it('read out of the choice of IF what the API says, at 20 positions', async () => {
    const { fields } = answer('field-strengths');
    const known = new Set(
      fields.flatMap(({ name, fieldDb }) =>
        fieldDb === null ? [] : `${name}: ${tenths(fieldDb)} dB(µV/m)`,
      ),
    );

    const read = await readouts('app-choice-chart');

    expect(read).toHaveLength(POSITIONS);
    for (const { title = '', Field = '' } of read) {
      expect(known).toContain(`${title.replace(/, [^,]*$/, '')}: ${Field}`);
    }
  });

  it('read out of the candidates what the API says, at 20 positions', async () => {
    const { candidates } = answer('if-candidates');
    const sorted = candidates.toSorted((a, b) => a.ifHz - b.ifHz).slice(0, POSITIONS);

    const read = await readouts('app-candidate-lane');

    expect(read.map((each) => each['Left to be desired'])).toEqual(
      sorted.map(({ deficitDb }) => `${tenths(deficitDb)} dB`),
    );
  });

  it('save rows that are read again as the table, with what they rest on', async () => {
    const { candidates } = answer('if-candidates');
    const save = page.locator('app-candidate-lane').getByRole('button', { name: 'Save' });
    await save.click();
    const [file] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('menuitem', { name: 'CSV' }).click(),
    ]);

    const rows: Record<string, string>[] = parse(readFileSync(await file.path()), {
      columns: true,
      bom: true,
    });

    expect(file.suggestedFilename()).toMatch(/^what-each-candidate.*\.csv$/);
    expect(rows).toHaveLength(candidates.length);
    expect(rows[0]?.['Receiver']).toBe(RECEIVER);
  });

  it.each(['SVG', 'PNG'])('save a picture (%s) under the policy of the product', async (kind) => {
    const save = page.locator('app-choice-chart').getByRole('button', { name: 'Save' });
    await save.click();
    const [file] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('menuitem', { name: kind }).click(),
    ]);

    const saved = readFileSync(await file.path());

    if (kind === 'PNG') {
      const width = await page
        .locator('app-choice-chart app-plot svg')
        .first()
        .getAttribute('width');
      expect(saved.subarray(1, 4).toString()).toBe('PNG');
      expect(saved.readUInt32BE(16)).toBe(2 * (Number(width) + 24));
    } else {
      expect(saved.toString()).toContain(`Receiver: ${RECEIVER}`);
      expect(saved.toString()).toContain("@font-face{font-family:'Fira Sans'");
    }
  });

  it('print every row beside the chart', async () => {
    const { candidates } = answer('if-candidates');
    await page.evaluate(() => dispatchEvent(new Event('beforeprint')));
    const rows = page.locator('app-candidate-lane tbody tr');

    expect(await rows.count()).toBe(candidates.length);
    await page.emulateMedia({ media: 'print' });
    await keepPicture(page, 'charts-printed');
    expect((await page.pdf({ format: 'A4' })).length).toBeGreaterThan(10_000);
    expect((await page.pdf({ format: 'Letter' })).length).toBeGreaterThan(10_000);
    await page.emulateMedia({ media: 'screen' });
    await page.evaluate(() => dispatchEvent(new Event('afterprint')));
    expect(await rows.count()).toBe(0);
  });

  it('judge a moved IF in the worker, which the policy lets start', async () => {
    const [worker] = await Promise.all([
      page.waitForEvent('worker'),
      page.getByRole('slider', { name: /IF/ }).press('ArrowRight'),
    ]);

    expect(new URL(worker.url()).origin).toBe(new URL(page.url()).origin);
    await page.waitForLoadState('networkidle');
    expect(faults.filter((text) => /Trusted|Content Security/.test(text))).toEqual([]);
  });

  it('read out of the dial what the API says, at 20 positions', async () => {
    await page.getByRole('tab', { name: 'Dial', exact: true }).click();
    await plot('app-band-strip').first().waitFor();
    await page.waitForLoadState('networkidle');
    const { bands } = answer('assessments');
    const { fields } = answer('field-strengths');
    const located = bands.map(
      ({ responses }) => responses.filter(({ dialHz }) => dialHz !== null).length,
    );
    const most = located.indexOf(Math.max(...located));
    const nameOf = new Map(fields.map(({ station, name }) => [station, name]));
    const frequency = (hz: number) => (hz < 3e6 ? `${hz / 1000}\u00a0kHz` : `${hz / 1e6}\u00a0MHz`);
    const heard = (bands[most]?.responses ?? []).flatMap((each) => {
      const { interferenceDb, weightingDb, noiseDb, dialHz, ratioDb, beatHz, station } = each;
      if (interferenceDb === null || weightingDb === null || noiseDb === null) return [];
      const over = `${tenths(interferenceDb + weightingDb - noiseDb)} dB`;
      const ratio = ratioDb === null ? '\u2013' : `${tenths(ratioDb)} dB`;
      const title = `${nameOf.get(station)} at dial ${frequency(dialHz ?? 0)}`;
      return { dialHz, said: [title, over, ratio, frequency(beatHz)].join('; ') };
    });
    const wanted = fields.map(
      ({ name, frequencyHz, fieldDb }) =>
        `${name}, ${frequency(frequencyHz)}; ${tenths(fieldDb ?? NaN)} dB(µV/m)`,
    );

    const read = await readouts('app-band-strip', most);

    const isHeard = (each: Record<string, string>) => 'Beat' in each;
    const saidHeard = read
      .filter(isHeard)
      .map((each) =>
        [each['title'], each['Over the noise'], each['Wanted to unwanted'], each['Beat']].join(
          '; ',
        ),
      );
    // From left to right the marks are those of the answer, each once.
    const inOrder = heard
      .filter(({ dialHz }) => dialHz !== null)
      .sort((a, b) => (a.dialHz ?? 0) - (b.dialHz ?? 0));
    const last = inOrder[saidHeard.length - 1]?.dialHz ?? Infinity;
    const upToLast = inOrder.filter(({ dialHz }) => (dialHz ?? 0) <= last).map(({ said }) => said);
    const beforeLast = inOrder.filter(({ dialHz }) => (dialHz ?? 0) < last).map(({ said }) => said);
    expect(read.length).toBe(POSITIONS);
    expect(saidHeard.filter((each) => !upToLast.includes(each))).toEqual([]);
    expect(beforeLast.filter((each) => !saidHeard.includes(each))).toEqual([]);
    expect(new Set(saidHeard).size).toBe(new Set(upToLast.slice(0, saidHeard.length)).size);
    for (const each of read.filter((one) => !isHeard(one))) {
      expect(wanted).toContain(`${each['title']}; ${each['Field']}`);
    }
  });
});
