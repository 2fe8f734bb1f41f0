import { createHash } from 'node:crypto'
import {
  CommandError,
  EDITABLE_TABLES,
  LIMITS,
  applyCommands,
  layoutProblems,
  type Applied,
  type Batch,
  type Command,
  type Conflict,
  type LayoutFile,
  type PourData,
  type Problem,
} from '@wedgeline/contract'
import { write, type Connection, type Tx } from '../db/client'
import { checkStored, latestResults, type Checked, type ToCheck } from './checking'
import { conflict, forbidden, refused } from './failure'
import { changesOf, conflictsOf, type RowChange } from './layout-changes'
import { changesSince, recordAudit } from './stores/audit'
import { batchById, insertBatch, type StoredBatch } from './stores/batch'
import { jobRow } from './stores/job'
import type { JobKey } from './stores/job-key'
import { loadLayout, loadVersions, type Versions } from './stores/layout'
import { storeChange } from './stores/layout-write'
import { areChecked, markOvertaken } from './stores/result'
import { storing } from './storing'
import { keyOf, stampOf } from './job-call'
import type { JobCall } from './trpc/context'

export interface BatchAnswer extends Checked {
  /** Today's version of each unit that the batch touched; 0 for one that is gone. */
  readonly versions: Versions
}

/**
 * Applies a batch whole or not at all, checks the pours that it touches and says who did it. The same batch sent again
 * by the same person gets the same answer and changes nothing.
 * @throws Failure when the batch is stale (with both values), its id was used for something else, or the change is
 * not the person's to make; CommandError when a row cannot be taken.
 */
export async function applyBatch(ctx: JobCall, batch: Batch): Promise<BatchAnswer> {
  const { db } = ctx
  const key = keyOf(ctx)
  const { versions, pourIds, toCheck } = storing(() => write(db, (tx) => storeBatch(ctx, tx, batch)))
  const checked = toCheck ? await checkStored(ctx, key, toCheck) : latestResults(db, key, pourIds)
  return { versions, ...checked }
}

interface Stored {
  readonly versions: Versions
  readonly pourIds: readonly string[]
  /** Null where the latest results are those of the layout as it is. */
  readonly toCheck: ToCheck | null
}

function storeBatch(ctx: JobCall, tx: Tx, batch: Batch): Stored {
  const key = keyOf(ctx)
  const payloadHash = createHash('sha256').update(JSON.stringify(batch)).digest('hex')
  const known = batchById(tx, { companyId: key.companyId, id: batch.id })
  if (known) {
    const isSame = known.personId === ctx.person.id && known.payloadHash === payloadHash
    return storedBefore(tx, { known, isSame, atMs: ctx.now() })
  }
  const stamp = stampOf(ctx)
  assertOwnPart(ctx, batch)
  const { before, applied } = applyToday(tx, key, batch)
  assertSpareShare(ctx, before, applied.layout)
  assertNoNewProblem(before, applied.layout)
  const changeNumber = jobRow(tx, key).changeCount + 1
  const { layout: after, units } = applied
  storeChange(tx, { ...key, before, after, units, changeNumber, stamp })
  recordAudit(tx, { ...key, ...stamp, what: 'layout.applyBatch', ...changesOf(before, after), changeNumber })
  const pourIds = touchedPours(before, after, units)
  markOvertaken(tx, key, pourIds)
  const today = loadVersions(tx, key)
  const versions = Object.fromEntries(units.map((unit) => [unit, today[unit] ?? 0]))
  insertBatch(tx, { ...key, ...stamp, id: batch.id, payloadHash, versions, pourIds, changeNumber })
  return { versions, pourIds, toCheck: { layout: after, pourIds, changeNumber, atMs: stamp.atMs } }
}

/**
 * A reply that got lost on its way is asked for again: the versions of then, and the latest results; those are made now
 * where the server stopped before they were.
 */
function storedBefore(tx: Tx, { known, isSame, atMs }: { known: StoredBatch; isSame: boolean; atMs: number }): Stored {
  if (!isSame) {
    throw conflict('A change with this id was stored before and it was another one. Give each change an id of its own.')
  }
  const { versions, pourIds } = known
  if (areChecked(tx, known, pourIds)) return { versions, pourIds, toCheck: null }
  const layout = loadLayout(tx, known)
  const left = layout.pours.map(({ id }) => id).filter((id) => pourIds.includes(id))
  return { versions, pourIds, toCheck: { layout, pourIds: left, changeNumber: jobRow(tx, known).changeCount, atMs } }
}

/** The batch on today's layout, when its sender saw today's version of everything that it touches. */
function applyToday(db: Connection, key: JobKey, batch: Batch): { before: LayoutFile; applied: Applied } {
  const before = loadLayout(db, key)
  const today = loadVersions(db, key)
  const isStale = (unit: string) => (batch.bases[unit] ?? 0) !== (today[unit] ?? 0)
  const refuseStale = (units: readonly string[]) => {
    const stale = units.filter(isStale)
    if (stale.length === 0) return
    const since = Math.min(...stale.map((unit) => batch.bases[unit] ?? 0))
    const theirs = changesSince(db, key, since).flatMap((after) => after as RowChange[])
    throw staleBatch(
      conflictsOf(before, batch.commands, theirs),
      Object.fromEntries(stale.map((unit) => [unit, today[unit] ?? 0])),
    )
  }
  // First what the sender names: a command that fails because somebody removed its row is a conflict, no mistake.
  refuseStale(Object.keys(batch.bases))
  const applied = applyCommands(before, batch.commands)
  refuseStale(applied.units)
  return { before, applied }
}

const staleBatch = (conflicts: readonly Conflict[], versions: Versions) =>
  conflict('Somebody else changed this meanwhile. Nothing of your change was stored; look at both values and choose.', {
    conflicts,
    versions,
  })

/** What a drafter has in hand without being a detailer: how the marks of a pour begin, and how its bars come. */
const OF_THE_SCHEDULE: readonly string[] = ['markPrefix', 'firstMark', 'deliveries'] satisfies (keyof PourData)[]

function assertOwnPart({ company }: JobCall, { commands }: Batch): void {
  if (company.roles.some((role) => role === 'detailer' || role === 'engineer')) return
  const isOfTheSchedule = (command: Command) =>
    command.type === 'set' &&
    command.table === 'pours' &&
    Object.keys(command.changes).every((field) => OF_THE_SCHEDULE.includes(field))
  if (!commands.every(isOfTheSchedule)) {
    throw forbidden(
      'A drafter changes the prefix of marks, the first mark and the deliveries of a pour; the rest of the layout is for a detailer or an engineer.',
    )
  }
}

/** That steel of a mat is spare is for an engineer to say. */
function assertSpareShare({ company }: JobCall, before: LayoutFile, after: LayoutFile): void {
  if (company.roles.includes('engineer') || before.pours === after.pours) return
  const known = new Map(before.pours.flatMap((pour) => pour.mats).map((mat) => [mat.id, mat]))
  const isNew = after.pours
    .flatMap((pour) => pour.mats)
    .some((mat) => {
      const old = known.get(mat.id) ?? { spareShare: 0, spareBy: null }
      return mat.spareShare !== old.spareShare || mat.spareBy !== old.spareBy
    })
  if (isNew) throw forbidden('The spare share of a mat is set by an engineer.')
}

const TABLE_LIMITS = {
  pours: LIMITS.pours,
  edges: LIMITS.edges,
  anchors: LIMITS.anchors,
  tendons: LIMITS.anchors,
  steel: LIMITS.steel,
} as const

/** @throws for what would make the layout contradict itself; what was so before stays to be mended. */
export function assertNoNewProblem(before: LayoutFile, after: LayoutFile): void {
  for (const [table, limit] of Object.entries(TABLE_LIMITS)) {
    const count = after[table as keyof typeof TABLE_LIMITS].length
    if (count > limit)
      throw refused(`A job has at most ${limit} ${table}; with this change it would have ${count}.`, table)
  }
  const isRefused = ({ severity }: Problem) => severity === 'refused'
  const problems = layoutProblems(after).filter(isRefused)
  if (problems.length === 0) return
  const old = new Set(
    layoutProblems(before)
      .filter(isRefused)
      .map((problem) => problem.message),
  )
  const fresh = problems.find((problem) => !old.has(problem.message))
  if (fresh) throw problemError(after, fresh)
}

function problemError(layout: LayoutFile, { path, field, message }: Problem): Error {
  const [tableName, index, ...rest] = path
  const table = EDITABLE_TABLES.find((each) => each === tableName)
  const row = table && typeof index === 'number' ? layout[table][index] : undefined
  return table && row
    ? new CommandError(message, { table, id: row.id, field: rest.join('.') || null })
    : refused(message, field)
}

/**
 * Pours whose checks a change of these units can move: those of the units, and those that share an edge line with one
 * of them, because anchors and gaps are checked along the whole line.
 */
function touchedPours(before: LayoutFile, after: LayoutFile, units: readonly string[]): string[] {
  if (units.includes('job')) return after.pours.map(({ id }) => id)
  const isTouched = (kind: string, id: string) => units.includes(`${kind}:${id}`)
  const pourIds = new Set<string>()
  for (const layout of [before, after]) {
    for (const { id } of layout.pours) if (isTouched('pour', id)) pourIds.add(id)
    for (const { id, pourId } of layout.edges) if (isTouched('edge', id)) pourIds.add(pourId)
    for (const { id, pourId } of layout.pans) if (isTouched('pan', id)) pourIds.add(pourId)
    for (const { id, pourId } of layout.tendons) if (isTouched('tendon', id)) pourIds.add(pourId)
    for (const { tendonId, castWithPourId } of layout.anchors)
      if (isTouched('tendon', tendonId)) pourIds.add(castWithPourId)
  }
  const lines = new Set(after.edges.filter(({ pourId }) => pourIds.has(pourId)).map(({ edgeLineId }) => edgeLineId))
  for (const { edgeLineId, pourId } of after.edges) if (lines.has(edgeLineId)) pourIds.add(pourId)
  return after.pours.map(({ id }) => id).filter((id) => pourIds.has(id))
}
