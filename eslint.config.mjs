import angular from 'angular-eslint';
import boundaries from 'eslint-plugin-boundaries';
import tseslint from 'typescript-eslint';

/** Parts of the house, the most specific first; each is a folder seen from the root. */
const element = (type, pattern, capture = []) => ({ type, pattern, capture, partialMatch: false });
const elements = [
  element('engine', 'shared/radio'),
  element('contracts', 'shared/contracts'),
  element('core', 'src/app/core'),
  element('ui', 'src/app/ui'),
  element('charts', 'src/app/charts'),
  element('feature', 'src/app/*', ['name']),
  element('http', 'server/http'),
  element('db', 'server/db'),
  element('dev', 'server/dev'),
  element('resource', 'server/*', ['name']),
  element('test', 'test'),
  element('data', 'datasets'),
];

/** Files that belong to no folder of the house: they wire it together. */
const files = [
  { category: 'spec', pattern: '**/*.spec.ts' },
  { category: 'settings', pattern: ['server/config.ts', 'server/logger.ts'] },
  { category: 'wiring', pattern: ['src/*.ts', 'src/app/*.ts', 'server/*.ts'] },
];

const part = (...types) => ({ element: { types: { anyOf: types } } });
const may = (from, ...types) => ({ from: part(from), allow: { to: part(...types) } });
const ownFolder = { captured: { name: '{{ from.element.captured.name }}' } };

/** Who may import whom; whatever is not listed is refused. */
const policies = [
  may('engine', 'engine'),
  may('contracts', 'contracts', 'engine'),
  may('core', 'core', 'contracts', 'engine', 'data'),
  may('ui', 'ui', 'contracts', 'engine'),
  may('charts', 'charts', 'ui', 'contracts', 'engine'),
  may('feature', 'core', 'ui', 'charts', 'contracts', 'engine', 'data'),
  { from: part('feature'), allow: { to: { element: { type: 'feature', ...ownFolder } } } },
  may('http', 'http', 'db', 'contracts'),
  may('db', 'db', 'http', 'contracts'),
  may('resource', 'http', 'db', 'contracts', 'engine', 'data'),
  { from: part('resource'), allow: { to: { element: { type: 'resource', ...ownFolder } } } },
  {
    from: part('resource'),
    allow: { to: part('resource'), dependency: { kind: 'type' } },
  },
  {
    from: part('http', 'db', 'resource'),
    allow: { to: { file: { categories: 'settings' } } },
  },
  { from: part('dev', 'test'), allow: { to: { module: { origin: 'local' } } } },
  { from: { file: { categories: 'wiring' } }, allow: { to: { module: { origin: 'local' } } } },
  { from: { file: { categories: 'spec' } }, allow: { to: part('test', 'data') } },
];

const house = {
  files: ['{shared,src,server,test}/**/*.{ts,mjs}'],
  plugins: { boundaries },
  settings: {
    'boundaries/elements': elements,
    'boundaries/files': files,
    'import/resolver': {
      typescript: {
        project: ['server/tsconfig.json', 'src/tsconfig.app.json'],
        noWarnOnMultipleProjects: true,
      },
    },
  },
  rules: {
    'boundaries/dependencies': ['error', { default: 'disallow', policies }],
    'boundaries/no-unknown-files': 'error',
  },
};

const typescript = {
  files: ['**/*.ts'],
  extends: [...tseslint.configs.strictTypeChecked, ...tseslint.configs.stylisticTypeChecked],
  languageOptions: {
    parserOptions: {
      project: [
        'shared/tsconfig.json',
        'server/tsconfig.json',
        'test/tsconfig.json',
        'src/tsconfig.app.json',
        'src/tsconfig.spec.json',
      ],
      tsconfigRootDir: import.meta.dirname,
    },
  },
  rules: {
    '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
    '@typescript-eslint/dot-notation': ['error', { allowIndexSignaturePropertyAccess: true }],
    '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
    '@typescript-eslint/no-extraneous-class': ['error', { allowWithDecorator: true }],
    '@typescript-eslint/no-unused-vars': [
      'error',
      { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
    ],
    '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
    // Contradicts no-non-null-assertion, which is the stricter of the two.
    '@typescript-eslint/non-nullable-type-assertion-style': 'off',
    // Angular's own option objects are classes; object literals are how they are meant to be given.
    '@typescript-eslint/no-unsafe-class-instance-assignment': 'off',
    eqeqeq: ['error', 'always', { null: 'ignore' }],
    'max-lines': ['error', 400],
    'max-lines-per-function': ['error', { max: 40, skipBlankLines: true, skipComments: true }],
    'no-restricted-syntax': [
      'error',
      {
        selector: "ImportDeclaration[source.value='zod'] > ImportSpecifier",
        message: "Write import * as z from 'zod': the named import does not shake down.",
      },
    ],
  },
};

const client = {
  files: ['src/**/*.ts'],
  extends: [...angular.configs.tsRecommended],
  processor: angular.processInlineTemplates,
  rules: {
    '@angular-eslint/component-selector': [
      'error',
      [
        { type: 'element', prefix: 'app', style: 'kebab-case' },
        { type: 'attribute', prefix: 'app', style: 'camelCase' },
      ],
    ],
    '@angular-eslint/directive-selector': [
      'error',
      { type: 'attribute', prefix: 'app', style: 'camelCase' },
    ],
    '@angular-eslint/prefer-on-push-component-change-detection': 'error',
  },
};

/** Attributes that hold no words for people, beyond those the rule knows itself. */
const WORDLESS_ATTRIBUTES = [
  'accept',
  'appQuantity',
  'aria-describedby',
  'aria-haspopup',
  'aria-labelledby',
  'aria-live',
  'ariaCurrentWhenActive',
  'clip-path',
  'd',
  'displayMode',
  'fact',
  'inputmode',
  'mat-sort-header',
  'matColumnDef',
  'mode',
  'orientation',
  'path',
  'quantity',
  'queryParamsHandling',
  'scope',
  'start',
  'text-anchor',
  'vector-effect',
  'xPosition',
];

const templates = {
  files: ['src/**/*.html'],
  ignores: ['src/index.html'],
  extends: [...angular.configs.templateRecommended, ...angular.configs.templateAccessibility],
  rules: {
    '@angular-eslint/template/i18n': [
      'error',
      {
        checkId: false,
        ignoreTags: ['mat-icon'],
        ignoreAttributes: WORDLESS_ATTRIBUTES,
        boundTextAllowedPattern: '\\W*',
      },
    ],
    '@angular-eslint/template/prefer-control-flow': 'error',
    'max-lines': ['error', 80],
  },
};

/** A table of routes is as long as its resource has routes. */
const routeTables = {
  files: ['server/**/*-routes.ts'],
  rules: { 'max-lines-per-function': 'off' },
};

/** Answers read over HTTP are `any` in tests: the expectations are what checks their shape. */
const specs = {
  files: ['**/*.spec.ts', 'test/**/*.ts'],
  rules: {
    'max-lines-per-function': 'off',
    '@typescript-eslint/no-unsafe-argument': 'off',
    '@typescript-eslint/no-unsafe-assignment': 'off',
    '@typescript-eslint/no-unsafe-call': 'off',
    '@typescript-eslint/no-unsafe-member-access': 'off',
    '@typescript-eslint/no-unsafe-return': 'off',
    '@typescript-eslint/require-await': 'off',
    '@typescript-eslint/unbound-method': 'off',
  },
};

/** Loops over typed arrays: the index is in range by construction, and a check would cost time. */
const loops = {
  files: ['shared/radio/**/*.ts', 'test/{bench,support}/**/*.ts'],
  rules: {
    '@typescript-eslint/no-non-null-assertion': 'off',
    '@typescript-eslint/prefer-for-of': 'off',
  },
};

/** The engine reads no clock, chance, environment, file or network: they come as arguments. */
const pure = {
  files: ['shared/radio/**/*.ts'],
  ignores: ['**/*.spec.ts'],
  rules: {
    'no-restricted-globals': ['error', 'Date', 'performance', 'crypto', 'fetch', 'process'],
    'no-restricted-properties': ['error', { object: 'Math', property: 'random' }],
  },
};

export default tseslint.config(
  { ignores: ['dist/', '.angular/', '.data/', '.screenshots/', 'datasets/'] },
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  typescript,
  client,
  templates,
  routeTables,
  specs,
  loops,
  pure,
  house,
);
