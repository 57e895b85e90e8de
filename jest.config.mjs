import presets from 'jest-preset-angular/presets/index.js';

const domainAlias = { '^@ligament/domain/(.*)$': '<rootDir>/libs/domain/src/$1' };

/** Node projects run through swc: fast, ES modules, no type check (npm run typecheck does that). */
const node = (displayName, roots) => ({
  displayName,
  rootDir: import.meta.dirname,
  roots: roots.map((root) => `<rootDir>/${root}`),
  testMatch: ['**/*.spec.ts'],
  testEnvironment: 'node',
  extensionsToTreatAsEsm: ['.ts'],
  transform: {
    '^.+\\.ts$': [
      '@swc/jest',
      {
        jsc: { parser: { syntax: 'typescript' }, target: 'es2022' },
        module: { type: 'es6' },
        sourceMaps: 'inline',
      },
    ],
  },
  moduleNameMapper: domainAlias,
});

const angular = presets.createEsmPreset({ tsconfig: '<rootDir>/apps/client/tsconfig.spec.json' });

/** @type {import('jest').Config} */
export default {
  // the machine that runs this may be busy; a test that hangs still ends
  testTimeout: 60_000,
  projects: [
    node('domain', ['libs/domain/src']),
    node('api', ['apps/api/src', 'tests/api', 'tests/support']),
    node('verification', ['tests/verification', 'tests/architecture']),
    {
      ...angular,
      displayName: 'client',
      rootDir: import.meta.dirname,
      roots: ['<rootDir>/apps/client/src'],
      testMatch: ['**/*.spec.ts'],
      setupFilesAfterEnv: ['<rootDir>/apps/client/setup-jest.ts'],
      moduleNameMapper: { ...angular.moduleNameMapper, ...domainAlias },
    },
    { ...node('journeys', ['tests/journeys']), testTimeout: 180_000 },
  ],
};
