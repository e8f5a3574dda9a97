import { problem } from '../../shared/contracts/problem.ts';
import { isRepeatable, type Route } from '../http/route.ts';
import { faultsOf } from './route-faults.ts';
import { schemaOf } from './schema.ts';

type Json = Record<string, unknown>;

const PROBLEM = { $ref: '#/components/schemas/Problem' };

/** The whole API as OpenAPI 3.1, made from the rows that serve it. */
export function describeApi(routes: readonly Route[], sessionCookie: string): Json {
  const paths: Record<string, Json> = {};
  for (const row of routes) {
    const path = row.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [row.method]: operationOf(row) };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Fallow',
      version: '1',
      description:
        'Frequencies are whole hertz, levels dB, fields dB(µV/m), powers watts. Every GET hands out ' +
        'the cookie XSRF-TOKEN; calls that change something send its value back in X-XSRF-TOKEN.',
    },
    paths,
    components: {
      schemas: { Problem: schemaOf(problem, 'output') },
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: sessionCookie },
        requestToken: { type: 'apiKey', in: 'header', name: 'X-XSRF-TOKEN' },
      },
    },
  };
}

function operationOf(row: Route): Json {
  return {
    operationId: `${row.method}${row.path.replace(/\W+(\w)/g, (_all, first: string) => first.toUpperCase())}`,
    summary: row.summary,
    tags: [row.path.split('/')[2]],
    'x-least-role': row.access,
    security: securityOf(row),
    parameters: parametersOf(row),
    ...requestBodyOf(row),
    responses: responsesOf(row),
  };
}

function parametersOf(row: Route): Json[] {
  const inPath = [...row.path.matchAll(/:(\w+)/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: name === 'token' ? { type: 'string' } : { type: 'integer', minimum: 1 },
  }));
  return [...inPath, ...queryParametersOf(row), ...headersOf(row)];
}

function queryParametersOf({ query }: Route): Json[] {
  if (!query) return [];
  const { properties = {}, required = [] } = schemaOf(query, 'input');
  return Object.entries(properties).map(([name, schema]) => ({
    name,
    in: 'query',
    required: required.includes(name),
    schema,
  }));
}

function headersOf(row: Route): Json[] {
  if (!isRepeatable(row)) return [];
  return [
    {
      name: 'Idempotency-Key',
      in: 'header',
      required: false,
      description: 'Made anew for each creation; the same key within a day creates once.',
      schema: { type: 'string', minLength: 1, maxLength: 255 },
    },
  ];
}

/** Ways to be let in: any one of them suffices. */
function securityOf({ access, method }: Route): Json[] {
  const token = method === 'get' ? {} : { requestToken: [] };
  const signedIn = { session: [], ...token };
  return access === 'visitor' ? [token, signedIn] : [signedIn];
}

function requestBodyOf({ body, upload }: Route): Json {
  const content = (media: string, schema: unknown) => ({
    requestBody: { required: true, content: { [media]: { schema } } },
  });
  if (body) return content('application/json', schemaOf(body, 'input'));
  if (!upload) return {};
  const file = { type: 'string', contentMediaType: 'application/octet-stream' };
  return content('multipart/form-data', {
    type: 'object',
    properties: { [upload]: file },
    required: [upload],
  });
}

function responsesOf(row: Route): Json {
  const success: Json = { description: 'Done' };
  if (row.produces) success['content'] = { [row.produces]: {} };
  if (row.answer) {
    success['content'] = { 'application/json': { schema: schemaOf(row.answer, 'output') } };
  }
  const responses: Json = { [row.status ?? 200]: success };
  for (const [status, description] of faultsOf(row)) {
    responses[status] = {
      description,
      content: { 'application/problem+json': { schema: PROBLEM } },
    };
  }
  return responses;
}
