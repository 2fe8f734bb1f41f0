import { mkdirSync, mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { brotliCompressSync, gzipSync } from 'node:zlib'
import type { AnyTRPCProcedure } from '@trpc/server'
import request, { type Response } from 'supertest'
import { v7 as uuidv7 } from 'uuid'
import { beforeAll, describe, expect, test } from 'vitest'
import { appRouter } from '@/server/router'
import { insertFile } from '@/server/stores/file'
import { sampleLayout } from './layout-sample'
import { get, openTestServer, post, query, type TestServer } from './server'

const SCRIPT = 'console.log("the client")\n'.repeat(40)
const PAGE = '<!doctype html><title>Wedgeline</title>'

function builtClient(): string {
  const dist = mkdtempSync(join(tmpdir(), 'wedgeline-dist-'))
  const put = (name: string, content: string | Buffer) => writeFileSync(join(dist, name), content)
  mkdirSync(join(dist, '_expo/static/js/web'), { recursive: true })
  put('index.html', PAGE)
  put('index.html.br', brotliCompressSync(PAGE))
  put('theme.css', 'body{}')
  put('.sources', 'what the build was made of')
  const script = '_expo/static/js/web/entry-0123456789abcdef0123456789abcdef.js'
  put(script, SCRIPT)
  put(`${script}.br`, brotliCompressSync(SCRIPT))
  put(`${script}.gz`, gzipSync(SCRIPT))
  return dist
}
const SCRIPT_PATH = '/_expo/static/js/web/entry-0123456789abcdef0123456789abcdef.js'

let server: TestServer
let cookie: string
let fileId: string
beforeAll(async () => {
  server = openTestServer({ dist: builtClient() })
  const { company, db, files } = server
  cookie = await server.cookieOf(company.personId('detailer'))
  const { jobId } = await company.as('detailer').job.importLayout({ companyId: company.id, layout: sampleLayout() })
  const { sha256 } = await files.save(company.id, Buffer.from('bars'))
  fileId = uuidv7()
  insertFile(db, {
    ...{ companyId: company.id, id: fileId, jobId, sha256, name: 'bärs "1".txt', type: 'text/plain', bytes: 4 },
    ...{ createdAtMs: 0, createdBy: company.personId('detailer') },
  })
})

const CSP = [
  "base-uri 'none'",
  "connect-src 'self'",
  "default-src 'self'",
  "font-src 'self'",
  "form-action 'self'",
  "frame-ancestors 'none'",
  "img-src 'self' data: blob:",
  "manifest-src 'self'",
  "object-src 'none'",
  "script-src 'self'",
  "style-src 'self' 'unsafe-inline'",
  "worker-src 'self'",
]
const policyOf = ({ headers }: Response) => headers['content-security-policy']?.split(';').sort()

describe('every kind of answer', () => {
  const kinds: [string, () => PromiseLike<Response>, number][] = [
    ['a query', () => get(server, query('session.me')), 200],
    ['a change', () => post(server, 'session.signOut'), 200],
    ['a refused change', () => request(server.app).post('/trpc/session.signOut'), 403],
    ['input that cannot be read', () => post(server, 'session.signIn').send('{'), 400],
    ['an unknown procedure', () => get(server, query('session.nothing')), 404],
    ['a download', () => get(server, `/exports/${fileId}`, { cookie }), 200],
    ['a download without a session', () => get(server, `/exports/${fileId}`), 401],
    ['a missing download', () => get(server, '/exports/none', { cookie }), 404],
    ['the page', () => get(server, '/').set('Accept', 'text/html'), 200],
    ['a screen of the page', () => get(server, '/jobs/a/pours/b').set('Accept', 'text/html'), 200],
    ['a script', () => get(server, SCRIPT_PATH), 200],
    ['nothing there', () => get(server, '/nothing.js'), 404],
    ['a broken address', () => get(server, '/exports/%E0%A4%A'), 400],
    ['an address without https', () => get(server, '/').set('Host', 'wedgeline.lan:4180'), 403],
    ['health', () => get(server, '/healthz'), 200],
    ['readiness', () => get(server, '/readyz'), 200],
  ]
  test.each(kinds)('%s has the policy and the other headers', async (_name, ask, status) => {
    const response = await ask()
    expect(response.status).toBe(status)
    expect(policyOf(response)).toEqual(CSP)
    expect(response.headers['x-content-type-options']).toBe('nosniff')
    expect(response.headers['x-frame-options']).toBe('DENY')
    expect(response.headers['referrer-policy']).toBe('no-referrer')
    expect(response.headers['cross-origin-resource-policy']).toBe('same-origin')
    expect(response.headers['x-powered-by']).toBeUndefined()
    expect(response.headers['access-control-allow-origin']).toBeUndefined()
    expect(response.headers['strict-transport-security']).toBeUndefined()
    expect(response.text).not.toMatch(/\bat .*\.(ts|js):\d+/)
  })

  test('over https adds HSTS of a year and sends the browser to https', async () => {
    const secure = openTestServer({ appUrl: 'https://deck.example' })
    const { headers } = await get(secure, '/healthz')
    expect(headers['strict-transport-security']).toBe('max-age=31536000') // 365 * 24 * 60 * 60
    expect(headers['content-security-policy']).toContain('upgrade-insecure-requests')
  })

  test.each(['/healthz', '/readyz', '/trpc/session.me', '/trpc/none', '/exports/none'])(
    '%s is not stored',
    async (path) => {
      expect((await get(server, path)).headers['cache-control']).toBe('no-store')
    },
  )
})

describe('a change that another site sends', () => {
  const change = () => request(server.app).post('/trpc/session.signOut').set('Cookie', cookie)
  const isSignedIn = async () => (await get(server, query('session.me'), { cookie })).body.result.data !== null
  const json = 'application/json'
  const forms: [string, () => PromiseLike<Response>][] = [
    ['without Origin and Sec-Fetch-Site', () => change().type(json).send('{}')],
    ['from another origin', () => change().set('Origin', 'https://evil.example').type(json).send('{}')],
    ['from Origin null (sandboxed frame)', () => change().set('Origin', 'null').type(json).send('{}')],
    ['from our name on another port', () => change().set('Origin', 'http://localhost:9999').type(json).send('{}')],
    [
      'from an origin that begins as ours',
      () => change().set('Origin', 'http://localhost:4180.evil.example').type(json),
    ],
    ['from our origin over https', () => change().set('Origin', 'https://localhost:4180').type(json).send('{}')],
    ['that the browser calls cross-site', () => change().set('Sec-Fetch-Site', 'cross-site').type(json).send('{}')],
    ['that the browser calls same-site', () => change().set('Sec-Fetch-Site', 'same-site').type(json).send('{}')],
    ['typed into the address bar', () => change().set('Sec-Fetch-Site', 'none').type(json).send('{}')],
    [
      'with our Origin forged and cross-site',
      () => change().set('Origin', 'http://localhost:4180').set('Sec-Fetch-Site', 'cross-site').type(json).send('{}'),
    ],
    ['as a form', () => change().set('Origin', 'http://localhost:4180').type('form').send('a=b')],
    ['as text with JSON in it', () => change().set('Origin', 'http://localhost:4180').type('text/plain').send('{}')],
    [
      'as a form with files',
      () => change().set('Origin', 'http://localhost:4180').type('multipart/form-data; boundary=x').send('--x--'),
    ],
    ['without a type', () => change().set('Origin', 'http://localhost:4180').unset('Content-Type')],
    [
      'by PUT, PATCH or DELETE',
      () =>
        request(server.app).delete('/trpc/session.signOut').set('Cookie', cookie).set('Origin', 'https://evil.example'),
    ],
    ['by GET', () => get(server, '/trpc/session.signOut', { cookie })],
    [
      'by GET that says it is POST',
      () => get(server, '/trpc/session.signOut?_method=POST', { cookie }).set('X-HTTP-Method-Override', 'POST'),
    ],
  ]
  test.each(forms)('is refused: %s', async (_name, send) => {
    const { status } = await send()
    expect([403, 405, 415]).toContain(status)
    expect(await isSignedIn()).toBe(true)
  })

  test('no procedure that changes anything answers to GET', async () => {
    const procedures = appRouter._def.procedures as unknown as Record<string, AnyTRPCProcedure>
    const changes = Object.entries(procedures).filter(([, { _def }]) => _def.type === 'mutation')
    expect(changes.length).toBeGreaterThan(10)
    for (const [path] of changes) expect((await get(server, query(path, {}), { cookie })).status).toBe(405)
  })

  test('our own page may: by its Origin, or by Sec-Fetch-Site where no Origin comes', async () => {
    const send = () => request(server.app).post('/trpc/session.signOut').type(json)
    await send().set('Origin', 'http://localhost:4180').send('{}').expect(200)
    await send().set('Sec-Fetch-Site', 'same-origin').send('{}').expect(200)
    await send().set('Origin', 'http://127.0.0.1:4180').set('Host', '127.0.0.1:4180').send('{}').expect(200)
  })

  test('a public server takes no page of this machine for its own', async () => {
    const secure = openTestServer({ appUrl: 'https://deck.example' })
    const send = (origin: string) =>
      request(secure.app).post('/trpc/session.signOut').type(json).set('Origin', origin).set('Host', 'localhost:4180')
    await send('http://localhost:4180').send('{}').expect(403)
    await send('https://deck.example').send('{}').expect(200)
  })
})

describe('the built client', () => {
  test.each([
    ['br, gzip', 'br'],
    ['gzip', 'gzip'],
    ['identity', undefined],
  ])('a script for a browser that takes %s comes as %s, for good', async (accepted, encoding) => {
    const response = await get(server, SCRIPT_PATH).set('Accept-Encoding', accepted).buffer(true)
    expect(response.headers['content-encoding']).toBe(encoding)
    expect(response.headers['content-type']).toMatch(/^text\/javascript/)
    expect(response.headers['cache-control']).toBe('public, max-age=31536000, immutable')
    expect(response.headers['vary']).toContain('Accept-Encoding')
  })

  test('a name without a hash is asked after each time, the page above all', async () => {
    for (const path of ['/theme.css', '/index.html', '/', '/jobs/1']) {
      const { headers } = await get(server, path).set('Accept', 'text/html,*/*').expect(200)
      expect(headers['cache-control']).toBe('no-cache')
    }
  })

  test.each(['/trpc', '/trpc/none', '/files/a', '/exports', '/healthz/x', '/readyz/x', '/_expo/old.js', '/a.map'])(
    '%s never gets the page',
    async (path) => {
      const response = await get(server, path).set('Accept', 'text/html')
      expect(response.status).toBe(404)
      expect(response.text).not.toContain('<!doctype')
    },
  )

  test.each([
    '/.sources',
    '/../package.json',
    '/..%2fpackage.json',
    '/%2e%2e/package.json',
    '/_expo/..%5c..%5cpackage.json',
  ])('%s gives nothing away', async (path) => {
    const { text } = await get(server, path)
    expect(text).not.toContain('what the build was made of')
    expect(text).not.toContain('"dependencies"')
  })

  test('says so when it has not been built', async () => {
    const bare = openTestServer()
    const response = await get(bare, '/').set('Accept', 'text/html').expect(503)
    expect(response.text).toContain('npm start')
  })
})

describe('an address without https', () => {
  test('says why signing in does not work there and how it does', async () => {
    const { text } = await get(server, '/jobs').set('Host', '192.168.1.20:4180').expect(403)
    expect(text).toContain('need https')
    expect(text).toContain('PUBLIC_URL')
    expect(text).toContain('http://localhost:4180')
  })

  test('this machine itself needs none', async () => {
    for (const host of ['localhost:4180', '127.0.0.1:4180', '[::1]:4180']) {
      await get(server, '/').set('Host', host).set('Accept', 'text/html').expect(200)
    }
  })
})

describe('a download', () => {
  test('is an attachment under its own name with its own type', async () => {
    const response = await get(server, `/exports/${fileId}`, { cookie }).expect(200)
    expect(response.text).toBe('bars')
    expect(response.headers['content-disposition']).toBe(
      `attachment; filename="b?rs \\"1\\".txt"; filename*=UTF-8''b%C3%A4rs%20%221%22.txt`,
    )
    expect(response.headers['content-type']).toMatch(/^text\/plain/)
    expect(response.headers['content-length']).toBe('4')
  })
})

describe('errors', () => {
  test('more than 8 MB is refused as too large', async () => {
    const response = await post(server, 'session.signIn').send({ email: 'a'.repeat(8 * 1024 * 1024), password: 'x' })
    expect(response.status).toBe(413)
    expect(response.body.error.message).toContain('8 MB')
  })

  test('fields that cannot be read are named, each with what would be right', async () => {
    const { body } = await post(server, 'session.signIn').send({ email: 'no address', password: '' }).expect(400)
    expect(body.error.data.fields).toEqual({ email: ['must be a mail address'], password: ['must not be empty'] })
    expect(body.error.message).toBe('This cannot be read: email must be a mail address.')
  })

  test('what nobody foresaw is logged once and answered with a sentence, without a stack', async () => {
    const broken = openTestServer()
    const own = await broken.cookieOf(broken.company.personId('admin'))
    broken.db.$client.exec('ALTER TABLE company RENAME TO gone')
    const { body, text } = await get(broken, query('company.byId', { companyId: 'north' }), { cookie: own }).expect(500)
    expect(body.error.message).toContain('Something went wrong on the server')
    expect(text).not.toMatch(/gone|SQLITE|no such table|\.ts:/)
    expect(broken.log().match(/impossible state/g)).toHaveLength(1)
    expect(broken.log()).toContain('no such table')
  })
})
