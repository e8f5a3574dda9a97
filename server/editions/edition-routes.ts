import { differencesAnswer, differencesQuery } from '../../shared/contracts/edition-differences.ts';
import { receiverVerdicts, verdictsRequest } from '../../shared/contracts/edition-verdicts.ts';
import { pageOf, pageQuery } from '../../shared/contracts/paging.ts';
import { edition, editionChange } from '../../shared/contracts/region.ts';
import {
  correctionsQuery,
  listedStation,
  oneStationQuery,
  placesQuery,
  stationPlaces,
  stationQuery,
} from '../../shared/contracts/station-list.ts';
import { whenClientLeaves } from '../http/computed-answer.ts';
import { sendCsv } from '../http/csv-answer.ts';
import { route, type Route } from '../http/route.ts';
import type { EditionDifferences } from './edition-differences.ts';
import type { EditionStations } from './edition-stations.ts';
import type { EditionVerdicts } from './edition-verdicts.ts';
import type { Editions } from './editions.ts';
import { stationRows } from './station-csv.ts';
import type { StationLists } from './station-lists.ts';

/** What is made of an edition's stations. */
export interface EditionViews {
  readonly stations: EditionStations;
  readonly stationLists: StationLists;
  readonly differences: EditionDifferences;
  readonly verdicts: EditionVerdicts;
}

const one = '/api/editions/:id';

export const editionRoutes = (editions: Editions, views: EditionViews): Route[] => [
  route({
    method: 'get',
    path: '/api/editions',
    summary: 'The editions of all regions of the workshop, the newest first',
    access: 'member',
    query: pageQuery,
    answer: pageOf(edition),
    handle: ({ actor, query }) => editions.list(actor, query),
  }),
  route({
    method: 'get',
    path: '/api/regions/:id/editions',
    summary: 'The editions of a region, the newest first',
    access: 'member',
    query: pageQuery,
    answer: pageOf(edition),
    faults: [404],
    handle: ({ actor, id, query }) => editions.listOf(actor, id(), query),
  }),
  route({
    method: 'get',
    path: one,
    summary: 'An edition',
    access: 'member',
    answer: edition,
    faults: [404],
    handle: ({ actor, id }) => editions.get(actor, id()),
  }),
  route({
    method: 'put',
    path: one,
    summary: 'Change label, date and note of an edition; its stations stay as they were imported',
    access: 'librarian',
    body: editionChange,
    answer: edition,
    faults: [404],
    handle: ({ actor, id, body }) => editions.change(actor, id(), body),
  }),
  route({
    method: 'delete',
    path: one,
    summary: 'Delete an edition, unless a plan was judged against it',
    access: 'librarian',
    status: 204,
    faults: [404, 409],
    handle: ({ actor, id }) => editions.remove(actor, id()),
  }),
  ...stationRoutes(views),
  ...comparisonRoutes(views),
];

const stationRoutes = ({ stations, stationLists }: EditionViews): Route[] => [
  route({
    method: 'get',
    path: `${one}/stations`,
    summary:
      'The stations of an edition, corrected by hand unless asked otherwise: searched, filtered, sorted; with a site, how far and how strong there',
    access: 'member',
    query: stationQuery,
    answer: pageOf(listedStation),
    faults: [404],
    handle: ({ actor, id, query, response }) =>
      stationLists.page(actor, id(), query, whenClientLeaves(response)),
  }),
  route({
    method: 'get',
    path: `${one}/stations/places`,
    summary:
      'The strongest stations found that have a place, as a map shows them; 20000 at the most',
    access: 'member',
    query: placesQuery,
    answer: stationPlaces,
    faults: [404],
    handle: ({ actor, id, query, response }) =>
      stationLists.places(actor, id(), query, whenClientLeaves(response)),
  }),
  route({
    method: 'get',
    path: `${one}/stations/:stationId`,
    summary: 'A station of an edition, with what was corrected of it',
    access: 'member',
    query: oneStationQuery,
    answer: listedStation,
    faults: [404],
    handle: ({ actor, id, query }) => stationLists.one(actor, id(), id('stationId'), query),
  }),
  route({
    method: 'get',
    path: `${one}/stations.csv`,
    summary: 'All stations of an edition as a file that imports back the same',
    access: 'member',
    query: correctionsQuery,
    produces: 'text/csv',
    faults: [404],
    handle: async ({ actor, id, query, response }) => {
      const { rows } = await stationRows(stations, actor, id(), query.corrections);
      await sendCsv(response, `stations-${id()}.csv`, rows);
    },
  }),
];

const comparisonRoutes = ({ differences, verdicts }: EditionViews): Route[] => [
  route({
    method: 'get',
    path: `${one}/differences`,
    summary: 'What changed in an edition against another of its region, by frequency',
    access: 'member',
    query: differencesQuery,
    answer: differencesAnswer,
    faults: [404],
    handle: ({ actor, id, query }) => differences.page(actor, id(), query),
  }),
  route({
    method: 'post',
    path: `${one}/verdicts`,
    summary: 'Which receivers of the workshop change verdict by an edition against another',
    access: 'member',
    body: verdictsRequest,
    answer: pageOf(receiverVerdicts),
    computing: true,
    faults: [404, 429],
    handle: ({ actor, id, body, response }) =>
      verdicts.judge(actor, id(), body, whenClientLeaves(response)),
  }),
];
