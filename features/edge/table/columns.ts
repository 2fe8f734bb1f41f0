import type { AnchorData, Command, LayoutFile } from '@wedgeline/contract'
import { formatNumber, parseNumber } from '@/components/ui/number-text'
import type { Change } from '../../editing/draft'
import type { AnchorRow } from './anchor-rows'

/** What a cell's typed text comes to: a change, nothing to do, or why it cannot be read. */
export type Typed =
  | { readonly kind: 'change'; readonly change: Change }
  | { readonly kind: 'same' }
  | { readonly kind: 'unreadable'; readonly message: string }

export interface AnchorColumn {
  readonly key: string
  readonly head: string
  readonly align: 'start' | 'end'
  readonly width: number
  /** Text of the cell as it is edited; null where the cell cannot be edited. */
  readonly text: (row: AnchorRow) => string | null
  readonly read: (text: string, row: AnchorRow, layout: LayoutFile) => Typed
  /** Words to choose from, for cells with a list. */
  readonly choices?: (layout: LayoutFile) => readonly string[]
}

const number = (value: number | null): string => (value === null ? '' : formatNumber(value, null))

type Field = 'chainageMm' | 'heightMm' | 'setBackMm'

function anchorNumber(key: Field, head: string, width: number): AnchorColumn {
  return {
    key,
    head: `${head}, mm`,
    align: 'end',
    width,
    text: ({ anchor }) => number(anchor[key]),
    read: (text, { anchor, mark }) => {
      const read = mm(text)
      if (typeof read !== 'number') return read
      return anchorChange(anchor, { [key]: read }, `${mark}: ${head.toLowerCase()}`)
    },
  }
}

/** Columns that are typed into, in the order of the table; mark, steel and worst check stand round them. */
export const EDITABLE_COLUMNS: readonly AnchorColumn[] = [
  {
    key: 'end',
    head: 'End',
    align: 'start',
    width: 64,
    text: ({ anchor }) => anchor.end,
    choices: () => ['live', 'dead'],
    read: (text, { anchor, mark }, layout) => {
      const end = /^l/i.test(text) ? 'live' : /^d/i.test(text) ? 'dead' : null
      if (!end) return { kind: 'unreadable', message: 'The end must be live or dead: type l or d.' }
      if (end === anchor.end) return { kind: 'same' }
      return anchorChange(anchor, { end, ...hardwareForEnd(layout, anchor, end) }, `${mark}: ${end} end`)
    },
  },
  {
    key: 'hardware',
    head: 'Hardware',
    align: 'start',
    width: 110,
    text: ({ hardwareName }) => hardwareName,
    choices: (layout) => layout.hardware.map(({ name }) => name),
    read: (text, { anchor, mark }, layout) => {
      const wanted = text.trim().toLowerCase()
      const found =
        layout.hardware.find(({ name }) => name.toLowerCase() === wanted) ??
        layout.hardware.find(({ name }) => wanted !== '' && name.toLowerCase().startsWith(wanted))
      if (found) return anchorChange(anchor, { hardwareId: found.id }, `${mark}: hardware`)
      const names = layout.hardware.map(({ name }) => name).join(', ')
      return { kind: 'unreadable', message: `“${text}” is not in this company's list: ${names}.` }
    },
  },
  anchorNumber('chainageMm', 'Chainage', 100),
  {
    key: 'fromLast',
    head: 'From last, mm',
    align: 'end',
    width: 100,
    text: ({ fromLastMm }) => (fromLastMm === null ? null : number(fromLastMm)),
    read: (text, { anchor, mark, fromLastMm }) => {
      const read = mm(text)
      if (typeof read !== 'number') return read
      const chainageMm = anchor.chainageMm - (fromLastMm ?? 0) + read
      return anchorChange(anchor, { chainageMm }, `${mark}: chainage`)
    },
  },
  anchorNumber('heightMm', 'Height', 84),
  anchorNumber('setBackMm', 'Set-back', 92),
  {
    key: 'strands',
    head: 'Strands',
    align: 'end',
    width: 72,
    text: ({ tendon }) => number(tendon?.strands ?? null),
    read: (text, { tendon, mark }) => {
      const read = parseNumber(text, { unit: null, separator: null })
      const isCount = read.kind === 'number' && Number.isInteger(read.value) && read.value >= 1 && read.value <= 61
      if (!tendon || !isCount) return { kind: 'unreadable', message: 'Strands must be a whole number from 1 to 61.' }
      if (read.value === tendon.strands) return { kind: 'same' }
      const command: Command = { type: 'set', table: 'tendons', id: tendon.id, changes: { strands: read.value } }
      return {
        kind: 'change',
        change: { label: `${mark}: strands`, key: `${tendon.id}.strands`, commands: [command] },
      }
    },
  },
]

function mm(text: string): number | Typed {
  const read = parseNumber(text, { unit: 'mm', separator: null })
  if (read.kind === 'number') return read.value
  return { kind: 'unreadable', message: read.kind === 'empty' ? 'Type a number of mm, such as 110.' : read.message }
}

/** A change of an anchor's fields; fields that hold the value already are left out. */
export function anchorChange(anchor: AnchorData, changes: Partial<AnchorData>, label: string): Typed {
  const entries = Object.entries(changes) as [keyof AnchorData, unknown][]
  const fresh = entries.filter(([field, value]) => anchor[field] !== value)
  if (fresh.length === 0) return { kind: 'same' }
  const command: Command = { type: 'set', table: 'anchors', id: anchor.id, changes: Object.fromEntries(fresh) }
  const key = `${anchor.id}.${fresh.map(([field]) => field).join('+')}`
  return { kind: 'change', change: { label, key, commands: [command] } }
}

/** Hardware that fits the other end: kept where it serves both, otherwise the first that does. */
function hardwareForEnd(layout: LayoutFile, anchor: AnchorData, end: AnchorData['end']): Partial<AnchorData> {
  const serves = (ends: string) => ends === end || ends === 'both'
  const now = layout.hardware.find(({ id }) => id === anchor.hardwareId)
  if (now && serves(now.ends)) return {}
  const other = layout.hardware.find(({ ends }) => serves(ends))
  if (!other) return {}
  const setBackMm = other.kind === 'bonded-splay' ? 300 : (other.pocket?.depthMm ?? anchor.setBackMm)
  return { hardwareId: other.id, setBackMm }
}
