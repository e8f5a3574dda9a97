/**
 * Every exported function of the engine says what it computes, what it answers, when it refuses, where
 * it comes from, and gives an example; every example is run.
 *
 * One rule exempts from the example alone: a function that takes an object of one of the engine's own
 * classes is a step within a computation, and has its example in the function that begins it.
 */
import { fileURLToPath } from 'node:url';

import { describe, expect, it } from 'vitest';

import { documentedFunctions, sourcesUnder } from '../support/docstrings.ts';
import * as fixtures from '../support/example-fixtures.ts';
import { runExample } from '../support/docstring-examples.ts';

const folder = fileURLToPath(new URL('../../shared/radio', import.meta.url));
const functions = documentedFunctions(folder);
const SOURCE =
  /Source|common practice|own (model|estimate|rule)|from memory|[Aa]rithmetic|definition/;

const modules = await Promise.all(
  sourcesUnder(folder).map((path) => import(path) as Promise<Record<string, unknown>>),
);
const scope = Object.assign({}, ...modules, fixtures) as Record<string, unknown>;

describe('docstrings of the engine', () => {
  it.each(functions)('$file: $name says all that is to be said', (each) => {
    expect(each.description.trim(), 'a description').not.toBe('');
    expect(each.tags, 'what it answers').toContain('returns');
    if (each.throws) expect(each.tags, 'when it refuses').toContain('throws');
    expect(each.text, 'a source').toMatch(SOURCE);
    if (!each.isStep) expect(each.examples, 'an example').not.toHaveLength(0);
  });

  it.each(functions.filter(({ examples }) => examples.length > 0))(
    '$file: the example of $name is right',
    ({ examples }) => {
      for (const example of examples) {
        const checked = runExample(example, scope);

        expect(checked, 'an expression with its value').not.toHaveLength(0);
        for (const expression of checked) {
          expect(expression, 'each expression has its value').not.toBeNull();
          expect(expression).toMatchObject({ isRight: true });
        }
      }
    },
  );
});
