import { ENGINE_VERSION, toEngine, type LayoutFile } from '@wedgeline/contract'
import { checkPour, type PourResult, type ZoneResult } from '@wedgeline/engine'
import { write, type Connection, type Db } from '../db/client'
import { jobRow } from './stores/job'
import type { JobKey } from './stores/job-key'
import { loadLayout } from './stores/layout'
import { jobsNotCheckedBy, putResult, resultsOf } from './stores/result'

/** What the server found in some pours: what it stores is what counts. */
export interface Checked {
  /** Zones of the pours, without steps. */
  readonly results: readonly ZoneResult[]
  /** By pour. */
  readonly counts: Readonly<Record<string, PourResult['counts']>>
}

/** Runs the engine over some pours of a layout and stores the results in place of those that were there. */
export function checkPours(
  db: Connection,
  key: JobKey,
  { layout, pourIds, atMs }: { layout: LayoutFile; pourIds: readonly string[]; atMs: number },
): Checked {
  const input = toEngine(layout)
  const { changeCount: changeNumber } = jobRow(db, key)
  const found = pourIds.map((pourId) => checkPour(input, { pourId, withSteps: false }))
  for (const result of found) putResult(db, { ...key, result, engineVersion: ENGINE_VERSION, changeNumber, atMs })
  return toChecked(found)
}

/** What was found last in some pours. */
export const latestResults = (db: Connection, key: JobKey, pourIds: readonly string[]): Checked =>
  toChecked(resultsOf(db, key, pourIds))

const toChecked = (found: readonly Pick<PourResult, 'pourId' | 'zones' | 'counts'>[]): Checked => ({
  results: found.flatMap((result) => result.zones),
  counts: Object.fromEntries(found.map((result) => [result.pourId, result.counts])),
})

/** Checks a whole job again: after a change of its basis, its readings or its company's hardware. */
export function recheckJob(db: Connection, key: JobKey, atMs: number): void {
  const layout = loadLayout(db, key)
  checkPours(db, key, { layout, pourIds: layout.pours.map(({ id }) => id), atMs })
}

/**
 * Checks every job again that holds results of another engine than this one, each in a transaction of its own.
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
