import { z } from 'zod'
import { idSchema } from './fields'
import {
  anchorSchema,
  concreteResultSchema,
  edgeLineSchema,
  edgeSchema,
  gridLineSchema,
  jointSchema,
  levelSchema,
  obstructionSchema,
  panSchema,
  pourSchema,
  tendonSchema,
  type AnchorData,
  type LayoutFile,
} from './layout'
import { steelSchema, type SteelData } from './steel-schema'

/**
 * How a layout is edited: a batch of commands on rows, sent whole, applied whole or not at all. Every command has an
 * inverse of the same kind, so undo is an ordinary batch.
 */

const TABLES = {
  levels: levelSchema,
  gridLines: gridLineSchema,
  edgeLines: edgeLineSchema,
  joints: jointSchema,
  obstructions: obstructionSchema,
  pours: pourSchema,
  edges: edgeSchema,
  pans: panSchema,
  tendons: tendonSchema,
  anchors: anchorSchema,
  steel: steelSchema,
  concreteResults: concreteResultSchema,
} as const
export type EditableTable = keyof typeof TABLES
export const EDITABLE_TABLES = Object.keys(TABLES) as EditableTable[]
export type Row<T extends EditableTable = EditableTable> = LayoutFile[T][number]

const tableSchema = z.enum(Object.keys(TABLES) as [EditableTable, ...EditableTable[]])
const rowSchema = z.looseObject({ id: idSchema })

/** `row` and `changes` are read again by the table's own schema when the command is applied. */
const commandSchema = z.discriminatedUnion('type', [
  z.strictObject({ type: z.literal('insert'), table: tableSchema, row: rowSchema }),
  z.strictObject({
    type: z.literal('set'),
    table: tableSchema,
    id: idSchema,
    changes: z.record(z.string(), z.unknown()),
  }),
  z.strictObject({ type: z.literal('remove'), table: tableSchema, id: idSchema }),
])
export type Command = z.output<typeof commandSchema>

export const batchSchema = z.strictObject({
  id: idSchema,
  jobId: idSchema,
  /** Version that the sender last saw of each unit that the commands touch; a new unit is 0. */
  bases: z.record(z.string(), z.number().int().min(0)),
  commands: z.array(commandSchema).min(1).max(5000),
})
export type Batch = z.output<typeof batchSchema>

/** One field of one row that the sender and somebody else changed. */
export interface Conflict {
  readonly table: EditableTable
  readonly id: string
  readonly field: string
  readonly mine: unknown
  readonly theirs: unknown
}

export interface Applied {
  readonly layout: LayoutFile
  /** Commands that bring the old layout back, in the order in which to apply them. */
  readonly inverse: readonly Command[]
  /** Units whose version counts up. */
  readonly units: readonly string[]
}

/** A row, and the field of it that is meant; null for the whole of it. */
interface CommandPlace {
  readonly table: EditableTable
  readonly id: string
  readonly field: string | null
}

/** A command that cannot be applied: `table`, `id` and `field` say where, the message what would be right. */
export class CommandError extends Error implements CommandPlace {
  override readonly name = 'CommandError'
  readonly table: EditableTable
  readonly id: string
  readonly field: string | null
  constructor(message: string, { table, id, field }: CommandPlace) {
    super(message)
    this.table = table
    this.id = id
    this.field = field
  }
}

/**
 * Applies commands in order to a layout and gives the new layout; the old one is left as it was.
 * @throws CommandError where a row is missing, exists already, or is not of its table's shape.
 */
export function applyCommands(layout: LayoutFile, commands: readonly Command[]): Applied {
  const draft = new Draft(layout)
  const inverse: Command[] = []
  for (const command of commands) inverse.push(applyOne(draft, command))
  return { layout: draft.finish(), inverse: inverse.reverse(), units: [...draft.units] }
}

/** Applies one command and gives the one that takes it back. */
function applyOne(draft: Draft, command: Command): Command {
  const { table } = command
  if (command.type === 'insert') {
    const row = readRow(table, command.row.id, command.row)
    if (draft.find(table, row.id))
      throw new CommandError('This row exists already.', { table, id: row.id, field: 'id' })
    draft.put(table, row)
    draft.touch(table, row)
    return { type: 'remove', table, id: row.id }
  }
  const before = draft.find(table, command.id)
  if (!before) throw new CommandError('This row is no longer there.', { table, id: command.id, field: 'id' })
  draft.touch(table, before)
  if (command.type === 'remove') {
    draft.remove(table, command.id)
    return { type: 'insert', table, row: before }
  }
  if ('id' in command.changes && command.changes.id !== command.id) {
    throw new CommandError('An id cannot be changed.', { table, id: command.id, field: 'id' })
  }
  const after = readRow(table, command.id, { ...before, ...command.changes })
  draft.put(table, after)
  draft.touch(table, after)
  return { type: 'set', table, id: command.id, changes: pick(before, Object.keys(command.changes)) }
}

function readRow(table: EditableTable, id: string, value: unknown): Row {
  const read = TABLES[table].safeParse(value)
  if (read.success) return read.data
  const issue = read.error.issues[0]
  throw new CommandError(issue?.message ?? 'cannot be read', { table, id, field: issue?.path.join('.') ?? null })
}

const pick = (row: Row, keys: readonly string[]): Record<string, unknown> =>
  Object.fromEntries(Object.entries(row).filter(([key]) => keys.includes(key)))

/** Working copy: a Map of rows for each table that a command touches, and the units whose version counts up. */
class Draft {
  readonly units = new Set<string>()
  private readonly touched = new Map<EditableTable, Map<string, Row>>()
  constructor(private readonly layout: LayoutFile) {}

  find(table: EditableTable, id: string): Row | undefined {
    return this.rows(table).get(id)
  }
  put(table: EditableTable, row: Row): void {
    this.rows(table).set(row.id, row)
  }
  remove(table: EditableTable, id: string): void {
    this.rows(table).delete(id)
  }
  /** Counts the unit that the row belongs to as it stands. */
  touch(table: EditableTable, row: Row): void {
    this.units.add(unitOf(table, row, (id) => this.find('anchors', id) as AnchorData | undefined))
  }
  finish(): LayoutFile {
    const tables = [...this.touched].map(([table, rows]) => [table, [...rows.values()]] as const)
    return { ...this.layout, ...Object.fromEntries(tables) }
  }
  private rows(table: EditableTable): Map<string, Row> {
    const known = this.touched.get(table)
    if (known) return known
    const list: readonly Row[] = this.layout[table]
    const rows = new Map(list.map((row) => [row.id, row]))
    this.touched.set(table, rows)
    return rows
  }
}

/**
 * The unit of editing that a row belongs to; it carries the version that a batch is held against: an edge, a pan, a
 * pour, a tendon (it reaches two edges, so it is a unit of its own) or the job.
 */
function unitOf(table: EditableTable, row: Row, anchorById: (id: string) => AnchorData | undefined): string {
  switch (table) {
    case 'pours':
    case 'edges':
    case 'pans':
    case 'tendons':
      return `${UNIT_NAMES[table]}:${row.id}`
    case 'anchors':
      return unitOfAnchor(row as AnchorData)
    case 'steel':
      return unitOfSteel(row as SteelData, anchorById)
    case 'concreteResults':
      return `pour:${(row as { pourId: string }).pourId}`
    case 'levels':
    case 'gridLines':
    case 'edgeLines':
    case 'joints':
    case 'obstructions':
      return 'job'
  }
}

const UNIT_NAMES = { pours: 'pour', edges: 'edge', pans: 'pan', tendons: 'tendon' } as const

const unitOfAnchor = ({ edgeId, panId }: AnchorData): string => (edgeId === null ? `pan:${panId}` : `edge:${edgeId}`)

function unitOfSteel({ zone, pourId }: SteelData, anchorById: (id: string) => AnchorData | undefined): string {
  switch (zone.kind) {
    case 'anchor': {
      const anchor = anchorById(zone.anchorId)
      return anchor ? unitOfAnchor(anchor) : `pour:${pourId}`
    }
    case 'gap':
    case 'edge':
      return `edge:${zone.edgeId}`
    case 'pan':
      return `pan:${zone.panId}`
    case 'joint':
      return 'job'
  }
}
