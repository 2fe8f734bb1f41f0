import { ENGINE_VERSION, toEngine, type LayoutFile } from '@wedgeline/contract'
import { checkPour, type PourResult, type ZoneResult } from '@wedgeline/engine'
import { write, type Connection, type Db } from '../db/client'
import { countChange } from './stores/job'
import type { JobKey } from './stores/job-key'
import { loadLayout } from './stores/layout'
import { jobsNotCheckedBy, poursAmong, putResult, resultsOf } from './stores/result'

/** What the server found in some pours: what it stores is what counts. */
export interface Checked {
  /** Zones of the pours, without steps. */
  readonly results: readonly ZoneResult[]
  /** By pour. */
  readonly counts: Readonly<Record<string, PourResult['counts']>>
}

/** A layout as one change left it, and the pours of it that are to be checked. */
export interface ToCheck {
  readonly layout: LayoutFile
  readonly pourIds: readonly string[]
  /** The job's change count of then; results of an earlier one never replace those of a later one. */
  readonly changeNumber: number
  readonly atMs: number
}

/** Runs the engine over some pours of a layout and stores the results in place of older ones. */
export function checkPours(db: Connection, key: JobKey, toCheck: ToCheck): Checked {
  const found = resultsFor(toCheck)
  putResults(db, key, { ...toCheck, found })
  return toChecked(found)
}

/**
 * The same for a layout that is stored already: the engine runs while nobody waits for the right to write, and the
 * results go in afterwards. Somebody may have stored another change meanwhile; theirs then stand.
 */
export function checkStored(db: Db, key: JobKey, toCheck: ToCheck): Checked {
  const found = resultsFor(toCheck)
  write(db, (tx) => putResults(tx, key, { ...toCheck, found }))
  return toChecked(found)
}

function resultsFor({ layout, pourIds }: ToCheck): PourResult[] {
  const input = toEngine(layout)
  return pourIds.map((pourId) => checkPour(input, { pourId, withSteps: false }))
}

interface Found extends Pick<ToCheck, 'changeNumber' | 'atMs'> {
  readonly found: readonly PourResult[]
}

function putResults(db: Connection, key: JobKey, { found, changeNumber, atMs }: Found): void {
  const pours = poursAmong(
    db,
    key,
    found.map(({ pourId }) => pourId),
  )
  for (const result of found) {
    if (pours.has(result.pourId)) {
      putResult(db, { ...key, result, engineVersion: ENGINE_VERSION, changeNumber, atMs })
    }
  }
}

/** What was found last in some pours. */
export const latestResults = (db: Connection, key: JobKey, pourIds: readonly string[]): Checked =>
  toChecked(resultsOf(db, key, pourIds))

const toChecked = (found: readonly Pick<PourResult, 'pourId' | 'zones' | 'counts'>[]): Checked => ({
  results: found.flatMap((result) => result.zones),
  counts: Object.fromEntries(found.map((result) => [result.pourId, result.counts])),
})

/** Checks a whole job again: after a change of its basis, its readings or its company's hardware, which counts. */
export function recheckJob(db: Connection, key: JobKey, atMs: number): void {
  const changeNumber = countChange(db, key)
  const layout = loadLayout(db, key)
  checkPours(db, key, { layout, pourIds: layout.pours.map(({ id }) => id), changeNumber, atMs })
}

/**
 * Checks every job again that holds results of another engine than this one, or none where the server stopped between
 * a change and its checks; each in a transaction of its own.
 * @param onFailure told of a job that could not be checked; its old results stay, with the version that made them.
 */
export function recheckOutdated(db: Db, atMs: number, onFailure: (key: JobKey, error: unknown) => void): void {
  for (const key of jobsNotCheckedBy(db, ENGINE_VERSION)) {
    try {
      write(db, (tx) => recheckJob(tx, key, atMs))
    } catch (error) {
      onFailure(key, error)
    }
  }
}
