import 'fake-indexeddb/auto'
import { screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, expect, test, vi } from 'vitest'
import { SignInScreen } from '@/features/sign-in/sign-in-screen'
import { InvitationScreen } from '@/features/sign-in/invitation-screen'
import { pathAfterSignIn } from '@/features/shell/way-back'
import { expectAccessible } from '../components/axe'
import { refusal, renderOver } from './fake-server'

const went = vi.hoisted(() => vi.fn())
vi.mock('expo-router', () => ({
  router: { push: () => {} },
  useLocalSearchParams: () => ({ to: '/jobs/j1/edges/e1' }),
  Redirect: ({ href }: { href: string }) => {
    went(href)
    return null
  },
}))

beforeEach(() => went.mockClear())

const ME = { person: { id: 'p1', name: 'Rowan Tilley', email: 'rowan@quillmarsh.example' }, companies: [] }

test('fields are what a password manager looks for', async () => {
  renderOver({ 'session.me': () => null }, <SignInScreen />)
  const email = await screen.findByLabelText('Mail address')
  const password = screen.getByLabelText('Password')
  expect([email.getAttribute('autocomplete'), password.getAttribute('autocomplete')]).toEqual([
    'username',
    'current-password',
  ])
  expect(email.closest('form')).toBe(password.closest('form'))
  expect(password.getAttribute('type')).toBe('password')
  await userEvent.click(screen.getByRole('checkbox', { name: 'Show the password' }))
  expect(screen.getByLabelText('Password').getAttribute('type')).not.toBe('password')
  await expectAccessible()
})

test('the refusal stands beside the field; then back to the page that was asked for', async () => {
  let tries = 0
  const answers = {
    'session.me': () => null,
    'session.signIn': () => {
      tries += 1
      if (tries === 1) {
        throw refusal('These do not belong together.', {
          code: 'BAD_REQUEST',
          fields: { password: ['These do not belong together.'] },
        })
      }
      return ME
    },
  }
  renderOver(answers, <SignInScreen />)
  await userEvent.type(await screen.findByLabelText('Mail address'), 'rowan@quillmarsh.example')
  await userEvent.type(screen.getByLabelText('Password'), 'one{Enter}')
  expect(await screen.findByText('These do not belong together.')).toBeTruthy()
  expect(screen.getByLabelText('Password').getAttribute('aria-invalid')).toBe('true')
  await userEvent.type(screen.getByLabelText('Password'), 'two{Enter}')
  await waitFor(() => expect(went).toHaveBeenCalledWith('/jobs/j1/edges/e1'))
})

test.each([
  ['/jobs/j1?x=1', '/jobs/j1?x=1'],
  [undefined, '/'],
  ['https://elsewhere.example', '/'],
  ['//elsewhere.example', '/'],
  ['/\\elsewhere.example', '/'],
  ['/\t/elsewhere.example', '/'],
  ['/sign-in?to=/sign-in', '/'],
  ['/sign-ins', '/sign-ins'],
])('after sign-in %s leads to %s', (asked, to) => {
  expect(pathAfterSignIn(asked)).toBe(to)
})

test('an invitation names company and roles, and signs in', async () => {
  const answers = {
    'session.me': () => null,
    'invitation.byToken': () => ({
      companyName: 'Quillmarsh Detailing',
      email: 'rowan@quillmarsh.example',
      name: 'Rowan Tilley',
      roles: ['detailer', 'engineer', 'drafter'],
    }),
    'invitation.accept': () => ME,
  }
  const { calls } = renderOver(answers, <InvitationScreen token="t" />)
  expect(await screen.findByText(/work with it as detailer, engineer and drafter\./)).toBeTruthy()
  await expectAccessible()
  await userEvent.type(screen.getByLabelText('Password'), 'eleven blue cranes{Enter}')
  await waitFor(() => expect(went).toHaveBeenCalledWith('/'))
  expect(calls.find(({ path }) => path === 'invitation.accept')?.input).toEqual({
    token: 't',
    name: 'Rowan Tilley',
    password: 'eleven blue cranes',
  })
})

test('an invitation that is not open says so', async () => {
  const answers = {
    'session.me': () => null,
    'invitation.byToken': () => {
      throw refusal('This invitation is not open.', { code: 'NOT_FOUND' })
    },
  }
  renderOver(answers, <InvitationScreen token="t" />)
  expect((await screen.findByRole('alert')).textContent).toContain('This invitation is not open.')
  await expectAccessible()
})
