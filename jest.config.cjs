/** One configuration for all projects; sources are read by alias, so nothing needs a build before the tests. */
const swc = (tsx) => [
  '@swc/jest',
  {
    swcrc: false,
    sourceMaps: 'inline',
    module: { type: 'commonjs' },
    jsc: {
      target: 'es2022',
      keepClassNames: true,
      parser: { syntax: 'typescript', tsx, decorators: true },
      transform: { legacyDecorator: true, decoratorMetadata: true, react: { runtime: 'automatic' } },
    },
  },
];
const base = {
  transform: { '^.+\\.ts$': swc(false), '^.+\\.tsx$': swc(true) },
  moduleNameMapper: {
    '^@bellgap/common/(.*)$': '<rootDir>/../common/src/$1',
    '^@bellgap/database$': '<rootDir>/../database/src',
  },
  modulePathIgnorePatterns: ['<rootDir>/dist/', '<rootDir>/dist-[a-z]+/'],
  testMatch: ['**/*.spec.ts', '**/*.spec.tsx', '**/*.e2e-spec.ts'],
};

/** One PostgreSQL cluster a run, for the projects that ask for it. */
const withDatabase = {
  globalSetup: `${__dirname}/database/src/testing/global-setup.ts`,
  globalTeardown: `${__dirname}/database/src/testing/global-teardown.ts`,
};
module.exports = {
  // Enough for a busy machine; what is slow on a quiet one shows in the times.
  testTimeout: 120_000,
  projects: [
    { ...base, displayName: 'common', rootDir: 'common' },
    { ...base, ...withDatabase, displayName: 'database', rootDir: 'database' },
    { ...base, ...withDatabase, displayName: 'backend', rootDir: 'backend' },
    {
      ...base,
      displayName: 'frontend',
      rootDir: 'frontend',
      testEnvironment: 'jsdom',
      testPathIgnorePatterns: ['<rootDir>/e2e/'],
      setupFiles: ['<rootDir>/jest.polyfills.cjs'],
      setupFilesAfterEnv: ['<rootDir>/jest.setup.ts'],
      moduleNameMapper: {
        ...base.moduleNameMapper,
        '\\.css$': '<rootDir>/jest.css.cjs',
        '^@ant-design/colors/es/(.*)$': '<rootDir>/../node_modules/@ant-design/colors/lib/$1',
      },
    },
    {
      ...base,
      ...withDatabase,
      displayName: 'browser',
      rootDir: 'frontend/e2e',
      moduleNameMapper: {
        '^@bellgap/common/(.*)$': '<rootDir>/../../common/src/$1',
        '^@bellgap/database$': '<rootDir>/../../database/src',
      },
    },
  ],
};
