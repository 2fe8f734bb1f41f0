import { spawnSync } from 'node:child_process'
import { mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

const ROOT = fileURLToPath(new URL('../../', import.meta.url))

export const demoFile = join(ROOT, 'db/seed/demo-layout.json')
export const exampleFile = join(ROOT, 'docs/example-layout.json')

export const temporaryFolder = (): string => mkdtempSync(join(tmpdir(), 'layout-'))

export function temporaryFile(content: string): string {
  const path = join(temporaryFolder(), 'layout.json')
  writeFileSync(path, content)
  return path
}

/** Runs a command as somebody in a terminal does: `npm run -s <name> -- <args>`. */
export function runNpm(name: 'check' | 'propose' | 'schedule', args: readonly string[]) {
  const { status, stdout, stderr } = spawnSync('npm', ['run', '-s', name, '--', ...args], {
    cwd: ROOT,
    encoding: 'utf8',
    maxBuffer: 100_000_000,
  })
  return { status, stdout, stderr }
}
