import { v7 as uuidv7 } from 'uuid'
import { applyCommands, type Command, type LayoutFile } from '@wedgeline/contract'

/** A layout as it was loaded, with the versions of its units. */
export interface Seen {
  readonly layout: LayoutFile
  readonly versions: Readonly<Record<string, number>>
}

/** The first of some rows. @throws where there is none. */
export const first = <T>(rows: readonly T[]): T => {
  const [row] = rows
  if (row === undefined) throw new Error('There is no row here.')
  return row
}
export const setAnchor = (id: string, changes: Record<string, unknown>): Command => ({
  type: 'set',
  table: 'anchors',
  id,
  changes,
})

/** A batch of a job on the versions that `seen` shows. */
export function batchFor(jobId: string, seen: Seen, commands: Command[]) {
  const { units } = applyCommands(seen.layout, commands)
  const bases = Object.fromEntries(units.map((unit) => [unit, seen.versions[unit] ?? 0]))
  return { id: uuidv7(), jobId, bases, commands }
}

/** What a refused call carries; null when it was taken. */
export async function failure(call: Promise<unknown>) {
  const error = await call.then(
    () => null,
    (reason: unknown) => reason,
  )
  if (error === null) return null
  const { code, message, cause } = error as {
    code: string
    message: string
    cause?: { details?: Record<string, unknown> } & Record<string, unknown>
  }
  return { code, message, details: cause?.details ?? {}, field: cause?.field, table: cause?.table }
}
