import { ENGINE_VERSION, toEngine, type LayoutFile } from '@wedgeline/contract'
import type { PourResult, ZoneResult } from '@wedgeline/engine'
import { write, type Connection, type Db, type Tx } from '../db/client'
import { countChange } from './stores/job'
import type { JobKey } from './stores/job-key'
import { loadLayout } from './stores/layout'
import { jobsNotCheckedBy, markOvertaken, poursAmong, putResult, resultsOf } from './stores/result'
import type { CheckTask } from './workers/engine-pool'

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

/** Where checks are stored, and what makes them. */
export interface Checking {
  readonly db: Db
  readonly check: CheckTask
}

/**
 * Checks some pours of a layout that is stored already: the engine runs while nobody waits for the right to write, and
 * the results go in afterwards. Somebody may have stored another change meanwhile; theirs then stand.
 */
export async function checkStored({ db, check }: Checking, key: JobKey, toCheck: ToCheck): Promise<Checked> {
  const { layout, pourIds } = toCheck
  const found = pourIds.length === 0 ? [] : await check({ layout: toEngine(layout), pourIds })
  write(db, (tx) => putResults(tx, key, { ...toCheck, found }))
  return toChecked(found)
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

/**
 * Says that no result of a job holds any longer: after a change of its basis, its readings or its company's hardware,
 * which counts as a change of the job.
 * @returns what is to be checked once the change is stored
 */
export function overtakeJob(tx: Tx, key: JobKey, atMs: number): ToCheck {
  const changeNumber = countChange(tx, key)
  const layout = loadLayout(tx, key)
  const pourIds = layout.pours.map(({ id }) => id)
  markOvertaken(tx, key, pourIds)
  return { layout, pourIds, changeNumber, atMs }
}

/**
 * Checks every job again that holds results of another engine than this one, or none where the server stopped between
 * a change and its checks.
 * @param onFailure told of a job that could not be checked; its old results stay, with the version that made them.
 */
export async function recheckOutdated(
  checking: Checking,
  atMs: number,
  onFailure: (key: JobKey, error: unknown) => void,
): Promise<void> {
  for (const key of jobsNotCheckedBy(checking.db, ENGINE_VERSION)) {
    try {
      await checkStored(
        checking,
        key,
        write(checking.db, (tx) => overtakeJob(tx, key, atMs)),
      )
    } catch (error) {
      onFailure(key, error)
    }
  }
}
