import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'
import { writeEngineVersion } from './scripts/engine-version.mjs'

writeEngineVersion()

const root = { find: /^@\//, replacement: fileURLToPath(new URL('./', import.meta.url)) }

export default defineConfig({
  test: {
    projects: [
      {
        resolve: { alias: [root] },
        test: {
          name: 'node',
          environment: 'node',
          include: ['tests/**/*.test.ts'],
          exclude: ['tests/e2e/**'],
          // Lint and type-check run inside some tests, and two cores are shared with others.
          testTimeout: 30_000,
          hookTimeout: 30_000,
          benchmark: { include: ['tests/bench/**/*.bench.ts'] },
        },
      },
      {
        resolve: { alias: [root] },
        test: {
          name: 'e2e',
          environment: 'node',
          include: ['tests/e2e/**/*.test.ts'],
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 120_000,
          benchmark: { include: [] },
        },
      },
      {
        define: { __DEV__: 'true', 'process.env.EXPO_OS': '"web"' },
        resolve: {
          mainFields: ['browser', 'module', 'main'],
          alias: [root, { find: /^react-native$/, replacement: 'react-native-web' }],
          extensions: [
            '.web.tsx',
            '.web.ts',
            '.web.jsx',
            '.web.js',
            '.mjs',
            '.js',
            '.mts',
            '.ts',
            '.jsx',
            '.tsx',
            '.json',
          ],
        },
        test: {
          name: 'ui',
          environment: 'jsdom',
          testTimeout: 30_000,
          globals: true, // lets @testing-library/react clean up after each test
          include: ['tests/**/*.test.tsx'],
          server: { deps: { inline: [/@testing-library/, /react-native/, /@expo\//, /expo-/] } },
          benchmark: { include: [] },
        },
      },
    ],
  },
})
