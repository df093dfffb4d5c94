const tsJest = (tsconfig = {}) => ({
  '^.+\\.tsx?$': [
    'ts-jest',
    {
      tsconfig: {
        target: 'ES2022',
        module: 'commonjs',
        moduleResolution: 'node10',
        ignoreDeprecations: '5.0',
        isolatedModules: true,
        esModuleInterop: true,
        experimentalDecorators: true,
        emitDecoratorMetadata: true,
        ...tsconfig,
      },
      diagnostics: false,
    },
  ],
});

/** Packages are tested from source; only worker threads need `dist`. */
const moduleNameMapper = {
  '^@thudline/(contracts|dsp|measure)$': '<rootDir>/packages/$1/src/index.ts',
  '^@thudline/dsp/measuring$': '<rootDir>/packages/dsp/src/measuring.ts',
  '^@thudline/fixtures$': '<rootDir>/fixtures/src/index.ts',
};

const node = (displayName, testMatch) => ({
  displayName,
  rootDir: import.meta.dirname,
  /** Not in the temporary folder, which `npm test` throws away. */
  cacheDirectory: '<rootDir>/node_modules/.cache/jest',
  testEnvironment: 'node',
  /** A global is looked up slowly in jest's sandbox, and measurements call it in every inner loop. */
  sandboxInjectedGlobals: ['Math'],
  testMatch,
  moduleNameMapper,
  transform: tsJest(),
});

export default {
  /** Fails what hangs, and nothing else: a busy machine takes several times as long as a free one. */
  testTimeout: 60_000,
  projects: [
    node('packages', ['<rootDir>/packages/*/src/**/*.spec.ts', '<rootDir>/fixtures/src/**/*.spec.ts']),
    node('local-services', ['<rootDir>/apps/local-services/src/**/*.spec.ts']),
    node('api', ['<rootDir>/apps/api/src/**/*.spec.ts', '<rootDir>/apps/api/test/**/*.e2e-spec.ts']),
    {
      ...node('web', ['<rootDir>/apps/web/src/**/*.spec.{ts,tsx}']),
      testEnvironment: 'jsdom',
      setupFilesAfterEnv: ['<rootDir>/apps/web/jest.setup.ts'],
      transform: tsJest({ jsx: 'react-jsx' }),
    },
  ],
};
