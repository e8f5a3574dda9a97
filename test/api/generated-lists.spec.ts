import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';

import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { importCheck, importProposal } from '../../shared/contracts/list-import.ts';
import { problem } from '../../shared/contracts/problem.ts';
import { isComplete } from '../../server/imports/column-matching.ts';
import { checkList, judgedRows } from '../../server/imports/list-check.ts';
import { inspectList } from '../../server/imports/list-inspection.ts';
import { RowTally } from '../../server/imports/row-tally.ts';
import type { StationRow } from '../../server/imports/station-row.ts';
import { OperationalError } from '../../server/http/errors.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { type GeneratedStation, spoiltList, writtenList } from '../support/generated-lists.ts';
import { addRegion, sendList } from '../support/lists.ts';

/** `npm run test:fuzz` tries many more. */
const FILES = Number(process.env['FUZZ_FILES'] ?? 200);
const SECONDS_A_FILE = 0.5;
const timeout = 60_000 + FILES * SECONDS_A_FILE * 1000;

const folder = mkdtempSync(join(tmpdir(), 'fallow-generated-'));
afterAll(() => rmSync(folder, { recursive: true }));

function fileOf(content: Uint8Array): string {
  const path = join(folder, 'list.csv');
  writeFileSync(path, content);
  return path;
}

const rounded = ({ name, frequencyHz, latitude, longitude, ...powers }: GeneratedStation) => ({
  name: name.trim(),
  frequencyHz,
  latitude: Number(latitude.toFixed(5)),
  longitude: Number(longitude.toFixed(5)),
  ...powers,
});

const factsOf = ({ name, frequencyHz, ...station }: StationRow) =>
  rounded({
    name,
    frequencyHz,
    latitude: station.latitude ?? NaN,
    longitude: station.longitude ?? NaN,
    powerDayW: station.powerDayW ?? NaN,
    powerNightW: station.powerNightW ?? NaN,
  });

describe('a generated list', () => {
  it(
    'is read as it was written',
    async () => {
      await fc.assert(
        fc.asyncProperty(writtenList, async ({ stations, content }) => {
          const path = fileOf(content);
          const { reading } = await inspectList(path);
          expect(isComplete(reading)).toBe(true);
          const read: unknown[] = [];
          for await (const part of judgedRows(path, reading, new RowTally())) {
            for (const judged of part.judged) {
              expect(judged).not.toHaveProperty('faults');
              if ('station' in judged && judged.station) read.push(factsOf(judged.station));
            }
          }
          const told = new Map(stations.map((each) => [JSON.stringify(rounded(each)), each]));
          expect(read).toEqual([...told.keys()].map((text): unknown => JSON.parse(text)));
        }),
        { numRuns: FILES },
      );
    },
    timeout,
  );

  it(
    'that is spoilt is read as far as it can be, or refused with a sentence',
    async () => {
      await fc.assert(
        fc.asyncProperty(spoiltList, async (content) => {
          const path = fileOf(content);
          const outcome = await inspectList(path)
            .then(({ reading }) => checkList(path, reading, new RowTally()))
            .catch((error: unknown) => error);
          if (outcome instanceof Error) expect(outcome).toBeInstanceOf(OperationalError);
          else expect(importCheck.parse(outcome).rows.total).toBeGreaterThanOrEqual(0);
        }),
        { numRuns: FILES },
      );
    },
    timeout,
  );
});

describe('generated lists sent to the server', () => {
  let server: ApiServer;
  let librarian: ApiClient;
  beforeAll(async () => {
    server = await startApiServer();
    librarian = await server.newcomer();
  });
  afterAll(() => server.close());

  it(
    'are always answered clearly, and leave memory as it was',
    async () => {
      const regionId = await addRegion(librarian);
      const send = async (content: Buffer) => {
        const sent = await sendList(librarian, regionId, content);
        expect([201, 400]).toContain(sent.status);
        if (sent.status === 400) return void problem.parse(sent.body);
        const path = `/api/regions/${regionId}/imports/${importProposal.parse(sent.body).id}`;
        const checked = await librarian.put(path, {});
        expect([200, 400]).toContain(checked.status);
        (checked.status === 200 ? importCheck : problem).parse(checked.body);
        await librarian.delete(path).expect(204);
      };
      const runs = fc.sample(spoiltList, Math.ceil(FILES / 5));
      for (const content of runs.slice(0, 10)) await send(content);
      const before = heapUsed();
      for (const content of runs) await send(content);

      expect(heapUsed() - before).toBeLessThan(40 * 1024 * 1024);
    },
    timeout,
  );
});

/** Memory in use once all that can be freed is. */
function heapUsed(): number {
  setFlagsFromString('--expose-gc');
  (runInNewContext('gc') as () => void)();
  return process.memoryUsage().heapUsed;
}
