/** API tests on a real MariaDB (one database per worker) and unit tests beside the code. */
export default {
  rootDir: '.',
  testEnvironment: 'node',
  testEnvironmentOptions: {
    // Reads the sources of `shared`, so that no build stands between a change and its test.
    customExportConditions: ['@fairlead/source', 'require', 'node', 'default'],
  },
  testMatch: ['<rootDir>/test/**/*.e2e-spec.ts', '<rootDir>/src/**/*.spec.ts'],
  testTimeout: 30_000,
  // Two processes and the database already keep a small machine busy.
  maxWorkers: 2,
  transform: {
    '^.+\\.ts$': [
      '@swc/jest',
      {
        jsc: {
          target: 'es2022',
          parser: { syntax: 'typescript', decorators: true },
          transform: {
            legacyDecorator: true,
            decoratorMetadata: true,
            useDefineForClassFields: false,
          },
          keepClassNames: true,
        },
        module: { type: 'commonjs' },
      },
    ],
  },
};
