/** Where in a layout file something stands: `['anchors', 3, 'chainageMm']`. */
export type Path = readonly (string | number)[]

/**
 * `refused`: the layout cannot be read or would contradict itself, and nothing of it is stored.
 * `stop`: kept as typed; the checks show it as a stop until it is changed.
 */
type Severity = 'refused' | 'stop'

export interface Problem {
  readonly path: Path
  /** The path as a person reads it in the file: `anchors[3].chainageMm`. */
  readonly field: string
  /** What is wrong and what would be right. */
  readonly message: string
  readonly severity: Severity
}

/** A path as a person reads it in the file; `file` for the whole of it. */
export const fieldOf = (path: Path): string => {
  if (path.length === 0) return 'file'
  return path.map((part, i) => (typeof part === 'number' ? `[${part}]` : i === 0 ? part : `.${part}`)).join('')
}

/** A problem for which nothing is stored. */
export const refused = (path: Path, message: string): Problem => ({
  path,
  field: fieldOf(path),
  message,
  severity: 'refused',
})

/** A problem that is kept as typed and shown as a stop. */
export const stop = (path: Path, message: string): Problem => ({
  path,
  field: fieldOf(path),
  message,
  severity: 'stop',
})

/** A length as a detailer writes it: whole millimetres, or one decimal where there is one. */
export const mm = (value: number): string => `${Math.round(value * 10) / 10} mm`

/** Rows by their id; of two with one id the last. */
export const byId = <T extends { readonly id: string }>(rows: readonly T[]): ReadonlyMap<string, T> =>
  new Map(rows.map((row) => [row.id, row]))
