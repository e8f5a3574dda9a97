/**
 * Runs the examples of docstrings. An example is code whose expression statements each end in a
 * comment that begins with the value: a number, a text, true, false, null, a list, a record of some of
 * the fields, or a complex number like `1 - 2j`. After the value a unit or a word may follow. A number
 * is right when it rounds to the digits that are given.
 */
import { compileFunction } from 'node:vm';

import ts from 'typescript';

/** An expression of an example, what the comment says of it, and what it is. */
export interface CheckedExpression {
  readonly code: string;
  readonly said: string;
  readonly isRight: boolean;
  readonly value: unknown;
}

/** Runs an example with the names it may use; null where an expression has no value beside it. */
export function runExample(
  example: string,
  scope: Readonly<Record<string, unknown>>,
): readonly (CheckedExpression | null)[] {
  const file = ts.createSourceFile('example.ts', example, ts.ScriptTarget.ESNext, true);
  const expressions = file.statements.filter(ts.isExpressionStatement);
  const values = valuesOf(file, expressions, scope);
  return expressions.map((statement, index) => {
    const said = commentAfter(example, statement);
    if (said === null) return null;
    const value = values[index];
    return { code: statement.getText(), said, value, isRight: agrees(value, said) };
  });
}

function valuesOf(
  file: ts.SourceFile,
  expressions: readonly ts.ExpressionStatement[],
  scope: Readonly<Record<string, unknown>>,
): readonly unknown[] {
  const body = file.statements.map((statement) =>
    expressions.some((each) => each === statement)
      ? `values.push(${statement.getText().replace(/;$/, '')});`
      : statement.getText(),
  );
  const script = ts.transpile(['const values = [];', ...body].join('\n'), {
    target: ts.ScriptTarget.ES2022,
  });
  const names = Object.keys(scope);
  const run = compileFunction(`${script}\nreturn values;`, names) as (
    ...given: unknown[]
  ) => unknown[];
  return run(...names.map((name) => scope[name]));
}

function commentAfter(example: string, statement: ts.Statement): string | null {
  const [range] = ts.getTrailingCommentRanges(example, statement.end) ?? [];
  return range ? example.slice(range.pos + 2, range.end).trim() : null;
}

const NUMBER = /^-?(?:\d+(?:\.\d+)?)(?:e-?\d+)?/;
const COMPLEX = /^(-?\d+(?:\.\d+)?) ([+-]) (\d+(?:\.\d+)?)j/;

function agrees(value: unknown, said: string): boolean {
  const complex = COMPLEX.exec(said);
  if (complex) {
    const [, re = '', sign = '', im = ''] = complex;
    const { re: real, im: imaginary } = value as { re: number; im: number };
    return rounds(real, re) && rounds(imaginary, sign === '-' ? `-${im}` : im);
  }
  const number = NUMBER.exec(said)?.[0];
  if (number !== undefined) return rounds(Number(value), number);
  const literal = literalAtStart(said);
  return literal !== null && matches(value, literal);
}

/** The literal that a comment begins with: as much of it as reads as one. */
function literalAtStart(said: string): ts.Expression | null {
  const file = ts.createSourceFile('value.ts', `(${said}`, ts.ScriptTarget.ESNext, true);
  const [first] = file.statements;
  if (!first || !ts.isExpressionStatement(first)) return null;
  const { expression } = first;
  return ts.isParenthesizedExpression(expression) ? expression.expression : null;
}

function matches(value: unknown, literal: ts.Expression): boolean {
  if (ts.isStringLiteralLike(literal)) return value === literal.text;
  if (literal.kind === ts.SyntaxKind.TrueKeyword) return value === true;
  if (literal.kind === ts.SyntaxKind.FalseKeyword) return value === false;
  if (literal.kind === ts.SyntaxKind.NullKeyword) return value === null;
  if (ts.isIdentifier(literal) && literal.text === 'Infinity') return value === Infinity;
  if (ts.isIdentifier(literal) && literal.text === 'undefined') return value === undefined;
  if (ts.isArrayLiteralExpression(literal)) {
    const { elements } = literal;
    return (
      Array.isArray(value) &&
      value.length === elements.length &&
      elements.every((each, index) => matches(value[index], each))
    );
  }
  if (ts.isObjectLiteralExpression(literal)) {
    return literal.properties.every(
      (each) =>
        ts.isPropertyAssignment(each) &&
        matches((value as Record<string, unknown>)[each.name.getText()], each.initializer),
    );
  }
  return NUMBER.test(literal.getText()) && rounds(Number(value), literal.getText());
}

/** Whether a value rounds to a number as it is written. */
function rounds(value: number, written: string): boolean {
  const [digits = '', exponent = '0'] = written.split('e');
  const decimals = digits.split('.')[1]?.length ?? 0;
  const half = 0.5 * 10 ** (Number(exponent) - decimals);
  return Math.abs(value - Number(written)) <= half * (1 + 1e-9);
}
