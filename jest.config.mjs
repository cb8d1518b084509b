import presets from 'jest-preset-angular/presets/index.js';

const moduleFileExtensions = ['ts', 'js', 'mjs', 'json'];
const typescript = { '^.+\\.ts$': ['ts-jest', { tsconfig: 'tsconfig.spec.json' }] };

/** Packages published as ES modules only: Jest runs CommonJS, so these are transformed too. */
const esmPackages = [
  'd3-geo',
  'd3-geo-projection',
  'd3-array',
  'internmap',
  'fast-check',
  'pure-rand',
  'three',
  'csv-parse',
];
const transformIgnorePatterns = [`/node_modules/(?!(?:${esmPackages.join('|')})/|.*\\.mjs$)`];

/** Tests run in a sandbox where looking up a global is slow: this one is asked for millions of times. */
const sandboxInjectedGlobals = ['Math'];

const threeModule = { '^three$': '<rootDir>/node_modules/three/build/three.module.js' };

/** Pure or server code: no DOM. Plain JavaScript (ES-module packages) goes through esbuild, which is quick. */
const node = name => ({
  displayName: name,
  testEnvironment: 'node',
  testMatch: [`<rootDir>/test/${name}/**/*.test.ts`],
  moduleFileExtensions,
  moduleNameMapper: threeModule,
  sandboxInjectedGlobals,
  transformIgnorePatterns,
  transform: { ...typescript, '^.+\\.m?js$': '<rootDir>/test/support/esbuild-transform.cjs' },
});

export default {
  projects: [
    node('shared'),
    node('server'),
    {
      ...presets.createCjsPreset({
        tsconfig: '<rootDir>/tsconfig.spec.json',
        processWithEsbuild: ['**/node_modules/three/**/*.js'],
      }),
      displayName: 'client',
      testMatch: ['<rootDir>/test/src/**/*.test.ts', '<rootDir>/src/**/*.test.ts'],
      setupFilesAfterEnv: ['<rootDir>/test/support/angular-setup.ts'],
      moduleNameMapper: threeModule,
      sandboxInjectedGlobals,
      transformIgnorePatterns: ['/node_modules/(?!three/|.*\\.mjs$)'],
    },
  ],
};
