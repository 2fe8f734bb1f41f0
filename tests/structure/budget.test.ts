import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'
import { afterEach, describe, expect, test } from 'vitest'
import { budget } from '../../scripts/budget.mjs'
import { at } from '../../scripts/project.mjs'

/** Inside the project, where the script looks, and ignored by git. */
const DIST = 'test-results/budget'
const SCRIPTS = '_expo/static/js/web'
const HASH = '0123456789abcdef'

const write = (name: string, content: string | Buffer) => {
  mkdirSync(dirname(at(`${DIST}/${name}`)), { recursive: true })
  writeFileSync(at(`${DIST}/${name}`), content)
}

interface Size {
  readonly gz: number
  readonly br: number
  readonly text?: string
}

/** A script whose compressed copies have exactly these sizes in bytes. */
function script(name: string, { gz, br, text = '' }: Size) {
  const file = `${SCRIPTS}/${name}-${HASH}.js`
  write(file, text)
  write(`${file}.gz`, Buffer.alloc(gz))
  write(`${file}.br`, Buffer.alloc(br))
}

/** A built client: 1,000 bytes of page, 100 of layout and 100 of route either way, and the scripts given. */
function built({ entry, work, jobs = { gz: 100, br: 100 } }: { entry: Size; work: Size; jobs?: Size }) {
  write('index.html', `<script src="/${SCRIPTS}/entry-${HASH}.js" defer></script>`)
  write('index.html.gz', Buffer.alloc(1000))
  write('index.html.br', Buffer.alloc(1000))
  const small = { gz: 100, br: 100 }
  for (const name of ['_layout', 'sign-in', 'forgotten', '[token]']) script(name, small)
  script('index', jobs)
  script('entry', entry)
  script('work', work)
}

const problems = () => budget(DIST).problems
const light: Size = { gz: 1000, br: 1000 }

afterEach(() => rmSync(at(DIST), { recursive: true, force: true }))

describe('first screens', () => {
  // Page 1,000 + layout 100 + route 100 = 1,200 bytes beside the entry; the budget is 400,000 gz and 330,000 br.
  test.each([
    { gz: 398_799, br: 1000, over: 0, at: 'one byte below' },
    { gz: 398_800, br: 1000, over: 4, at: 'at the budget' },
    { gz: 398_801, br: 1000, over: 4, at: 'one byte above' },
    { gz: 1000, br: 328_799, over: 0, at: 'one byte below, brotli' },
    { gz: 1000, br: 328_800, over: 4, at: 'at the budget, brotli' },
  ])('entry of $gz gz, $br br ($at): $over screens over', ({ gz, br, over }) => {
    built({ entry: { gz, br }, work: light })
    expect(problems()).toHaveLength(over)
  })

  test('a route of its own weight is over alone', () => {
    built({ entry: light, work: light, jobs: { gz: 400_000, br: 1 } })
    expect(problems()).toEqual(['jobs: 402 kB gz, must be under 400 kB'])
  })

  test.each(['ZodError', 'useFormContext', 'RNSVG', 'wedgeline.layout', 'OUTSIDE_METHOD'])('%s is kept out', (text) => {
    built({ entry: { ...light, text: `const a = '${text}'` }, work: light })
    expect(problems()).toHaveLength(4)
    expect(problems()[0]).toContain(text)
  })

  test('the same behind a job is welcome', () => {
    built({ entry: light, work: { ...light, text: 'ZodError RNSVG OUTSIDE_METHOD' } })
    expect(problems()).toEqual([])
  })
})

describe('behind a job', () => {
  test.each([
    { gz: 199_999, over: 0 },
    { gz: 200_000, over: 1 },
    { gz: 200_001, over: 1 },
  ])('a chunk of $gz gz: $over over', ({ gz, over }) => {
    built({ entry: light, work: { gz, br: 1000 } })
    expect(problems()).toHaveLength(over)
  })

  test.each([
    { gz: 99_999, over: 0 },
    { gz: 100_000, over: 1 },
  ])('a chunk of 100,000 gz and $gz gz that it shares: $over over', ({ gz, over }) => {
    built({ entry: light, work: { gz: 100_000, br: 1000 } })
    script('__common', { gz, br: 1000, text: 'ZodError' })
    const named = `<meta name="wedgeline-shared-script" content="/${SCRIPTS}/__common-${HASH}.js" />`
    write('index.html', `${named}<script src="/${SCRIPTS}/entry-${HASH}.js" defer></script>`)
    expect(problems()).toHaveLength(over)
  })

  test('a deep link adds both', () => {
    // Page 1,000 + layout 100 + entry 320,000 + work 160,000 = 481,100 br, over 480,000.
    built({ entry: { gz: 1000, br: 320_000 }, work: { gz: 1000, br: 160_000 } })
    expect(problems()).toEqual(['Deep link: 481 kB br, must be under 480 kB'])
  })

  test('two chunks are one too many', () => {
    built({ entry: light, work: light })
    write(`${SCRIPTS}/work-fedcba9876543210.js`, '')
    expect(problems()).toEqual(['There must be one chunk behind a job (features/work.ts); found 2.'])
  })
})

test('without a build it says what to do', () => {
  expect(problems()).toEqual([`${DIST}/ holds no index.html: build the web client first.`])
})
