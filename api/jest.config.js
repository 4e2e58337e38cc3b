/**
 * One Jest for everything that runs on the server: the API, the levels package, the fakes and the seeds.
 * swc does not check types; lint does.
 */
module.exports = {
  testEnvironment: 'node',
  rootDir: '..',
  roots: [
    '<rootDir>/api/src',
    '<rootDir>/api/levels',
    '<rootDir>/api/test',
    '<rootDir>/fakes',
    '<rootDir>/seeds',
  ],
  testRegex: '\\.spec\\.ts$',
  testPathIgnorePatterns: ['/node_modules/', '/dist/'],
  modulePathIgnorePatterns: ['/dist/'],
  globalSetup: '<rootDir>/api/test/global-setup.ts',
  globalTeardown: '<rootDir>/api/test/global-teardown.ts',
  testTimeout: 30_000,
  // The workspace packages are read from their sources, so no build has to come first.
  testEnvironmentOptions: { customExportConditions: ['@ferrite-row/source', 'node', 'node-addons'] },
  transform: {
    '^.+\\.ts$': [
      '@swc/jest',
      {
        jsc: {
          parser: { syntax: 'typescript', decorators: true },
          transform: { legacyDecorator: true, decoratorMetadata: true },
          target: 'es2022',
          keepClassNames: true,
        },
        module: { type: 'commonjs' },
      },
    ],
  },
};
