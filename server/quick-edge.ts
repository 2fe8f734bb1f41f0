import { EDITABLE_TABLES, type LayoutFile, type PourData } from '@wedgeline/contract'
import { write, type Connection, type Tx } from '../db/client'
import { authoriseJob, requireRole } from './access'
import { checkStored, type ToCheck } from './checking'
import { conflict, refused } from './failure'
import { keyOf, stampOf } from './job-call'
import { unitsOf, withoutRows } from './job-import'
import { assertNoNewProblem } from './layout-editing'
import { renewIds } from './layout-ids'
import { recordAudit } from './stores/audit'
import { deleteJobMembers, jobRow } from './stores/job'
import type { JobKey } from './stores/job-key'
import { loadLayout } from './stores/layout'
import { storeChange } from './stores/layout-write'
import { storing } from './storing'
import type { JobCall, JobOfCall } from './trpc/context'

/** A quick edge is an ordinary job that is marked as unfiled, until it is given a name or its pour goes into a job. */

/** @throws Failure for a quick edge: it runs on readings that nobody has accepted. */
export function assertFiled(db: Connection, { companyId, id }: JobOfCall): void {
  if (!jobRow(db, { companyId, jobId: id }).isUnfiled) return
  throw conflict('A quick edge cannot be issued: its readings are not accepted. Keep it in a job first, then export.')
}

export interface Filing {
  readonly intoJobId: string
  /** Mark of the pour in that job. */
  readonly mark: string
  readonly level: { readonly id: string } | { readonly mark: string }
}

export interface Filed {
  readonly jobId: string
  readonly pourId: string
  readonly edgeIds: readonly string[]
}

/**
 * Puts the pour of a quick edge, with all that belongs to it, into another job of the company under new ids, beside
 * what is there; the quick edge is then taken away. The job's own basis, settings and readings hold from now on.
 * @throws Failure where the caller may not edit that job, where the quick edge is filed already or holds more than one
 * pour, and where a mark is taken.
 */
export async function fileQuickEdge(ctx: JobCall, filing: Filing): Promise<Filed> {
  const { job, company } = authoriseJob(ctx, filing.intoJobId)
  requireRole(company, ['detailer', 'engineer'])
  if (job.companyId !== ctx.company.id) throw refused('That job is of another company.', 'intoJobId')
  const into: JobKey = { companyId: job.companyId, jobId: job.id }
  const { filed, toCheck } = storing(() => write(ctx.db, (tx) => storeFiled(ctx, tx, { ...filing, into })))
  await checkStored(ctx, into, toCheck)
  return filed
}

interface Stored {
  readonly filed: Filed
  readonly toCheck: ToCheck
}

function storeFiled(ctx: JobCall, tx: Tx, filing: Filing & { readonly into: JobKey }): Stored {
  const { into } = filing
  const key = keyOf(ctx)
  const stamp = stampOf(ctx)
  const source = jobRow(tx, key)
  if (!source.isUnfiled) throw conflict('This is an ordinary job by now. It stays where it is.')
  const target = jobRow(tx, into)
  if (target.isUnfiled) throw refused('That is a quick edge as well. Choose an ordinary job.', 'intoJobId')
  const quick = loadLayout(tx, key)
  const before = loadLayout(tx, into)
  const added = addedRows(quick, before, filing)
  const after = { ...before, ...joined(before, added) }
  assertNoNewProblem(before, after)
  const changeNumber = target.changeCount + 1
  storeChange(tx, { ...into, before, after, units: unitsOf(added), changeNumber, stamp })
  const [pour] = added.pours
  const pourId = pour?.id ?? ''
  const { number, title } = source
  recordAudit(tx, {
    ...into,
    ...stamp,
    what: 'job.fileQuickEdge',
    before: null,
    after: { from: { jobId: key.jobId, number, title }, pourId, mark: filing.mark },
  })
  takeAway(tx, key, { quick, stamp, changeNumber: source.changeCount + 1 })
  recordAudit(tx, { ...key, ...stamp, what: 'job.fileQuickEdge', before: { number, title }, after: { into, pourId } })
  const filed = { jobId: into.jobId, pourId, edgeIds: added.edges.map(({ id }) => id) }
  return { filed, toCheck: { layout: after, pourIds: [pourId], changeNumber, atMs: stamp.atMs } }
}

/** The record of what was done on it stays, so the job does: with nothing in it and nobody on it. */
function takeAway(
  tx: Tx,
  key: JobKey,
  { quick, ...rest }: { quick: LayoutFile; stamp: ReturnType<typeof stampOf>; changeNumber: number },
): void {
  storeChange(tx, { ...key, ...rest, before: quick, after: withoutRows(quick), units: ['job'] })
  deleteJobMembers(tx, key)
}

const joined = (before: LayoutFile, added: LayoutFile): Partial<LayoutFile> =>
  Object.fromEntries(EDITABLE_TABLES.map((table) => [table, [...before[table], ...added[table]]]))

/** The rows of the quick edge as they stand in the job: ids, level, marks and place. */
function addedRows(quick: LayoutFile, job: LayoutFile, { mark, level, into }: Filing & { into: JobKey }): LayoutFile {
  const [pour, second] = quick.pours
  if (!pour) throw refused('This quick edge has no pour left. There is nothing to keep.', 'jobId')
  if (second) {
    throw refused(
      `This quick edge has ${quick.pours.length} pours by now. Give it a number and a title of its own instead.`,
      'jobId',
    )
  }
  const renewed = renewIds(quick, { jobId: into.jobId, ...companyIds(quick) })
  const known = 'id' in level ? job.levels.find(({ id }) => id === level.id) : undefined
  if ('id' in level && !known) throw refused('That level is not in the job any more. Choose another.', 'level')
  if (known && job.pours.some((other) => other.levelId === known.id && other.mark === mark)) {
    throw refused(`Level ${known.mark} has a pour ${mark} already. Choose another mark.`, 'mark')
  }
  if ('mark' in level && job.levels.some((other) => other.mark === level.mark)) {
    throw refused(`The job has a level ${level.mark} already. Choose it, or another mark.`, 'level')
  }
  const home = known ?? { id: renewed.levels[0]?.id ?? '', mark: 'mark' in level ? level.mark : '', title: '' }
  const named = withFreeMarks(withLevel(renewed, home.id), job, home.id)
  const placed = shifted(named, downBeside(named.pours, job, home.id))
  return {
    ...placed,
    levels: known ? [] : [home],
    // Grid lines belong to the building; those of a quick edge are its own.
    gridLines: [],
    pours: placed.pours.map((row) => ({ ...row, mark })),
  }
}

/** Hardware, jacks and strand types are the company's: they keep their ids. */
function companyIds({ strandTypes, jacks, hardware }: LayoutFile) {
  const same = (rows: readonly { readonly id: string }[]) => new Map(rows.map(({ id }) => [id, id]))
  return { strandTypes: same(strandTypes), jacks: same(jacks), hardware: same(hardware) }
}

function withLevel(layout: LayoutFile, levelId: string): LayoutFile {
  const on = <T extends { readonly levelId: string }>(row: T): T => ({ ...row, levelId })
  return {
    ...layout,
    edgeLines: layout.edgeLines.map(on),
    obstructions: layout.obstructions.map(on),
    pours: layout.pours.map(on),
  }
}

/** Edges, their lines and pans take the next free number of the level where their mark is taken there. */
function withFreeMarks(layout: LayoutFile, job: LayoutFile, levelId: string): LayoutFile {
  const pours = new Set(job.pours.filter((pour) => pour.levelId === levelId).map(({ id }) => id))
  const here = <T extends { readonly pourId: string }>(rows: readonly T[]) =>
    rows.filter(({ pourId }) => pours.has(pourId))
  const lines = job.edgeLines.filter((line) => line.levelId === levelId)
  const edges = freeMarks([...layout.edgeLines, ...layout.edges], [...lines, ...here(job.edges)], 'E')
  const pans = freeMarks(layout.pans, here(job.pans), 'P')
  return {
    ...layout,
    edgeLines: layout.edgeLines.map(edges),
    edges: layout.edges.map(edges),
    pans: layout.pans.map(pans),
  }
}

interface Marked {
  readonly mark: string
}

/** Gives a row its new mark; one mark is renamed to the same mark wherever it stands. */
function freeMarks(rows: readonly Marked[], there: readonly Marked[], prefix: string) {
  const taken = new Set(there.map(({ mark }) => mark))
  const marks = new Map<string, string>()
  for (const { mark } of rows) {
    if (marks.has(mark)) continue
    let free = mark
    for (let number = 1; taken.has(free); number++) free = `${prefix}${number}`
    taken.add(free)
    marks.set(mark, free)
  }
  return <T extends Marked>(row: T): T => ({ ...row, mark: marks.get(row.mark) ?? row.mark })
}

/** Left between the pour and what its level holds already, mm. */
const BESIDE_MM = 5000

/** How far up the plan (down, where negative) the pour moves so that it stands clear of every other of its level: somebody then places it. */
function downBeside(pours: readonly PourData[], job: LayoutFile, levelId: string): number {
  const ys = (some: readonly PourData[]) => some.flatMap(({ outline }) => outline.map(({ yMm }) => yMm))
  const there = ys(job.pours.filter((pour) => pour.levelId === levelId))
  return there.length === 0 ? 0 : Math.min(...there) - BESIDE_MM - Math.max(...ys(pours))
}

function shifted(layout: LayoutFile, byMm: number): LayoutFile {
  const move = <T extends { readonly yMm: number }>(point: T): T => ({ ...point, yMm: point.yMm + byMm })
  const outlined = <T extends { readonly outline: readonly { readonly xMm: number; readonly yMm: number }[] }>(
    row: T,
  ) => ({
    ...row,
    outline: row.outline.map(move),
  })
  return {
    ...layout,
    edgeLines: layout.edgeLines.map(move),
    obstructions: layout.obstructions.map(outlined),
    pours: layout.pours.map((pour) => ({ ...outlined(pour), regions: pour.regions.map(outlined) })),
    pans: layout.pans.map(move),
    tendons: layout.tendons.map((tendon) => ({ ...tendon, path: tendon.path.map(move) })),
  }
}
