const expoWeb = require('jest-expo/web/jest-preset');

const esmOnly = (names) => [`/node_modules/(?!(?:${names.join('|')})(?:/|-))`];
const shared = {
  moduleNameMapper: { '^@/(.*)$': '<rootDir>/$1' },
  modulePathIgnorePatterns: ['<rootDir>/dist', '<rootDir>/build', '<rootDir>/.data'],
};

/** @type {import('jest').Config} */
module.exports = {
  // a machine that builds beside the tests is slow, not wrong
  testTimeout: 60_000,
  globalSetup: '<rootDir>/__tests__/support/global-setup.js',
  globalTeardown: '<rootDir>/__tests__/support/global-teardown.js',
  projects: [
    {
      ...shared,
      displayName: 'node',
      testEnvironment: 'node',
      testMatch: ['<rootDir>/__tests__/{api,db,scripts}/**/*.test.ts'],
      transform: {
        '\\.m?[jt]s$': [
          '@swc/jest',
          { jsc: { target: 'es2022', parser: { syntax: 'typescript' } }, module: { type: 'commonjs' } },
        ],
      },
      transformIgnorePatterns: esmOnly([
        'd3',
        'internmap',
        'file-type',
        'strtok3',
        'token-types',
        '@tokenizer',
        'uint8array-extras',
        '@borewit',
      ]),
    },
    {
      ...shared,
      displayName: 'web',
      preset: 'jest-expo/web',
      testMatch: ['<rootDir>/__tests__/{app,components,hooks}/**/*.test.{ts,tsx}'],
      // d3-scale 4.0.3 ships .mjs, which the preset's pattern misses
      transform: { ...expoWeb.transform, '\\.mjs$': expoWeb.transform['\\.[jt]sx?$'] },
      moduleFileExtensions: ['tsx', 'ts', 'jsx', 'js', 'mjs', 'json'],
      transformIgnorePatterns: esmOnly([
        'react-native',
        '@react-native',
        'expo',
        '@expo',
        '@expo-google-fonts',
        'react-navigation',
        '@react-navigation',
        'standard-navigation',
        'd3',
        'internmap',
        '@tanstack',
        'pdfjs-dist',
        'until-async',
      ]),
    },
  ],
};
