import { cp, mkdir, readFile, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { build } from 'vite'

const ROOT = fileURLToPath(new URL('../../../', import.meta.url))

/**
 * Builds the kit page into a folder that any static server can show: index.html, kit.js and what public/ holds.
 * The product's own build never sees it.
 */
export async function buildKit(outDir: string): Promise<void> {
  await build({
    root: ROOT,
    configFile: false,
    publicDir: false,
    logLevel: 'error',
    define: {
      __DEV__: 'false',
      'process.env.EXPO_OS': '"web"',
      'process.env.NODE_ENV': '"production"',
      global: 'globalThis',
    },
    resolve: {
      mainFields: ['browser', 'module', 'main'],
      alias: [
        { find: /^@\//, replacement: ROOT },
        { find: /^react-native$/, replacement: 'react-native-web' },
        // The page leads nowhere: links are shown and their presses go no further.
        { find: /^expo-router$/, replacement: join(ROOT, 'tests/components/kit/no-router.ts') },
      ],
      extensions: ['.web.tsx', '.web.ts', '.web.js', '.mjs', '.js', '.ts', '.tsx', '.json'],
    },
    build: {
      outDir,
      emptyOutDir: true,
      minify: false,
      rolldownOptions: { input: join(ROOT, 'tests/components/kit/main.tsx'), output: { entryFileNames: 'kit.js' } },
    },
  })
  await mkdir(outDir, { recursive: true })
  await cp(join(ROOT, 'public'), outDir, { recursive: true })
  const page = await readFile(join(ROOT, 'public/index.html'), 'utf8')
  await writeFile(
    join(outDir, 'index.html'),
    page.replace('</body>', '<script type="module" src="/kit.js"></script></body>'),
  )
}
