import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import typescript from 'typescript-eslint';

const TESTS = [
  '**/*.spec.{ts,tsx}',
  '**/*.e2e-spec.ts',
  '**/test/**',
  '**/testing/**',
  'frontend/e2e/**',
  'frontend/jest.setup.ts',
];

/** Imports that a file may not have; `group` are patterns as in .gitignore, `regex` expressions. */
const noImports = (...patterns) => ({ 'no-restricted-imports': ['error', { patterns }] });
const noWorkspace = (names, message) => ({ regex: `^@bellgap/(${names})(/|$)`, message });
const noBuiltIns = {
  regex: '^(node:|(assert|buffer|child_process|crypto|fs|http|https|net|os|path|process|stream|url|util)(/|$))',
  message: 'What both sides share does no input or output.',
};

/** Parts of a tests's call that leave tests out. */
const NO_SKIPPED_TESTS = [
  {
    selector: 'MemberExpression[object.name=/^(it|test|describe)$/][property.name=/^(only|skip|todo|failing)$/]',
    message: 'No test stands alone and none is left out.',
  },
  {
    selector: 'CallExpression[callee.name=/^(fit|xit|xtest|fdescribe|xdescribe)$/]',
    message: 'No test stands alone and none is left out.',
  },
];
const NO_DEFAULT_EXPORT = { selector: 'ExportDefaultDeclaration', message: 'Named exports only.' };

/** Backend features meet at services and modules; what all share stands in platform. `up` leads to the folder of features. */
const otherFeaturesInsides = (up) => ({
  regex: `^${'\\.\\./'.repeat(up)}(?!platform/|\\.)[^/]+/(?!([^/]+/)*[^/]+\\.(service|module)$)`,
  message: 'Of another feature only the service or the module; what all share stands in platform.',
});

/** Frontend features know app, ui, api and themselves. */
const otherFeatures = (up) => ({
  regex: `^${'\\.\\./'.repeat(up)}(?!app/|ui/|api/|testing/|\\.)[^/]+/`,
  message: 'A feature of the frontend imports no other feature; shared parts stand in ui.',
});

export default typescript.config(
  {
    ignores: ['**/dist/**', '**/dist-*/**', '**/node_modules/**', '.run/**', '.data/**', 'shots/**', 'coverage/**'],
  },
  js.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    extends: [typescript.configs.recommendedTypeChecked],
    languageOptions: {
      parserOptions: {
        projectService: { allowDefaultProject: ['frontend/vite.config.ts', 'frontend/jest.setup.ts'] },
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-restricted-syntax': ['error', ...NO_SKIPPED_TESTS, NO_DEFAULT_EXPORT],
      '@typescript-eslint/require-await': 'off',
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true, allowBoolean: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
      // A query builder of Knex is awaitable, and its callbacks return it.
      '@typescript-eslint/no-misused-promises': [
        'error',
        { checksVoidReturn: { attributes: false, arguments: false } },
      ],
      // Rows of a query are given their type where they are read.
      '@typescript-eslint/no-unnecessary-type-assertion': 'off',
      '@typescript-eslint/no-extraneous-class': 'off',
    },
  },
  {
    files: ['**/*.{mjs,cjs,js}'],
    languageOptions: { globals: globals.node },
  },
  { files: ['**/*.cjs'], languageOptions: { sourceType: 'commonjs' } },
  { files: ['frontend/jest.*.cjs'], languageOptions: { globals: globals.browser } },

  // common: what both sides speak
  {
    files: ['common/src/**/*.ts'],
    ignores: TESTS,
    rules: noImports(noWorkspace('frontend|backend|database', 'common knows neither side.'), noBuiltIns),
  },
  {
    files: ['common/src/engine/**/*.ts'],
    ignores: TESTS,
    rules: {
      ...noImports(noWorkspace('.*', 'The engine knows only itself.'), noBuiltIns, {
        regex: '^(\\.\\./)+(api|schemas|drawing)(/|$)',
        message: 'The engine knows only itself.',
      }),
      'no-restricted-syntax': [
        'error',
        ...NO_SKIPPED_TESTS,
        NO_DEFAULT_EXPORT,
        { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: 'The engine knows no clock.' },
        {
          selector: "MemberExpression[object.name='Date'][property.name='now']",
          message: 'The engine knows no clock.',
        },
        {
          selector: "MemberExpression[object.name='Math'][property.name='random']",
          message: 'The engine knows no chance.',
        },
        { selector: 'MemberExpression[property.name=/^toLocale/]', message: 'The engine knows no locale.' },
        { selector: 'Identifier[name=/^(Intl|process|globalThis)$/]', message: 'The engine knows nothing around it.' },
      ],
    },
  },

  // database: knows no feature; a migration stands for itself and gives the same schema for ever
  {
    files: ['database/**/*.ts'],
    rules: noImports(noWorkspace('.*', 'The database knows no feature.')),
  },
  {
    files: ['database/migrations/**/*.ts'],
    rules: noImports(noWorkspace('.*', 'A migration stands for itself.'), {
      regex: '^\\.',
      message: 'A migration stands for itself.',
    }),
  },

  // backend
  {
    files: ['backend/**/*.ts'],
    rules: noImports(noWorkspace('frontend', 'The backend knows no page.')),
  },
  {
    files: ['backend/src/*/*.ts'],
    ignores: ['backend/src/demo/**', ...TESTS],
    rules: noImports(noWorkspace('frontend', 'The backend knows no page.'), otherFeaturesInsides(1)),
  },
  {
    files: ['backend/src/*/*/*.ts'],
    ignores: ['backend/src/demo/**', ...TESTS],
    rules: noImports(noWorkspace('frontend', 'The backend knows no page.'), otherFeaturesInsides(2)),
  },

  // frontend
  {
    files: ['frontend/src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    languageOptions: { globals: globals.browser },
    // antd hands out its message and modal functions by destructuring.
    rules: {
      ...noImports(...frontendImports()),
      'react-hooks/rules-of-hooks': 'error',
      'react-hooks/exhaustive-deps': 'error',
      '@typescript-eslint/unbound-method': 'off',
    },
  },
  ...[1, 2, 3].map((depth) => ({
    files: [`frontend/src/${'*/'.repeat(depth)}*.{ts,tsx}`],
    ignores: ['frontend/src/app/**', 'frontend/src/testing/**', ...TESTS],
    rules: noImports(
      ...frontendImports(),
      noWorkspace('common/testing', 'What stands in for the server is for tests.'),
      otherFeatures(depth),
    ),
  })),
  {
    files: ['frontend/src/**/*.{ts,tsx}'],
    ignores: ['frontend/src/api/**', ...TESTS],
    rules: {
      'no-restricted-globals': [
        'error',
        ...['fetch', 'XMLHttpRequest'].map((name) => ({ name, message: 'Requests leave through src/api.' })),
        ...['process', 'Buffer', '__dirname'].map((name) => ({ name, message: 'There is no Node.js in a browser.' })),
      ],
      'no-restricted-properties': [
        'error',
        ...['window', 'globalThis'].map((object) => ({
          object,
          property: 'fetch',
          message: 'Requests leave through src/api.',
        })),
      ],
    },
  },

  // tests read answers whose type is their very subject
  {
    files: TESTS.map((pattern) => (pattern.endsWith('**') ? `${pattern}/*.{ts,tsx}` : pattern)),
    rules: {
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
      '@typescript-eslint/unbound-method': 'off',
    },
  },
  {
    files: ['frontend/vite.config.ts', 'database/src/testing/global-*.ts'],
    rules: { 'no-restricted-syntax': ['error', ...NO_SKIPPED_TESTS] },
  },
  prettier,
);

function frontendImports() {
  return [
    noWorkspace('backend|database', 'The frontend knows only common.'),
    noWorkspace(
      'common/engine',
      'The server computes; types and labels reach the frontend through common/api and common/schemas.',
    ),
    { regex: '^(\\.\\./)+common(/|$)', message: 'common is imported by its name.' },
  ];
}
