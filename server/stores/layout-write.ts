import { and, eq, getTableColumns, inArray, sql } from 'drizzle-orm'
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core'
import { EDITABLE_TABLES, type EditableTable, type LayoutFile, type Row } from '@wedgeline/contract'
import type { Tx } from '../../db/client'
import { edge, job, pan, pour, pourResult, tendon } from '../../db/schema'
import { created, ofJob, updated, type JobKey, type Stamp } from './job-key'
import { HOMES, toColumns, type Home, type LayoutTable } from './layout-rows'

export interface LayoutChange extends JobKey {
  readonly before: LayoutFile
  /** The same job after; a row that was not touched is the same object as before. */
  readonly after: LayoutFile
  /** Units that take `changeNumber` as their version. */
  readonly units: readonly string[]
  readonly changeNumber: number
  readonly stamp: Stamp
}

/** Rows in one statement; SQLite takes 32,766 values and no table here has more than 40 columns. */
const CHUNK = 400

/**
 * Writes what differs between two layouts of a job. References are looked at when the transaction ends, so that rows
 * may come and go in any order.
 */
export function storeChange(tx: Tx, change: LayoutChange): void {
  tx.run(sql`pragma defer_foreign_keys = on`)
  for (const name of EDITABLE_TABLES) {
    const { removed, added, changed } = difference(change.before[name], change.after[name])
    removeRows(tx, name, { key: change, ids: removed })
    addRows(tx, name, { change, rows: added })
    for (const row of changed) changeRow(tx, name, { change, row })
  }
  bumpVersions(tx, change)
}

interface Difference {
  readonly removed: readonly string[]
  readonly added: readonly Row[]
  readonly changed: readonly Row[]
}

/** Rows are compared by reference: whoever edits leaves an untouched row as it is. */
export function difference(before: readonly Row[], after: readonly Row[]): Difference {
  if (before === after) return { removed: [], added: [], changed: [] }
  const old = new Map(before.map((row) => [row.id, row]))
  const kept = new Set(after.map((row) => row.id))
  return {
    removed: before.filter((row) => !kept.has(row.id)).map((row) => row.id),
    added: after.filter((row) => !old.has(row.id)),
    changed: after.filter((row) => old.has(row.id) && old.get(row.id) !== row),
  }
}

function removeRows(tx: Tx, name: EditableTable, { key, ids }: { key: JobKey; ids: readonly string[] }): void {
  const home: Home = HOMES[name]
  for (const some of chunks(ids)) {
    removeParts(tx, home, { key, ids: some })
    if (name === 'pours') {
      tx.delete(pourResult)
        .where(and(ofJob(pourResult, key), inArray(pourResult.pourId, [...some])))
        .run()
    }
    tx.delete(home.table)
      .where(and(ofJob(home.table, key), inArray(home.table.id, [...some])))
      .run()
  }
}

function removeParts(tx: Tx, { parts }: Home, { key, ids }: { key: JobKey; ids: readonly string[] }): void {
  for (const { table, owner } of parts) {
    tx.delete(table)
      .where(and(ofJob(table, key), inArray(ownerColumn(table, owner), [...ids])))
      .run()
  }
}

function addRows(tx: Tx, name: EditableTable, { change, rows }: { change: LayoutChange; rows: readonly Row[] }): void {
  const { companyId, jobId, changeNumber, stamp } = change
  const home: Home = HOMES[name]
  const version = home.unit === null ? {} : { version: changeNumber }
  const full = rows.map((row) => ({ companyId, jobId, ...toColumns(name, row), ...version, ...created(stamp) }))
  insertAll(tx, home.table, full)
  addParts(tx, home, { key: change, rows })
}

function addParts(tx: Tx, { parts }: Home, { key, rows }: { key: JobKey; rows: readonly Row[] }): void {
  const { companyId, jobId } = key
  for (const { table, list, owner } of parts) {
    const all = rows.flatMap((row) =>
      listOf(row, list).map((part, position) => ({ companyId, jobId, [owner]: row.id, position, ...part })),
    )
    insertAll(tx, table, all)
  }
}

function changeRow(tx: Tx, name: EditableTable, { change, row }: { change: LayoutChange; row: Row }): void {
  const home: Home = HOMES[name]
  const { id: _, ...columns } = toColumns(name, row)
  tx.update(home.table)
    .set({ ...columns, ...updated(change.stamp) })
    .where(and(ofJob(home.table, change), eq(home.table.id, row.id)))
    .run()
  removeParts(tx, home, { key: change, ids: [row.id] })
  addParts(tx, home, { key: change, rows: [row] })
}

function bumpVersions(tx: Tx, { companyId, jobId, units, changeNumber, stamp }: LayoutChange): void {
  tx.update(job)
    .set({
      changeCount: changeNumber,
      ...(units.includes('job') ? { layoutVersion: changeNumber } : {}),
      ...updated(stamp),
    })
    .where(and(eq(job.companyId, companyId), eq(job.id, jobId)))
    .run()
  for (const [name, table] of Object.entries({ pour, edge, pan, tendon })) {
    const ids = units.filter((unit) => unit.startsWith(`${name}:`)).map((unit) => unit.slice(name.length + 1))
    for (const some of chunks(ids)) {
      tx.update(table)
        .set({ version: changeNumber })
        .where(and(ofJob(table, { companyId, jobId }), inArray(table.id, [...some])))
        .run()
    }
  }
}

function insertAll(tx: Tx, table: LayoutTable, rows: readonly Record<string, unknown>[]): void {
  for (const some of chunks(rows))
    tx.insert(table)
      .values([...some])
      .run()
}

function* chunks<T>(items: readonly T[]): Generator<readonly T[]> {
  for (let start = 0; start < items.length; start += CHUNK) yield items.slice(start, start + CHUNK)
}

function ownerColumn(table: LayoutTable, owner: string): SQLiteColumn {
  const columns: Record<string, SQLiteColumn> = getTableColumns(table)
  const column = columns[owner]
  if (!column) throw new Error(`A table of parts has no column ${owner}.`)
  return column
}

function listOf(row: Row, list: string): readonly Record<string, unknown>[] {
  const found = new Map<string, unknown>(Object.entries(row)).get(list)
  return Array.isArray(found) ? (found as Record<string, unknown>[]) : []
}
