import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { useState } from 'react'
import { expect, test, vi } from 'vitest'
import { Checkbox } from '@/components/ui/checkbox'
import { Dialog } from '@/components/ui/dialog'
import { NumberField } from '@/components/ui/number-field'
import { Select } from '@/components/ui/select'
import { TextField } from '@/components/ui/text-field'
import { expectAccessible } from './axe'

vi.mock('expo-router', () => ({ router: { push: () => {} } }))

function Height({ onCommit, start = 110 }: { onCommit?: (value: number | null) => void; start?: number | null }) {
  const [value, setValue] = useState<number | null>(start)
  return (
    <NumberField
      label="Height"
      unit="mm"
      value={value}
      usual={{ range: '75 to 150', source: 'common practice' }}
      onCommit={(next) => {
        onCommit?.(next)
        setValue(next)
      }}
    />
  )
}

const box = () => screen.getByRole<HTMLInputElement>('textbox', { name: 'Height, mm' })

test('the label with its unit, the usual range and its source belong to the box', async () => {
  render(<Height />)
  const described = document.getElementById(box().getAttribute('aria-describedby') ?? '')
  expect(described?.textContent).toBe('Usually 75 to 150 (common practice).')
  expect(document.querySelector('label')?.htmlFor).toBe(box().id)
  await expectAccessible()
})

test('Enter commits once, and the typed text stays as typed', async () => {
  const onCommit = vi.fn()
  render(<Height onCommit={onCommit} />)
  await userEvent.clear(box())
  await userEvent.type(box(), '62.50{Enter}')
  expect(onCommit.mock.calls).toEqual([[62.5]])
  expect(box().value).toBe('62.50')
  await userEvent.tab()
  expect(onCommit).toHaveBeenCalledTimes(1)
})

test('leaving commits; leaving without a change does not', async () => {
  const onCommit = vi.fn()
  render(<Height onCommit={onCommit} />)
  await userEvent.click(box())
  await userEvent.tab()
  expect(onCommit).not.toHaveBeenCalled()
  await userEvent.type(box(), '0')
  await userEvent.tab()
  expect(onCommit.mock.calls).toEqual([[1100]])
})

test('Esc brings back what was there and leaves the dialog open; Esc again closes it', async () => {
  const onClose = vi.fn()
  render(
    <Dialog title="Anchor" isOpen onClose={onClose}>
      <Height />
    </Dialog>,
  )
  await userEvent.type(box(), '9')
  expect(box().value).toBe('1109')
  await userEvent.keyboard('{Escape}')
  expect(box().value).toBe('110')
  expect(onClose).not.toHaveBeenCalled()
  await userEvent.keyboard('{Escape}')
  expect(onClose).toHaveBeenCalledTimes(1)
})

test('where each key counts, every number on the way is told, and Esc gives the one from before', async () => {
  const told: number[] = []
  const onCommit = vi.fn()
  function Live() {
    const [value, setValue] = useState<number | null>(110)
    const onType = (next: number) => {
      told.push(next)
      setValue(next)
    }
    return <NumberField label="Height" unit="mm" value={value} onCommit={onCommit} onType={onType} />
  }
  render(<Live />)
  await userEvent.clear(box())
  await userEvent.type(box(), '62')
  expect(told).toEqual([6, 62])
  await userEvent.keyboard('{Escape}')
  expect(told).toEqual([6, 62, 110])
  expect(box().value).toBe('110')
  await userEvent.clear(box())
  await userEvent.type(box(), '75.0')
  await userEvent.tab()
  expect(told).toEqual([6, 62, 110, 7, 75])
  expect(box().value).toBe('75.0')
  expect(onCommit).not.toHaveBeenCalled()
})

test('1,5 is asked about and nothing is committed until it is answered', async () => {
  const onCommit = vi.fn()
  render(<Height onCommit={onCommit} />)
  await userEvent.clear(box())
  await userEvent.type(box(), '1,5{Enter}')
  expect(onCommit).not.toHaveBeenCalled()
  expect(box().getAttribute('aria-invalid')).not.toBe('true')
  await expectAccessible()
  await userEvent.click(screen.getByRole('button', { name: '1.5 mm' }))
  expect(onCommit.mock.calls).toEqual([[1.5]])
  expect(box().value).toBe('1.5')
})

test('1.2 m is understood and shown converted', async () => {
  const onCommit = vi.fn()
  render(<Height onCommit={onCommit} />)
  await userEvent.clear(box())
  await userEvent.type(box(), '1.2 m{Enter}')
  expect(onCommit.mock.calls).toEqual([[1200]])
  expect(box().value).toBe('1.2 m')
  expect(screen.getByText('= 1200 mm')).toBeTruthy()
})

test('what cannot be read stays, is marked invalid with a message, and is not committed', async () => {
  const onCommit = vi.fn()
  render(<Height onCommit={onCommit} />)
  await userEvent.clear(box())
  await userEvent.type(box(), 'abc')
  expect(box().getAttribute('aria-invalid')).not.toBe('true')
  await userEvent.tab()
  expect(box().value).toBe('abc')
  expect(box().getAttribute('aria-invalid')).toBe('true')
  const ids = (box().getAttribute('aria-describedby') ?? '').split(' ')
  expect(ids.map((id) => document.getElementById(id)?.textContent)).toContain(
    '“abc” cannot be read as a number. Type figures in mm, such as 110.',
  )
  expect(onCommit).not.toHaveBeenCalled()
  await expectAccessible()
})

test('a value that changes from outside takes the place of a text that was left', async () => {
  const { rerender } = render(<NumberField label="Height" unit="mm" value={110} onCommit={() => {}} />)
  await userEvent.type(box(), 'x')
  await userEvent.tab()
  expect(box().value).toBe('110x')
  rerender(<NumberField label="Height" unit="mm" value={75} onCommit={() => {}} />)
  expect(box().value).toBe('75')
})

test('a committed text that a value from outside replaced does not come back with the focus', async () => {
  const onCommit = vi.fn()
  const { rerender } = render(<NumberField label="Height" unit="mm" value={110} onCommit={onCommit} />)
  await userEvent.clear(box())
  await userEvent.type(box(), '230')
  await userEvent.tab()
  expect(onCommit.mock.calls).toEqual([[230]])
  rerender(<NumberField label="Height" unit="mm" value={230} onCommit={onCommit} />)
  rerender(<NumberField label="Height" unit="mm" value={210} onCommit={onCommit} />)
  await userEvent.click(box())
  expect(box().value).toBe('210')
  await userEvent.tab()
  expect(onCommit).toHaveBeenCalledTimes(1)
})

test('an emptied field commits that there is no value', async () => {
  const onCommit = vi.fn()
  render(<Height onCommit={onCommit} />)
  await userEvent.clear(box())
  await userEvent.tab()
  expect(onCommit.mock.calls).toEqual([[null]])
})

test('text field: error, Enter, secret', async () => {
  const onEnter = vi.fn()
  render(
    <TextField label="Address" value="rowan@" onChangeText={() => {}} error="Write name@place." onEnter={onEnter} />,
  )
  const field = screen.getByRole('textbox', { name: 'Address' })
  expect(field.getAttribute('aria-invalid')).toBe('true')
  await userEvent.type(field, '{Enter}')
  expect(onEnter).toHaveBeenCalledTimes(1)
  await expectAccessible()
})

test('select: a real select that tells its value', async () => {
  const onChange = vi.fn()
  const options = [
    { value: 'live', label: 'live' },
    { value: 'dead', label: 'dead' },
  ] as const
  render(<Select label="End" options={options} value={null} onChange={onChange} />)
  await userEvent.selectOptions(screen.getByRole('combobox', { name: 'End' }), 'dead')
  expect(onChange.mock.calls).toEqual([['dead']])
  await expectAccessible()
})

test('checkbox: name, state, mouse and space bar', async () => {
  const onChange = vi.fn()
  render(<Checkbox label="Concrete is cracked" checked={false} onChange={onChange} hint="At stressing." />)
  const box = screen.getByRole('checkbox', { name: 'Concrete is cracked' })
  expect(box.getAttribute('aria-checked')).toBe('false')
  await userEvent.click(box)
  box.focus()
  await userEvent.keyboard(' ')
  expect(onChange.mock.calls).toEqual([[true], [true]])
  await expectAccessible()
})
