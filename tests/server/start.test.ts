import { spawn, type ChildProcess } from 'node:child_process'
import { existsSync, mkdtempSync, readFileSync, readdirSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { text } from 'node:stream/consumers'
import { fileURLToPath } from 'node:url'
import { afterEach, describe, expect, test } from 'vitest'
import { readSettings } from '@/server/env'
import { localFiles } from '@/server/files/local-files'
import { localOutbox } from '@/server/mail/local-outbox'

const ROOT = fileURLToPath(new URL('../..', import.meta.url))
const folder = () => mkdtempSync(join(tmpdir(), 'wedgeline-data-'))
const started: ChildProcess[] = []
afterEach(() => {
  for (const child of started.splice(0)) child.kill('SIGKILL')
})

interface Started {
  readonly url: string
  readonly printed: string
  stop(signal: NodeJS.Signals): Promise<number | null>
}

/** Starts the server as `npm start` does and waits until it says where it is. */
function start(environment: Record<string, string>): Promise<Started> {
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
    cwd: ROOT,
    env: { ...process.env, PORT: '0', LOG_LEVEL: 'error', NODE_ENV: 'production', ...environment },
  })
  started.push(child)
  const ended = new Promise<number | null>((resolve) => child.on('exit', resolve))
  return new Promise((resolve, reject) => {
    let printed = ''
    child.stderr.on('data', (part: Buffer) => (printed += part.toString()))
    child.stdout.on('data', (part: Buffer) => {
      printed += part.toString()
      const url = /Wedgeline is at (\S+)/.exec(printed)?.[1]
      const stop = (signal: NodeJS.Signals) => {
        child.kill(signal)
        return ended
      }
      if (url) resolve({ url, printed, stop })
    })
    void ended.then((code) => reject(new Error(`exit ${code}: ${printed}`)))
  })
}

describe('the server, started', () => {
  test('seeds the demo, prints its sign-ins once, lets them in and stops cleanly on SIGTERM', async () => {
    const DATA_DIR = folder()
    const first = await start({ DATA_DIR })
    const signIns = [...first.printed.matchAll(/^ {2}(\S+@\S+) {2}(\S+) {2}\((.+)\)$/gm)]
    expect(signIns.map(([, , , roles]) => roles).sort()).toEqual([
      'admin, detailer',
      'detailer',
      'drafter',
      'engineer',
      'inspector',
    ])
    expect(first.printed).not.toContain('/invite/')
    for (const [, email, password] of signIns) {
      const response = await fetch(`${first.url}/trpc/session.signIn`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json', Origin: first.url },
        body: JSON.stringify({ email, password }),
      })
      expect(response.status).toBe(200)
    }
    expect(await (await fetch(`${first.url}/readyz`)).text()).toBe('ready\n')
    expect(await first.stop('SIGTERM')).toBe(0)
    expect(existsSync(join(DATA_DIR, 'wedgeline.sqlite-wal'))).toBe(false)
    const second = await start({ DATA_DIR })
    expect(second.printed).not.toMatch(/@|\/invite\//)
    expect(await second.stop('SIGINT')).toBe(0)
  }, 120_000)

  test('without the demo prints a one-time link', async () => {
    const server = await start({ DATA_DIR: folder(), SEED_DEMO: '0' })
    const link = /http\S+\/invite\/\S+/.exec(server.printed)?.[0] ?? ''
    expect(link.startsWith(`${server.url}/invite/`)).toBe(true)
    expect(await server.stop('SIGTERM')).toBe(0)
  }, 120_000)

  test('under a public address there is no demo, and links begin with that address', async () => {
    const PUBLIC_URL = 'https://deck.example/'
    const server = await start({ DATA_DIR: folder(), PUBLIC_URL, HOST: '127.0.0.1' })
    expect(server.printed).toMatch(/^ {2}https:\/\/deck\.example\/invite\/[\w-]{43}$/m)
    expect(server.printed).not.toContain('@')
    expect(await server.stop('SIGTERM')).toBe(0)
  }, 120_000)

  test('says which setting is wrong and ends with 2', async () => {
    await expect(start({ DATA_DIR: folder(), PORT: 'many' })).rejects.toThrow(/exit 2: PORT must be a number/)
  }, 60_000)
})

describe('settings', () => {
  test('on this machine alone by default, on port 4180', () => {
    const { host, port, publicUrl, isDemoWanted, proxies } = readSettings({})
    expect({ host, port, publicUrl, isDemoWanted, proxies }).toEqual({
      ...{ host: '127.0.0.1', port: 4180, publicUrl: null, isDemoWanted: true, proxies: 0 },
    })
  })

  test('open to others only where PUBLIC_URL is https', () => {
    expect(readSettings({ PUBLIC_URL: 'https://deck.example' }).host).toBe('0.0.0.0')
    expect(readSettings({ PUBLIC_URL: 'http://deck.example' }).host).toBe('127.0.0.1')
    expect(() => readSettings({ HOST: '0.0.0.0' })).toThrow(/HOST 0\.0\.0\.0 .*PUBLIC_URL/)
    expect(() => readSettings({ HOST: '0.0.0.0', PUBLIC_URL: 'http://deck.example' })).toThrow(/https/)
    expect(readSettings({ HOST: '0.0.0.0', PUBLIC_URL: 'https://deck.example' }).host).toBe('0.0.0.0')
  })

  test.each([
    [{ PORT: '-1' }, /^PORT/],
    [{ PORT: '65536' }, /^PORT/],
    [{ PORT: '80.5' }, /^PORT/],
    [{ PUBLIC_URL: 'deck.example' }, /^PUBLIC_URL must be an address like/],
    [{ PUBLIC_URL: 'javascript:alert(1)' }, /^PUBLIC_URL/],
    [{ SEED_DEMO: 'yes' }, /^SEED_DEMO must be 0 or 1/],
    [{ SMTP_URL: 'http://mail.example' }, /^SMTP_URL must be an address like smtps/],
  ])('%o is refused by name', (environment, message) => {
    expect(() => readSettings(environment as Record<string, string>)).toThrow(message)
  })
})

describe('local files', () => {
  test('keep the bytes under company and hash, the same bytes once', async () => {
    const location = folder()
    const files = localFiles(location)
    // SHA-256 of "abc", FIPS 180-4 example.
    const sha256 = 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad'
    expect(await files.save('north', Buffer.from('abc'))).toEqual({ sha256, sizeBytes: 3 })
    await files.save('north', Buffer.from('abc'))
    expect(readdirSync(join(location, 'north'))).toEqual([sha256])
    expect(await text(await files.open('north', sha256))).toBe('abc')
  })

  test.each(['../north', '/etc', 'a/../../b'])('company %s leads nowhere outside', async (companyId) => {
    const parent = folder()
    const files = localFiles(join(parent, 'files'))
    await files.save(companyId, Buffer.from('abc')).catch(() => undefined)
    expect(readdirSync(parent).filter((name) => name !== 'files')).toEqual([])
  })
})

test('mail goes into the local outbox as a file that a mail program opens', async () => {
  const outbox = folder()
  const mail = localOutbox(outbox)
  await mail.send({ to: 'new@north.example', subject: 'Invitation to Nörth', text: 'Follow the link.\nOnce.' })
  await mail.send({ to: 'new@north.example', subject: 'x\r\nBcc: eve@evil.example', text: 'second' })
  const [first = '', second = ''] = readdirSync(outbox).sort()
  const read = (name: string) => readFileSync(join(outbox, name), 'utf8')
  expect(read(first)).toMatch(/^To: new@north\.example\r$/m)
  expect(read(first)).toContain('Follow the link.\r\nOnce.')
  expect(read(second)).not.toMatch(/^Bcc:/m)
})
