import { screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, expect, test, vi } from 'vitest'
import { JobsScreen } from '@/features/jobs/jobs-screen'
import { expectAccessible } from '../components/axe'
import { refusal, renderOver } from './fake-server'

const push = vi.hoisted(() => vi.fn())
vi.mock('expo-router', () => ({ router: { push } }))
vi.mock('@/features/work', () => ({
  readLayoutText: () => ({
    ok: false,
    problems: [{ field: 'anchors[3].chainageMm', message: 'must be more than 0', severity: 'refused', path: [] }],
  }),
}))

beforeEach(() => push.mockClear())

const NONE = { stop: 0, 'not-covered': 0, over: 0, 'needs-judgement': 0, near: 0, within: 0 }
const pour = (mark: string, counts: Partial<typeof NONE>) => ({
  id: mark,
  mark,
  title: '',
  state: 'draft',
  anchors: 4,
  counts: { ...NONE, ...counts },
})
const job = (number: string, pours: readonly object[]) => ({
  id: number,
  companyId: 'c1',
  companyName: 'Quillmarsh Detailing',
  number,
  title: 'Tower',
  basis: 'en-1992',
  updatedAtMs: 0,
  pours,
  readingsProposed: 0,
})
const signedIn = (roles: readonly string[]) => () => ({
  person: { id: 'p1', name: 'Rowan Tilley', email: 'rowan@quillmarsh.example' },
  companies: [{ id: 'c1', name: 'Quillmarsh Detailing', roles }],
})

test('waiting says what is fetched', async () => {
  renderOver({}, <JobsScreen />)
  expect(screen.getByText('Fetching the jobs …')).toBeTruthy()
  await expectAccessible()
})

test('a refusal says why and can be tried again', async () => {
  const answers = {
    'session.me': signedIn(['detailer']),
    'job.list': () => {
      throw refusal('The server is busy.', { code: 'TOO_MANY_REQUESTS' })
    },
  }
  const { calls } = renderOver(answers, <JobsScreen />)
  expect((await screen.findByRole('alert')).textContent).toContain('The server is busy.')
  await userEvent.click(screen.getByRole('button', { name: 'Try again' }))
  expect(calls.filter(({ path }) => path === 'job.list')).toHaveLength(2)
  await expectAccessible()
})

test('empty: a detailer begins a job, an inspector is told who adds them', async () => {
  renderOver({ 'session.me': signedIn(['inspector']), 'job.list': () => [] }, <JobsScreen />)
  expect(await screen.findByText(/A detailer or engineer who is on a job adds you/)).toBeTruthy()
  expect(screen.queryByRole('button', { name: 'New job' })).toBeNull()
  await expectAccessible()
})

test('the job with the worst check stands first, whatever the number of lesser ones', async () => {
  const jobs = [job('1', [pour('P1', { over: 9 })]), job('2', [pour('P2', { stop: 1 })]), job('3', [])]
  renderOver({ 'session.me': signedIn(['detailer']), 'job.list': () => jobs }, <JobsScreen />)
  await screen.findAllByRole('heading', { level: 2 })
  const names = screen.getAllByRole('heading', { level: 2 }).map(({ textContent }) => textContent)
  expect(names).toEqual(['2  Tower', '1  Tower', '3  Tower'])
  expect(screen.getByText('1 stop')).toBeTruthy()
  await expectAccessible()
})

test('a new job needs number and title, keeps its id over a lost answer, and opens', async () => {
  let tries = 0
  const answers = {
    'session.me': signedIn(['detailer']),
    'job.list': () => [],
    'job.create': (input: unknown) => {
      tries += 1
      if (tries === 1) throw refusal('The server is busy.', { code: 'TOO_MANY_REQUESTS' })
      return { id: (input as { id: string }).id }
    },
  }
  const { calls } = renderOver(answers, <JobsScreen />)
  await userEvent.click(await screen.findByRole('button', { name: 'New job' }))
  await userEvent.click(screen.getByRole('button', { name: 'Begin the job' }))
  expect(screen.getByText('Type the job number.')).toBeTruthy()
  await userEvent.type(screen.getByLabelText('Number'), '2301')
  await userEvent.type(screen.getByLabelText('Title'), 'Tower')
  await expectAccessible()
  await userEvent.click(screen.getByRole('button', { name: 'Begin the job' }))
  expect(await screen.findByText('The server is busy.')).toBeTruthy()
  await userEvent.click(screen.getByRole('button', { name: 'Begin the job' }))
  const ids = calls.filter(({ path }) => path === 'job.create').map(({ input }) => (input as { id: string }).id)
  expect(ids).toHaveLength(2)
  expect(ids[0]).toBe(ids[1])
  expect(push).toHaveBeenCalledWith(`/jobs/${ids[0]}`)
})

test('a layout file with problems is refused: they are listed by field and nothing is sent', async () => {
  const { calls } = renderOver({ 'session.me': signedIn(['detailer']), 'job.list': () => [] }, <JobsScreen />)
  await userEvent.click(await screen.findByRole('button', { name: 'Import a layout' }))
  const input = document.querySelector<HTMLInputElement>('input[type=file]')
  if (!input) throw new Error('no file input')
  // jsdom has no File.text().
  const file = Object.assign(new File(['{}'], 'a.json', { type: 'application/json' }), { text: async () => '{}' })
  await userEvent.upload(input, file)
  expect(await screen.findByText('anchors[3].chainageMm')).toBeTruthy()
  expect(screen.getByRole('dialog').textContent).toContain('cannot be taken. Nothing was stored.')
  expect(calls.some(({ path }) => path === 'job.importLayout')).toBe(false)
})
