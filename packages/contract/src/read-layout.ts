import type { z } from 'zod'
import { LIMITS, layoutSchema, type LayoutFile } from './layout'
import { layoutProblems } from './problems'
import { refused, type Path, type Problem } from './problems/problem'
import { wording } from './problems/wording'

/** With `ok`, every problem is a stop and the layout may be stored; otherwise at least one is refused. */
export type ReadLayout =
  | { readonly ok: true; readonly layout: LayoutFile; readonly problems: readonly Problem[] }
  | { readonly ok: false; readonly problems: readonly Problem[] }

/** A file that is wrong throughout would otherwise answer with one message for every number in it. */
export const PROBLEMS_MAX = 200

/** Reads the text of a layout file: JSON in UTF-8, with or without a byte order mark. */
export function readLayoutText(source: string): ReadLayout {
  const body = source.replace(/^\uFEFF/, '')
  if (body.trim() === '') return failed([refused([], 'is empty; must be a layout in JSON')])
  let json: unknown
  try {
    json = JSON.parse(body)
  } catch (error) {
    const why = error instanceof Error ? error.message : 'unknown'
    return failed([refused([], `is not JSON, or only part of one (${why}); must be one layout from { to }`)])
  }
  return readLayout(json)
}

/** Reads a layout that has been parsed from JSON: sizes first, then shape, then what the rows say of one another. */
export function readLayout(json: unknown): ReadLayout {
  const tooMany = sizeProblems(json)
  if (tooMany.length > 0) return failed(tooMany)
  const read = layoutSchema.safeParse(json, { error: wording })
  if (!read.success) return failed(read.error.issues.flatMap(problemsOf))
  const problems = layoutProblems(read.data)
  if (problems.some(({ severity }) => severity === 'refused')) return failed(problems)
  return { ok: true, layout: read.data, problems }
}

function failed(problems: readonly Problem[]): ReadLayout {
  const more = problems.length - PROBLEMS_MAX
  if (more <= 0) return { ok: false, problems }
  return {
    ok: false,
    problems: [...problems.slice(0, PROBLEMS_MAX), refused([], `${more} more problems are not listed`)],
  }
}

const TABLE_LIMITS = {
  anchors: LIMITS.anchors,
  tendons: LIMITS.anchors,
  pours: LIMITS.pours,
  edges: LIMITS.edges,
  edgeLines: LIMITS.edges,
  steel: LIMITS.steel,
  barMarks: LIMITS.steel,
} as const

/** Counts alone, before any row is looked at, so that a file beyond the limits is refused at once. */
function sizeProblems(json: unknown): Problem[] {
  if (!isRecord(json)) return []
  return Object.entries(TABLE_LIMITS).flatMap(([table, limit]) => {
    const rows = json[table]
    if (!Array.isArray(rows) || rows.length <= limit) return []
    return [refused([table], `there are ${rows.length}; must be at most ${limit}`)]
  })
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

function problemsOf(issue: z.core.$ZodIssue): Problem[] {
  const path = issue.path.map((part) => (typeof part === 'symbol' ? String(part) : part)) satisfies Path
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) =>
      refused([...path, key], 'is no field of the layout file; leave it out or correct its name'),
    )
  }
  return [refused(path, issue.message)]
}
