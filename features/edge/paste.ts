import type { AnchorData } from '@wedgeline/contract'
import { parseNumber } from '@/components/ui/number-text'
import type { TypedAnchor } from './anchor-commands'

/** What a pasted block says: anchors that can be put on the edge, and lines that cannot be read. */
export interface Pasted {
  readonly anchors: readonly TypedAnchor[]
  readonly problems: readonly { readonly line: number; readonly message: string }[]
}

const COLUMNS = ['chainage', 'fromLast', 'height', 'strands', 'end', 'hardware', 'setBack'] as const
type ColumnName = (typeof COLUMNS)[number]

/** Words that people write over their columns. */
const HEADS: Readonly<Record<ColumnName, RegExp>> = {
  chainage: /^(chainage|distance|position|x|ch)\b/i,
  fromLast: /^(from last|spacing|gap|centres)\b/i,
  height: /^(height|h|y|z)\b/i,
  strands: /^(strands?|no\.? of strands|n)\b/i,
  end: /^(end|live|type)\b/i,
  hardware: /^(hardware|anchorage)\b/i,
  setBack: /^(set.?back|recess|pocket)\b/i,
}

/** Order of the columns where the block has no heads. */
const USUAL: readonly ColumnName[] = ['chainage', 'height', 'strands', 'end', 'hardware', 'setBack']

export interface PasteContext {
  readonly hardware: readonly { readonly id: string; readonly name: string }[]
}

/**
 * Reads anchors from text copied out of a spreadsheet or typed line by line: distance, height, strands, then live or
 * dead, hardware and set-back where wanted. A first line of words names the columns.
 */
export function readPasted(text: string, context: PasteContext): Pasted {
  const lines = text.replace(/\r/g, '').split('\n').map(cellsOf)
  const first = lines.findIndex((cells) => cells.some((cell) => cell !== ''))
  const heads = first < 0 ? null : headsOf(lines[first] ?? [])
  const columns = heads ?? USUAL
  const anchors: TypedAnchor[] = []
  const problems: { line: number; message: string }[] = []
  let last = 0
  lines.forEach((cells, index) => {
    if (cells.every((cell) => cell === '') || (heads && index === first)) return
    const read = readLine(cells, { columns, last, context })
    if (typeof read === 'string') problems.push({ line: index + 1, message: read })
    else {
      anchors.push(read)
      last = read.chainageMm
    }
  })
  return { anchors, problems }
}

const cellsOf = (line: string): string[] =>
  (line.includes('\t') ? line.split('\t') : line.includes(';') ? line.split(';') : line.trim().split(/,?\s+/)).map(
    (cell) => cell.trim(),
  )

function headsOf(cells: readonly string[]): (ColumnName | null)[] | null {
  const names = cells.map((cell) => COLUMNS.find((name) => HEADS[name].test(cell)) ?? null)
  return names.some((name) => name === 'chainage' || name === 'fromLast') ? names : null
}

interface LineContext {
  readonly columns: readonly (ColumnName | null)[]
  readonly last: number
  readonly context: PasteContext
}

function readLine(cells: readonly string[], { columns, last, context }: LineContext): TypedAnchor | string {
  const said: Partial<Record<ColumnName, string>> = {}
  columns.forEach((name, i) => {
    if (name && cells[i]) said[name] = cells[i]
  })
  try {
    const fromLast = number(said.fromLast, 'From last', 'mm')
    const chainageMm = number(said.chainage, 'Distance', 'mm') ?? (fromLast === undefined ? undefined : last + fromLast)
    if (chainageMm === undefined) return 'The distance is missing. Each line starts with it.'
    return {
      chainageMm,
      heightMm: number(said.height, 'Height', 'mm'),
      strands: strandsOf(said.strands),
      end: endOf(said.end),
      hardwareId: hardwareOf(said.hardware, context),
      setBackMm: number(said.setBack, 'Set-back', 'mm'),
    }
  } catch (error) {
    if (error instanceof Unreadable) return error.message
    throw error
  }
}

class Unreadable extends Error {}

function number(text: string | undefined, name: string, unit: string | null): number | undefined {
  if (text === undefined) return undefined
  const read = parseNumber(text, { unit, separator: null })
  if (read.kind === 'number') return read.value
  if (read.kind === 'empty') return undefined
  throw new Unreadable(`${name}: ${read.message}`)
}

function strandsOf(text: string | undefined): number | undefined {
  const value = number(text, 'Strands', null)
  if (value === undefined || (Number.isInteger(value) && value >= 1 && value <= 61)) return value
  throw new Unreadable(`Strands: “${text}” must be a whole number from 1 to 61.`)
}

function endOf(text: string | undefined): AnchorData['end'] | undefined {
  if (text === undefined) return undefined
  if (/^l(ive)?$/i.test(text)) return 'live'
  if (/^d(ead)?$/i.test(text)) return 'dead'
  throw new Unreadable(`End: “${text}” must be live or dead.`)
}

function hardwareOf(text: string | undefined, { hardware }: PasteContext): string | undefined {
  if (text === undefined) return undefined
  const found = hardware.find(({ name }) => name.toLowerCase() === text.toLowerCase())
  if (found) return found.id
  throw new Unreadable(`Hardware: “${text}” is not in the list. It has ${hardware.map(({ name }) => name).join(', ')}.`)
}
