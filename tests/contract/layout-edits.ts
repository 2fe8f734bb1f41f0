import { demoLayout } from '../../db/seed/demo-layout'

/** The demo's file as loose JSON, with one thing in it changed: what somebody's own file looks like to the reader. */
export function demoWith(path: string, value: unknown): unknown {
  const file: unknown = JSON.parse(JSON.stringify(demoLayout()))
  const steps = path.split('.')
  const last = steps.pop() ?? ''
  const parent = steps.reduce<unknown>((at, step) => child(at, step), file)
  if (typeof parent !== 'object' || parent === null) throw new Error(`${path} is not in the demo's file`)
  if (value === undefined) Reflect.deleteProperty(parent, last)
  else Reflect.set(parent, last, value)
  return file
}

/** A row of the demo's file by table and id, as a fresh copy with some fields changed. */
export function demoRow(
  table: 'pours' | 'edges' | 'anchors' | 'steel' | 'hardware',
  id: string,
  changes: object,
): object {
  const rows: readonly { readonly id: string }[] = demoLayout()[table]
  const row = rows.find((one) => one.id === id)
  if (!row) throw new Error(`${id} is not in ${table}`)
  return { ...row, ...changes }
}

export function placeOf(table: 'pours' | 'edges' | 'anchors' | 'steel' | 'hardware', id: string): number {
  const rows: readonly { readonly id: string }[] = demoLayout()[table]
  return rows.findIndex((row) => row.id === id)
}

function child(at: unknown, step: string): unknown {
  return typeof at === 'object' && at !== null ? (Reflect.get(at, step) as unknown) : undefined
}
