import { mkdirSync, writeFileSync } from 'node:fs'
import { dirname, extname } from 'node:path'
import { parseArgs } from 'node:util'
import { toEngine } from '@wedgeline/contract'
import { ENGINE_VERSION } from '@wedgeline/contract/engine-version'
import { checkPour, scheduleOf, type Layout, type Pour } from '@wedgeline/engine'
import { ScheduleBlockedError, scheduleWorkbook, type ScheduleWorkbookInput } from '../server/exports/workbook'
import { InputError, readLayoutFile, runCommand } from './layout-file'

/** npm run -s schedule -- <file> --out x.xlsx: the workbook of each pour's bar schedule; exit 2 on bad input. */

const USAGE = 'Usage: npm run -s schedule -- <layout file> --out <workbook.xlsx> [--pour <mark>] [--by <name>]'

await runCommand(async () => {
  const { file, out, pourMark, by } = readArguments()
  const { layout } = readLayoutFile(file)
  const engineLayout = toEngine(layout)
  const pours = engineLayout.pours.filter(({ mark }) => pourMark === undefined || mark === pourMark)
  if (pourMark !== undefined && pours.length === 0) {
    const marks = engineLayout.pours.map(({ mark }) => mark).join(', ')
    throw new InputError(`--pour: no pour is marked "${pourMark}"; must be one of ${marks}`)
  }
  const [first, ...more] = pours.map((pour) => partOf(engineLayout, pour, { by, timeZone: layout.job.timeZone }))
  if (!first) throw new InputError('pours: the layout has no pour to schedule')
  writeWorkbook(out, await workbookOf(first, more))
  process.stdout.write(`${out}\n`)
})

function readArguments() {
  const { values, positionals } = parsed()
  const [file, ...more] = positionals
  if (file === undefined || more.length > 0) throw new InputError(`file: must be given once\n${USAGE}`)
  if (values.out === undefined) throw new InputError(`--out: is missing; must be the workbook to write\n${USAGE}`)
  if (extname(values.out) !== '.xlsx') throw new InputError(`--out: "${values.out}" must end in .xlsx`)
  return { file, out: values.out, pourMark: values.pour, by: values.by ?? 'not named' }
}

function parsed() {
  const options = { out: { type: 'string' }, pour: { type: 'string' }, by: { type: 'string' } } as const
  try {
    return parseArgs({ allowPositionals: true, options })
  } catch (error) {
    throw new InputError(`${error instanceof Error ? error.message : String(error)}\n${USAGE}`)
  }
}

function partOf(layout: Layout, pour: Pour, { by, timeZone }: { by: string; timeZone: string }): ScheduleWorkbookInput {
  const checks = checkPour(layout, { pourId: pour.id })
  const notYetChecked = [...new Set(checks.zones.flatMap((zone) => zone.notYetChecked))]
  const now = Date.now()
  return {
    schedule: scheduleOf(layout, pour.id, notYetChecked),
    checks,
    job: layout.job,
    pour,
    reference: `${layout.job.number}-${pour.mark}`,
    drawing: '',
    preparedBy: by,
    preparedOn: dayIn(timeZone, now),
    preparedAtMs: now,
    checkedBy: null,
    approval: null,
    accepted: layout.job.readings,
    engineVersion: ENGINE_VERSION,
  }
}

async function workbookOf(first: ScheduleWorkbookInput, more: readonly ScheduleWorkbookInput[]): Promise<Buffer> {
  try {
    return await scheduleWorkbook(first, ...more)
  } catch (error) {
    if (!(error instanceof ScheduleBlockedError)) throw error
    const blocked = [first, ...more].filter(({ schedule }) => schedule.problems.some(isError))
    throw new InputError(`steel of pour ${blocked.map(({ pour }) => pour.mark).join(', ')}: ${error.message}`)
  }
}

function isError({ severity }: { readonly severity: string }): boolean {
  return severity === 'error'
}

/** Calendar day as YYYY-MM-DD; Swedish writes it so. */
function dayIn(timeZone: string, atMs: number): string {
  try {
    return new Intl.DateTimeFormat('sv-SE', { timeZone, dateStyle: 'short' }).format(atMs)
  } catch {
    throw new InputError(`job.timeZone: "${timeZone}" is no time zone; must be one such as "Europe/London"`)
  }
}

function writeWorkbook(path: string, workbook: Buffer): void {
  try {
    mkdirSync(dirname(path), { recursive: true })
    writeFileSync(path, workbook)
  } catch (error) {
    throw new InputError(`--out: cannot be written (${error instanceof Error ? error.message : String(error)})`)
  }
}
