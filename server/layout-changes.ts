import {
  EDITABLE_TABLES,
  type Command,
  type Conflict,
  type EditableTable,
  type LayoutFile,
  type Row,
} from '@wedgeline/contract'
import { difference } from './stores/layout-write'

/** A row as it was or is: all of it where it came or went, its changed fields where it stayed, null where it is not. */
export interface RowChange {
  readonly table: EditableTable
  readonly id: string
  readonly row: Readonly<Record<string, unknown>> | null
}

/** What differs between two layouts of a job, row by row, before and after in the same order. */
export function changesOf(before: LayoutFile, after: LayoutFile): { before: RowChange[]; after: RowChange[] } {
  const was: RowChange[] = []
  const is: RowChange[] = []
  for (const table of EDITABLE_TABLES) {
    const old = rowsById(before[table])
    const { removed, added, changed } = difference(before[table], after[table])
    for (const id of removed) {
      was.push({ table, id, row: old.get(id) ?? null })
      is.push({ table, id, row: null })
    }
    for (const row of added) {
      was.push({ table, id: row.id, row: null })
      is.push({ table, id: row.id, row: { ...row } })
    }
    for (const row of changed) {
      const earlier = old.get(row.id) ?? {}
      const fields = changedFields(earlier, row)
      was.push({ table, id: row.id, row: pick(earlier, fields) })
      is.push({ table, id: row.id, row: pick(row, fields) })
    }
  }
  return { before: was, after: is }
}

/**
 * Fields that a batch would set and that others changed to something else since its sender looked. A row that one side
 * took away is a conflict of its id: null stands for the side on which it is gone.
 */
export function conflictsOf(today: LayoutFile, mine: readonly Command[], theirs: readonly RowChange[]): Conflict[] {
  const changed = new Map<string, Set<string>>()
  for (const { table, id, row } of theirs) {
    const fields = changed.get(`${table} ${id}`) ?? new Set()
    for (const field of Object.keys(row ?? { id })) fields.add(field)
    changed.set(`${table} ${id}`, fields)
  }
  const rows = new Map(EDITABLE_TABLES.map((table) => [table, rowsById(today[table])]))
  return mine.flatMap((command) => {
    const { table } = command
    const id = command.type === 'insert' ? command.row.id : command.id
    const fields = changed.get(`${table} ${id}`)
    if (!fields) return []
    return conflictsOfRow(command, { id, row: rows.get(table)?.get(id), fields })
  })
}

interface TheirRow {
  readonly id: string
  /** Undefined where it is gone. */
  readonly row: Readonly<Record<string, unknown>> | undefined
  readonly fields: ReadonlySet<string>
}

function conflictsOfRow(command: Command, { id, row, fields }: TheirRow): Conflict[] {
  const head = { table: command.table, id }
  switch (command.type) {
    case 'insert':
      return row && !isSame(row, command.row) ? [{ ...head, field: 'id', mine: command.row, theirs: row }] : []
    case 'remove':
      return row ? [{ ...head, field: 'id', mine: null, theirs: row }] : []
    case 'set':
      if (!row) return [{ ...head, field: 'id', mine: command.changes, theirs: null }]
      return Object.entries(command.changes)
        .filter(([field, value]) => fields.has(field) && !isSame(value, row[field]))
        .map(([field, value]) => ({ ...head, field, mine: value, theirs: row[field] }))
  }
}

const rowsById = (rows: readonly Row[]): ReadonlyMap<string, Readonly<Record<string, unknown>>> =>
  new Map(rows.map((row) => [row.id, row as object as Record<string, unknown>]))

const changedFields = (before: Readonly<Record<string, unknown>>, after: Row): string[] =>
  Object.entries(after)
    .filter(([field, value]) => !isSame(value, before[field]))
    .map(([field]) => field)

const pick = (row: object, fields: readonly string[]): Record<string, unknown> =>
  Object.fromEntries(Object.entries(row).filter(([field]) => fields.includes(field)))

/** Whether two values of plain JSON are the same, whatever the order of their keys. */
function isSame(a: unknown, b: unknown): boolean {
  if (a === b) return true
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false
  if (Array.isArray(a) !== Array.isArray(b)) return false
  const one = Object.entries(a)
  const other = new Map(Object.entries(b))
  return one.length === other.size && one.every(([key, value]) => other.has(key) && isSame(value, other.get(key)))
}
