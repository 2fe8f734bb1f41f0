import 'fake-indexeddb/auto'
import { screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { expect, test, vi } from 'vitest'
import { ForgottenScreen } from '@/features/sign-in/forgotten-screen'
import { ResetScreen } from '@/features/sign-in/reset-screen'
import { expectAccessible } from '../components/axe'
import { refusal, renderOver } from './fake-server'

vi.mock('expo-router', () => ({ router: { push: () => {} } }))

const TOKEN = 'a-token-of-a-new-password-for-this-test'

test('a link is asked for by address, and the answer does not say whether the address is known', async () => {
  const { calls } = renderOver({ 'session.askReset': () => undefined }, <ForgottenScreen />)
  await userEvent.click(screen.getByRole('button', { name: 'Send the link' }))
  expect(await screen.findByText('Type your mail address.')).toBeTruthy()
  await userEvent.type(screen.getByLabelText('Mail address'), 'rowan@quillmarsh.example{Enter}')
  expect((await screen.findByRole('alert')).textContent).toContain('If an account has this address')
  expect(calls).toEqual([{ path: 'session.askReset', input: { email: 'rowan@quillmarsh.example' } }])
  await expectAccessible()
})

test('asking too often says how long to wait and keeps what was typed', async () => {
  const answers = {
    'session.askReset': () => {
      throw refusal('Too many attempts. Try again in 4 s.', { code: 'TOO_MANY_REQUESTS' })
    },
  }
  renderOver(answers, <ForgottenScreen />)
  await userEvent.type(screen.getByLabelText('Mail address'), 'rowan@quillmarsh.example{Enter}')
  expect((await screen.findByRole('alert')).textContent).toContain('Try again in 4 s.')
  expect(screen.getByLabelText<HTMLInputElement>('Mail address').value).toBe('rowan@quillmarsh.example')
})

test('a new password is taken; a refused one says why beside the field', async () => {
  const answers = {
    'session.resetPassword': (input: unknown) => {
      if ((input as { password: string }).password === 'short') {
        throw refusal('This cannot be read.', {
          code: 'BAD_REQUEST',
          fields: { password: ['must have 8 characters or more'] },
        })
      }
    },
  }
  const { calls } = renderOver(answers, <ResetScreen token={TOKEN} />)
  await userEvent.type(screen.getByLabelText('Password'), 'short{Enter}')
  expect(await screen.findByText('It must have 8 characters or more.')).toBeTruthy()
  await expectAccessible()
  await userEvent.clear(screen.getByLabelText('Password'))
  await userEvent.type(screen.getByLabelText('Password'), 'seven quiet lanterns{Enter}')
  expect((await screen.findByRole('alert')).textContent).toContain('The password is changed')
  expect(calls.at(-1)?.input).toEqual({ token: TOKEN, password: 'seven quiet lanterns' })
})

test('a link that is used up says so and offers another', async () => {
  const answers = {
    'session.resetPassword': () => {
      throw refusal('This link is not open.', { code: 'NOT_FOUND' })
    },
  }
  renderOver(answers, <ResetScreen token={TOKEN} />)
  await userEvent.type(screen.getByLabelText('Password'), 'seven quiet lanterns{Enter}')
  expect(await screen.findByText(/This link is not open/)).toBeTruthy()
  expect(screen.getByRole('link', { name: 'Ask for a new link' }).getAttribute('href')).toBe('/forgotten')
  await expectAccessible()
})
