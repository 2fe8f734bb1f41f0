import { v7 as uuidv7 } from 'uuid'
import { EDITABLE_TABLES, readLayout, type LayoutFile } from '@wedgeline/contract'
import { write, type Connection } from '../db/client'
import { checkStored, type Checking, type ToCheck } from './checking'
import { Failure, forbidden } from './failure'
import { stampOf, type StoringCall } from './job-call'
import { renewIds, type KnownIds } from './layout-ids'
import { recordAudit } from './stores/audit'
import { insertBarMarks } from './stores/bar-mark'
import {
  hardwareOf,
  putHardware,
  putJack,
  putStrandType,
  type CompanyHardware,
  type CompanyStamp,
} from './stores/hardware'
import { insertJob, insertJobMember } from './stores/job'
import type { JobKey } from './stores/job-key'
import { loadLayout } from './stores/layout'
import { storeChange } from './stores/layout-write'
import { storing } from './storing'

export interface Imported {
  readonly jobId: string
  /** What the file held and the job does not, because it was not the caller's to bring. Whole sentences. */
  readonly leftOut: readonly string[]
}

/**
 * Makes a job from a layout file, under new ids; with `isUnfiled` a quick edge. Hardware, jacks and strand types that the company has with the same
 * name and content are used; others are added to it.
 * @param json the layout as its file holds it, of whatever shape
 * @throws Failure with every problem of a layout that cannot be read or contradicts itself, as the command line names
 * them; and for factors that are not the caller's to set.
 */
export async function importLayout(
  ctx: StoringCall & Checking,
  json: unknown,
  options: { readonly isUnfiled?: boolean } = {},
): Promise<Imported> {
  const { jobId, leftOut, toCheck } = storeImport(ctx, json, options)
  await checkStored(ctx, { companyId: ctx.company.id, jobId }, toCheck)
  return { jobId, leftOut }
}

/** The same without its checks, which wait until what is stored is there to stay. */
export function storeImport(
  ctx: StoringCall,
  json: unknown,
  { isUnfiled = false }: { readonly isUnfiled?: boolean } = {},
): Imported & { readonly toCheck: ToCheck } {
  const { db, company, person } = ctx
  const { layout, leftOut } = permitted(ctx, soundLayout(json))
  const key: JobKey = { companyId: company.id, jobId: uuidv7() }
  const toCheck = storing(() =>
    write(db, (tx) => {
      const stamp = stampOf(ctx)
      const renewed = mergeHardware(tx, { jobId: key.jobId, layout, stamp: { companyId: company.id, ...stamp } })
      insertJob(tx, { companyId: company.id, data: renewed.job, isUnfiled, stamp })
      insertJobMember(tx, key, { personId: person.id, stamp })
      const units = unitsOf(renewed)
      storeChange(tx, { ...key, before: withoutRows(renewed), after: renewed, units, changeNumber: 1, stamp })
      // Nobody has been handed a mark of a quick edge.
      insertBarMarks(tx, key, { marks: isUnfiled ? [] : renewed.barMarks, atMs: stamp.atMs })
      const { number, title } = renewed.job
      const rows = Object.fromEntries(EDITABLE_TABLES.map((table) => [table, renewed[table].length]))
      recordAudit(tx, {
        ...key,
        ...stamp,
        what: 'job.importLayout',
        before: null,
        after: { number, title, isUnfiled, rows, leftOut },
      })
      const pourIds = renewed.pours.map(({ id }) => id)
      return { layout: loadLayout(tx, key), pourIds, changeNumber: 1, atMs: stamp.atMs }
    }),
  )
  return { jobId: key.jobId, leftOut, toCheck }
}

function soundLayout(json: unknown): LayoutFile {
  const read = readLayout(json)
  if (read.ok) return read.layout
  const problems = read.problems
    .filter(({ severity }) => severity === 'refused')
    .map(({ field, message }) => ({ field, message }))
  const [first, ...others] = problems
  const more = others.length === 0 ? '' : ` ${others.length} more ${others.length === 1 ? 'problem' : 'problems'}.`
  throw new Failure('refused', `${first?.field}: ${first?.message}.${more}`, { problems })
}

/** What only an engineer may say of a job comes in with an engineer alone. */
function permitted({ company }: StoringCall, file: LayoutFile): { layout: LayoutFile; leftOut: string[] } {
  const { job, pours } = file
  if (company.roles.includes('engineer')) return { layout: file, leftOut: [] }
  if (job.factors.length > 0 || job.settings.wedgeSpreadDeg !== null) {
    throw forbidden('This file sets factors or an angle of spread of its own. An engineer of your company imports it.')
  }
  const hasSpare = pours.some(({ mats }) => mats.some(({ spareShare }) => spareShare > 0))
  return {
    layout: {
      ...file,
      job: { ...job, readings: [] },
      pours: pours.map((pour) => ({
        ...pour,
        mats: pour.mats.map((mat) => ({ ...mat, spareShare: 0, spareBy: null })),
      })),
    },
    leftOut: [
      ...(job.readings.length > 0
        ? ['Accepted readings were left out: an engineer of your company accepts each.']
        : []),
      ...(hasSpare ? ['Spare shares of mats were left out: an engineer of your company sets them.'] : []),
    ],
  }
}

interface Merging {
  readonly jobId: string
  readonly layout: LayoutFile
  readonly stamp: CompanyStamp
}

/** The layout under new ids, with what the company did not have yet stored for it. */
function mergeHardware(db: Connection, { jobId, layout, stamp }: Merging): LayoutFile {
  const own = hardwareOf(db, stamp.companyId)
  const strandTypes = idsFor(layout.strandTypes, own.strandTypes)
  const jacks = idsFor(layout.jacks, own.jacks)
  const withJack = layout.hardware.map((row) => ({
    ...row,
    jackId: row.jackId === null ? null : (jacks.get(row.jackId) ?? null),
  }))
  const hardware = idsFor(withJack, own.hardware)
  const renewed = renewIds(layout, { jobId, strandTypes, jacks, hardware } satisfies KnownIds)
  putNew(db, { renewed, own, stamp })
  return renewed
}

function putNew(
  db: Connection,
  { renewed, own, stamp }: { renewed: LayoutFile; own: CompanyHardware; stamp: CompanyStamp },
): void {
  const had = new Set([...own.strandTypes, ...own.jacks, ...own.hardware].map(({ id }) => id))
  const isNew = ({ id }: { id: string }) => !had.has(id)
  for (const row of renewed.strandTypes.filter(isNew)) putStrandType(db, row, stamp)
  for (const row of renewed.jacks.filter(isNew)) putJack(db, row, stamp)
  for (const row of renewed.hardware.filter(isNew)) putHardware(db, row, stamp)
}

/** For each row the id of one of the company's that is the same but for its id; a new id where there is none. */
function idsFor<T extends { readonly id: string }>(rows: readonly T[], own: readonly T[]): Map<string, string> {
  const known = new Map(own.map((row) => [contentOf(row), row.id]))
  return new Map(rows.map((row) => [row.id, known.get(contentOf(row)) ?? uuidv7()]))
}

const contentOf = (row: { readonly id: string }): string => JSON.stringify(sorted({ ...row, id: '' }))

function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted)
  if (value === null || typeof value !== 'object') return value
  return Object.fromEntries(
    Object.entries(value)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, item]) => [key, sorted(item)]),
  )
}

export const unitsOf = ({ pours, edges, pans, tendons }: LayoutFile): string[] => [
  'job',
  ...pours.map(({ id }) => `pour:${id}`),
  ...edges.map(({ id }) => `edge:${id}`),
  ...pans.map(({ id }) => `pan:${id}`),
  ...tendons.map(({ id }) => `tendon:${id}`),
]

/** The job with nothing in it. */
export const withoutRows = (layout: LayoutFile): LayoutFile => ({
  ...layout,
  ...Object.fromEntries(EDITABLE_TABLES.map((table) => [table, []])),
})
