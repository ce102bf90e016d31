import boundaries from 'eslint-plugin-boundaries'
import importX from 'eslint-plugin-import-x'
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript'
import next from 'eslint-config-next'
import prettier from 'eslint-config-prettier'
import tseslint from 'typescript-eslint'

const is = (...types) => ({ element: { types: { anyOf: types } } })
const packages = (...source) => ({
  module: { origin: ['external', 'core'], ...(source.length && { source }) },
})
const may = (from, ...to) => ({ from: is(from), allow: { to: is(from, ...to) } })
const mustNot = (from, ...source) => ({ from: is(...from), disallow: { to: packages(...source) } })
const server = ['db', 'gateways', 'platform', 'use-cases', 'jobs']

/** Imports run one way: app, jobs -> use-cases -> repositories, gateways -> pure subjects. */
const layers = {
  default: 'disallow',
  checkAllOrigins: true,
  policies: [
    may('domain'),
    may('platform', 'domain'),
    may('db', 'domain', 'platform'),
    may('gateways', 'domain', 'platform'),
    may('use-cases', 'domain', 'db', 'gateways', 'platform'),
    may('components', 'domain'),
    may('app', 'components', 'domain', 'use-cases', 'platform'),
    may('jobs', 'domain', 'use-cases', 'platform'),
    may('fakes'),
    may('scripts', 'db'),
    may(
      'tests',
      'fakes',
      'domain',
      'db',
      'gateways',
      'use-cases',
      'platform',
      'jobs',
      'components',
      'app',
      'scripts',
    ),
    { from: is('app', 'components', 'fakes', 'tests', 'scripts', ...server), allow: { to: packages() } },
    {
      from: is('domain'),
      allow: { to: packages('zod', 'date-fns', '@date-fns/tz', 'proj4', 'supercluster') },
    },
    mustNot(server, 'next', 'react', 'react-dom'),
    mustNot(['app', 'components', 'gateways', 'platform', 'use-cases', 'jobs'], 'knex'),
  ],
}

/** A pure subject takes today as an argument, and knows no clock, chance or network. */
const impure = [
  {
    selector: "NewExpression[callee.name='Date'][arguments.length=0]",
    message: 'Take today as an argument.',
  },
  {
    selector: "CallExpression[callee.object.name='Date'][callee.property.name='now']",
    message: 'Take today as an argument.',
  },
  {
    selector: "CallExpression[callee.object.name='Math'][callee.property.name='random']",
    message: 'A pure subject takes no chances.',
  },
]
const vague = [
  'utils',
  'util',
  'helpers',
  'helper',
  'misc',
  'common',
  'service',
  'manager',
  'data',
  'index',
].map((name) => ({
  selector: `ImportDeclaration[source.value=/\\u002F${name}$/]`,
  message: `A file is called what it exports, not "${name}".`,
}))
const clientInApp = {
  selector: "ExpressionStatement[directive='use client']",
  message: 'Client components live in components/ and get their actions as props.',
}
/** A later block replaces this rule and does not add to it, so each block names all that holds in it. */
const noSyntax = (...selectors) => ({ 'no-restricted-syntax': ['error', ...vague, ...selectors] })

export default tseslint.config(
  { ignores: ['node_modules/**', '.next/**', '.data/**', 'next-env.d.ts', 'coverage/**', 'reports/**'] },
  ...next,
  ...tseslint.configs.recommended,
  {
    files: ['**/*.{ts,tsx,mjs}'],
    rules: {
      'max-lines': ['error', { max: 250, skipBlankLines: true, skipComments: true }],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
      'no-console': 'error',
    },
  },
  {
    files: ['{app,components,lib,db,jobs,fakes,tests}/**/*.{ts,tsx}'],
    plugins: { boundaries, 'import-x': importX },
    settings: {
      'import/resolver': { typescript: true },
      'import-x/resolver-next': [createTypeScriptImportResolver()],
      'import-x/extensions': ['.ts', '.tsx'],
      'import-x/parsers': { '@typescript-eslint/parser': ['.ts', '.tsx'] },
      // in this order, and from the root: tests/db is tests, lib/use-cases/jobs is a use-case
      'boundaries/elements': [
        { type: 'use-cases', pattern: 'lib/use-cases' },
        { type: 'gateways', pattern: 'lib/gateways' },
        { type: 'platform', pattern: 'lib/platform' },
        { type: 'domain', pattern: 'lib/*' },
        ...['app', 'components', 'db', 'jobs', 'fakes', 'scripts', 'tests'].map((name) => ({
          type: name,
          pattern: name,
        })),
      ].map((element) => ({ ...element, partialMatch: false })),
    },
    rules: {
      'boundaries/dependencies': ['error', layers],
      'boundaries/no-unknown-files': 'error',
      'import-x/no-cycle': 'error',
      ...noSyntax(),
    },
  },
  {
    files: ['lib/**/*.{ts,tsx}'],
    ignores: ['lib/{use-cases,gateways,platform}/**'],
    rules: {
      'no-restricted-globals': ['error', 'fetch', 'process', 'window', 'document', 'localStorage'],
      ...noSyntax(...impure),
    },
  },
  {
    files: ['{app,components,db,jobs,lib}/**/*.{ts,tsx}'],
    ignores: ['lib/platform/env.ts'],
    rules: {
      'no-restricted-properties': [
        'error',
        { object: 'process', property: 'env', message: 'Read settings through lib/platform/env.ts.' },
      ],
    },
  },
  {
    files: ['app/**/*.{ts,tsx}'],
    ignores: ['app/**/error.tsx', 'app/global-error.tsx'],
    rules: noSyntax(clientInApp),
  },
  {
    files: [
      'scripts/**',
      'jobs/*-file.ts',
      'jobs/verify-audit.ts',
      'db/migrate.ts',
      'jobs/seed-demo.ts',
      'tests/bench/**',
      'tests/unit/fail-on-console-error.ts',
    ],
    rules: { 'no-console': 'off' },
  },
  {
    // a parameter called useCase is no hook; hooks live in components/
    files: ['{app,db,jobs,lib,tests}/**/*.ts'],
    rules: { 'react-hooks/rules-of-hooks': 'off' },
  },
  { files: ['*.config.mjs'], rules: { 'import/no-anonymous-default-export': 'off' } },
  prettier,
)
