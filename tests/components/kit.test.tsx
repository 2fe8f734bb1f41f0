import { act, render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, expect, test, vi } from 'vitest'
import { Providers } from '@/features/shell/providers'
import { WorkShell } from '@/features/shell/work-shell'
import { expectAccessible } from './axe'
import { KitPage } from './kit/kit-page'

const push = vi.hoisted(() => vi.fn())
vi.mock('expo-router', () => ({ router: { push } }))

const onSignOut = vi.fn()
const account = { person: 'Rowan Tilley', company: 'Quillmarsh Detailing', items: [], onSignOut }

beforeEach(() => {
  push.mockClear()
  localStorage.clear()
  vi.stubGlobal('scrollTo', () => {})
  render(
    <Providers>
      <WorkShell account={account}>
        <KitPage />
      </WorkShell>
    </Providers>,
  )
})

const button = (name: string) => screen.getByRole('button', { name })

test('the whole kit closed: one level-1 heading, landmarks, no fault', async () => {
  expect(screen.getAllByRole('heading', { level: 1 }).map((heading) => heading.textContent)).toEqual(['Edge E6, north'])
  expect(screen.getByRole('banner')).toBeTruthy()
  expect(screen.getByRole('main')).toBeTruthy()
  expect(document.title).toBe('Edge E6, north – Wedgeline')
  await expectAccessible()
})

test('dialog: named by its title, takes the focus, gives it back on Esc', async () => {
  await userEvent.click(button('Open dialog'))
  const dialog = await screen.findByRole('dialog', { name: 'Remove the edge?' })
  await waitFor(() => expect(dialog.contains(document.activeElement)).toBe(true))
  await expectAccessible()
  await userEvent.keyboard('{Escape}')
  expect(screen.queryByRole('dialog')).toBeNull()
  expect(document.activeElement).toBe(button('Open dialog'))
})

test('sheet: named by its title, half and full height', async () => {
  await userEvent.click(button('Open sheet'))
  const sheet = await screen.findByRole('dialog', { name: 'E6-03, live end' })
  await userEvent.click(within(sheet).getByRole('button', { name: 'Full height' }))
  expect(within(sheet).getByRole('button', { name: 'Half height' }).getAttribute('aria-expanded')).toBe('true')
  await expectAccessible()
  await userEvent.click(within(sheet).getByRole('button', { name: 'Close' }))
  expect(screen.queryByRole('dialog')).toBeNull()
})

test('menu: arrows, End, first letter, Enter; then the message is in the one live region', async () => {
  await userEvent.click(button('More'))
  const names = () => document.activeElement?.textContent
  await waitFor(() => expect(names()).toBe('Copy anchors'))
  await expectAccessible()
  await userEvent.keyboard('{End}')
  expect(names()).toBe('Remove edge')
  await userEvent.keyboard('{ArrowDown}')
  expect(names()).toBe('Copy anchors')
  await userEvent.keyboard('w')
  expect(names()).toBe('Walk')
  await userEvent.keyboard('{Home}{Enter}')
  expect(screen.queryByRole('menu')).toBeNull()
  const live = [...document.querySelectorAll('[aria-live="polite"]')]
  expect(live).toHaveLength(1)
  expect(live[0]?.textContent).toBe('5 anchors copied.')
})

test('menu: the space bar chooses, an item that is off stays off', async () => {
  await userEvent.click(button('More'))
  await waitFor(() => expect(document.activeElement?.textContent).toBe('Copy anchors'))
  await userEvent.keyboard('w ')
  expect(push.mock.calls).toEqual([['/']])
  expect(screen.queryByRole('menu')).toBeNull()
})

test('a message with an action stays until it is put away', async () => {
  await userEvent.click(button('Say'))
  expect(screen.getByText('Anchor removed.')).toBeTruthy()
  await expectAccessible()
  await userEvent.click(button('Put away'))
  expect(screen.queryByText('Anchor removed.')).toBeNull()
})

test('tabs: arrows, Home and End move and select, one stop for the keyboard', async () => {
  const tab = (name: string) => screen.getByRole('tab', { name })
  act(() => tab('Checks').focus())
  await userEvent.keyboard('{ArrowRight}')
  expect(tab('Steel').getAttribute('aria-selected')).toBe('true')
  expect(document.activeElement).toBe(tab('Steel'))
  expect(screen.getByRole('tabpanel', { name: 'Steel' }).textContent).toBe('What is under steel.')
  await userEvent.keyboard('{End}')
  expect(document.activeElement).toBe(tab('Notes'))
  await userEvent.keyboard('{ArrowRight}')
  expect(document.activeElement).toBe(tab('Checks'))
  await userEvent.keyboard('{ArrowLeft}{Home}')
  expect(screen.getAllByRole('tab').map((each) => each.tabIndex)).toEqual([0, -1, -1])
})

test('table: a real one with heads for columns and rows; the keyboard selects', async () => {
  const table = screen.getByRole('table', { name: 'Anchors of edge E6' })
  expect(within(table).getAllByRole('columnheader')).toHaveLength(6)
  expect(within(table).getByRole('rowheader', { name: 'E6-03' }).getAttribute('scope')).toBe('row')
  const row = (name: string) => within(table).getByRole('rowheader', { name }).closest('tr')
  expect(row('E6-03')?.getAttribute('aria-current')).toBe('true')
  act(() => within(table).getByRole('button', { name: 'E6-01' }).focus())
  await userEvent.keyboard('{Enter}')
  expect(row('E6-01')?.getAttribute('aria-current')).toBe('true')
  expect(row('E6-03')?.getAttribute('aria-current')).toBeNull()
})

test('every status has a word and a shape of its own', () => {
  for (const word of ['stop', 'not covered', 'over', 'needs judgement', 'near', 'within'])
    expect(screen.getAllByText(word).length).toBeGreaterThan(0)
  for (const [status, said] of [
    ['height, short 13', 'over: '],
    ['dead end', 'not covered: '],
  ] as const)
    expect(screen.getByText(status).previousSibling?.textContent).toBe(said)
  for (const kind of ['limit of the code', 'limit of the hardware', 'common practice'])
    expect(screen.getByRole('img', { name: kind })).toBeTruthy()
})

test('a link goes by the router, and a press for a new tab by the browser', async () => {
  const link = screen.getByRole('link', { name: 'To the walk' })
  expect(link.getAttribute('href')).toBe('/')
  const user = userEvent.setup()
  await user.click(link)
  expect(push.mock.calls).toEqual([['/']])
  await user.keyboard('{Control>}')
  await user.click(link)
  expect(push).toHaveBeenCalledTimes(1)
  expect(screen.getByRole('link', { name: 'Workbook' }).hasAttribute('download')).toBe(true)
})

test('the person’s menu: a theme is chosen, painted and kept; the device’s own forgets it', async () => {
  const open = async () => {
    await userEvent.click(button('Rowan Tilley, Quillmarsh Detailing'))
    await screen.findByRole('dialog')
  }
  await open()
  await expectAccessible()
  await userEvent.click(screen.getByRole('menuitem', { name: 'Outdoor theme' }))
  expect(document.documentElement.dataset.theme).toBe('outdoor')
  expect(localStorage.getItem('wedgeline.theme')).toBe('outdoor')
  await open()
  await userEvent.click(screen.getByRole('menuitem', { name: 'Theme as the device' }))
  expect(document.documentElement.dataset.theme).toBeUndefined()
  expect(localStorage.getItem('wedgeline.theme')).toBeNull()
  await open()
  await userEvent.click(screen.getByRole('menuitem', { name: 'Sign out' }))
  expect(onSignOut).toHaveBeenCalledTimes(1)
})
