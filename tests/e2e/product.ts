import { spawn } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import type { Role } from '@wedgeline/contract'
import { build } from '../../scripts/build.mjs'

/** Longest that starting may take; the demo's passwords are hashed slowly on purpose. */
const START_MS = 60_000
const ROOT = fileURLToPath(new URL('../..', import.meta.url))

export interface SignIn {
  readonly email: string
  readonly password: string
}

/** The product as it runs for people: the built client and the server on one port, with a database of its own. */
export interface Product {
  readonly origin: string
  /** The demo's person for a role alone, as the server printed it. @throws where the demo has none. */
  readonly signInOf: (role: Role) => SignIn
  /** Path of the link that lets the first person in; null where the demo was seeded. */
  readonly invitationPath: string | null
  readonly stop: () => Promise<void>
}

/**
 * Builds the client where it is out of date and starts the server on a free port in a new folder.
 * @throws where either fails, with what the server printed.
 */
export async function startProduct({ withDemo }: { readonly withDemo: boolean }): Promise<Product> {
  if ((await build()) !== 0) throw new Error('The web client could not be built; its message stands above.')
  const folder = mkdtempSync(join(tmpdir(), 'wedgeline-e2e-'))
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
    cwd: ROOT,
    env: {
      ...process.env,
      ...{ PORT: '0', DATA_DIR: folder, SEED_DEMO: withDemo ? '1' : '0', LOG_LEVEL: 'error' },
      ...{ NODE_ENV: 'production', PUBLIC_URL: '' },
    },
  })
  const ended = new Promise<void>((resolve) => child.on('exit', () => resolve()))
  const stop = async () => {
    child.kill('SIGTERM')
    await ended
    rmSync(folder, { recursive: true, force: true })
  }
  const printed = await new Promise<string>((resolve, reject) => {
    let text = ''
    setTimeout(() => reject(new Error(`The server did not start: ${text}`)), START_MS).unref()
    child.stderr.on('data', (part: Buffer) => (text += part.toString()))
    child.stdout.on('data', (part: Buffer) => {
      text += part.toString()
      if (/Wedgeline is at \S+\n/.test(text)) resolve(text)
    })
    void ended.then(() => reject(new Error(`The server ended: ${text}`)))
  })
  const origin = /Wedgeline is at (\S+)/.exec(printed)?.[1] ?? ''
  const people = [...printed.matchAll(/^ {2}(\S+@\S+) {2}(\S+) {2}\((.+)\)$/gm)].map(
    ([, email = '', password = '', roles = '']) => ({ email, password, roles }),
  )
  const link = /http\S+(\/invite\/\S+)/.exec(printed)?.[1] ?? null
  return {
    origin,
    invitationPath: link,
    stop,
    signInOf(role) {
      const person = people.find(({ roles }) => roles.split(', ')[0] === role)
      if (!person) throw new Error(`The server printed no sign-in for ${role}:\n${printed}`)
      return { email: person.email, password: person.password }
    },
  }
}
