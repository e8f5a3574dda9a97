/** What the docstrings of the engine's functions say, read with the TypeScript compiler. */
import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';

import ts from 'typescript';

/** An exported function and its docstring. */
export interface DocumentedFunction {
  readonly file: string;
  readonly name: string;
  readonly description: string;
  readonly tags: readonly string[];
  /** The function's docstring with that of its module, which may tell the source for all in it. */
  readonly text: string;
  readonly throws: boolean;
  /** Takes an object of the engine's own classes, alone or within another: a step of a computation. */
  readonly isStep: boolean;
  readonly examples: readonly string[];
}

type Functional = ts.FunctionDeclaration | ts.ArrowFunction | ts.FunctionExpression;

/** Every source file under a folder, its tests left out. */
export const sourcesUnder = (folder: string): string[] =>
  readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.ts') && !name.endsWith('.spec.ts'))
    .map((name) => join(folder, name))
    .sort();

/** Every exported function under a folder. */
export function documentedFunctions(folder: string): DocumentedFunction[] {
  const files = sourcesUnder(folder).map((path) =>
    ts.createSourceFile(path, readFileSync(path, 'utf8'), ts.ScriptTarget.ESNext, true),
  );
  const inner = innerTypes(files.flatMap(({ statements }) => [...statements]));
  return files.flatMap((file) =>
    exported(file).map(([name, node, documented]) => ({
      file: relative(folder, file.fileName),
      name,
      ...docstringOf(documented),
      text: `${moduleDoc(file)}\n${documented.getFullText()}`,
      throws: /\bthrow new /.test(node.getText()),
      isStep: node.parameters.some(({ type }) => type && namesAny(type, inner)),
    })),
  );
}

/** Names of the engine's classes, and of the types that hold an object of one. */
function innerTypes(statements: readonly ts.Statement[]): ReadonlySet<string> {
  const names = new Set(
    statements.filter(ts.isClassDeclaration).flatMap(({ name }) => (name ? [name.text] : [])),
  );
  const types = statements.filter(
    (each) => ts.isInterfaceDeclaration(each) || ts.isTypeAliasDeclaration(each),
  );
  for (let before = -1; before < names.size;) {
    before = names.size;
    for (const type of types) {
      if (ts.forEachChild(type, (child) => namesAny(child, names) || undefined)) {
        names.add(type.name.text);
      }
    }
  }
  return names;
}

function exported(file: ts.SourceFile): [string, Functional, ts.Statement][] {
  return file.statements.filter(isExported).flatMap((statement) => {
    if (ts.isFunctionDeclaration(statement) && statement.name) {
      return [[statement.name.text, statement, statement]];
    }
    if (!ts.isVariableStatement(statement)) return [];
    return statement.declarationList.declarations.flatMap(
      ({ name, initializer }): [string, Functional, ts.Statement][] =>
        initializer && (ts.isArrowFunction(initializer) || ts.isFunctionExpression(initializer))
          ? [[name.getText(), initializer, statement]]
          : [],
    );
  });
}

const isExported = (statement: ts.Statement): boolean =>
  ts.canHaveModifiers(statement) &&
  (ts.getModifiers(statement) ?? []).some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword);

function docstringOf(node: ts.Node): Pick<DocumentedFunction, 'description' | 'tags' | 'examples'> {
  const tags = ts.getJSDocTags(node);
  const comments = ts.getJSDocCommentsAndTags(node).filter(ts.isJSDoc);
  return {
    description: comments.map(({ comment }) => ts.getTextOfJSDocComment(comment) ?? '').join('\n'),
    tags: tags.map(({ tagName }) => tagName.text),
    examples: tags
      .filter(({ tagName }) => tagName.text === 'example')
      .map(({ comment }) => ts.getTextOfJSDocComment(comment) ?? ''),
  };
}

/** The comment at a file's head that names its module. */
const moduleDoc = ({ text }: ts.SourceFile): string =>
  /^\/\*\*[^]*?@module[^]*?\*\//.exec(text)?.[0] ?? '';

function namesAny(node: ts.Node, names: ReadonlySet<string>): boolean {
  if (ts.isIdentifier(node) && names.has(node.text)) return true;
  return ts.forEachChild(node, (child) => namesAny(child, names) || undefined) ?? false;
}
