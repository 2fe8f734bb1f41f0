import { fieldOf, hardwareProblems, type HardwareData, type JackData, type StrandTypeData } from '@wedgeline/contract'
import { write, type Connection } from '../db/client'
import { checkStored, overtakeJob } from './checking'
import { refused } from './failure'
import { stampOf } from './job-call'
import { recordAudit } from './stores/audit'
import {
  hardwareOf,
  putHardware,
  putJack,
  putStrandType,
  type CompanyHardware,
  type CompanyStamp,
} from './stores/hardware'
import { jobsUsing } from './stores/result'
import { storing } from './storing'
import type { CompanyCall } from './trpc/context'

/** Storing what the company presses and bears on; every job that uses it is checked again. */

export async function saveHardware(ctx: CompanyCall, hardware: HardwareData): Promise<void> {
  assertSound('hardware', { hardware: [hardware], strandTypes: [] })
  await save(ctx, {
    what: 'hardware.save',
    after: hardware,
    find: (company) => company.hardware.find(({ id }) => id === hardware.id),
    put: (tx, stamp) => {
      const { jacks } = hardwareOf(tx, ctx.company.id)
      if (hardware.jackId !== null && !jacks.some(({ id }) => id === hardware.jackId)) {
        throw refused('This jack is not among the company\u2019s; choose one of those or none.', 'hardware.jackId')
      }
      putHardware(tx, hardware, stamp)
    },
  })
}

export async function saveJack(ctx: CompanyCall, jack: JackData): Promise<void> {
  await save(ctx, {
    what: 'hardware.saveJack',
    after: jack,
    find: (company) => company.jacks.find(({ id }) => id === jack.id),
    put: (tx, stamp) => putJack(tx, jack, stamp),
  })
}

export async function saveStrandType(ctx: CompanyCall, strandType: StrandTypeData): Promise<void> {
  assertSound('strandType', { hardware: [], strandTypes: [strandType] })
  await save(ctx, {
    what: 'hardware.saveStrandType',
    after: strandType,
    find: (company) => company.strandTypes.find(({ id }) => id === strandType.id),
    put: (tx, stamp) => putStrandType(tx, strandType, stamp),
  })
}

/** @throws Failure with the field when sizes contradict one another; `input` is what the form calls the row. */
function assertSound(input: string, rows: Parameters<typeof hardwareProblems>[0]): void {
  const problem = hardwareProblems(rows).find(({ severity }) => severity === 'refused')
  if (!problem) return
  const field = fieldOf([input, ...problem.path.slice(2)])
  throw refused(`${field}: ${problem.message}.`, field)
}

interface Saving {
  readonly what: string
  readonly after: { readonly id: string }
  readonly find: (company: CompanyHardware) => unknown
  readonly put: (tx: Connection, stamp: CompanyStamp) => void
}

async function save(ctx: CompanyCall, { what, after, find, put }: Saving): Promise<void> {
  const { db, company } = ctx
  const companyId = company.id
  const toCheck = storing(() =>
    write(db, (tx) => {
      const stamp = stampOf(ctx)
      const before = find(hardwareOf(tx, companyId)) ?? null
      put(tx, { companyId, ...stamp })
      recordAudit(tx, { companyId, jobId: null, ...stamp, what, before, after })
      return jobsUsing(tx, companyId, after.id).map((jobId) => {
        const key = { companyId, jobId }
        return { key, ...overtakeJob(tx, key, stamp.atMs) }
      })
    }),
  )
  for (const { key, ...job } of toCheck) await checkStored(ctx, key, job)
}
