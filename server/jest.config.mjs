/** Server tests: ES modules through ts-jest; types are checked by tsc, not here. */
export default {
  testEnvironment: 'node',
  testMatch: ['<rootDir>/{src,seeds,test}/**/*.spec.{ts,tsx}', '<rootDir>/test/**/*.e2e-spec.ts'],
  extensionsToTreatAsEsm: ['.ts', '.tsx'],
  moduleNameMapper: {
    '^(\\.{1,2}/.*)\\.js$': '$1',
    '^content-disposition$': '<rootDir>/test/native-content-disposition.cjs',
  },
  transform: {
    '^.+\\.tsx?$': ['ts-jest', { useESM: true, tsconfig: '<rootDir>/tsconfig.spec.json', diagnostics: false }],
  },
  testTimeout: 30_000,
  maxWorkers: 2,
  globalSetup: '<rootDir>/test/global-setup.mjs',
  globalTeardown: '<rootDir>/test/global-teardown.mjs',
};
