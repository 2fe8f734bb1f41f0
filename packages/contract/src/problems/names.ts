import type { LayoutFile } from '../layout'
import { fieldOf, refused, type Path, type Problem } from './problem'

/** Ids and marks that stand twice. */
export function nameProblems(layout: LayoutFile): Problem[] {
  return [...duplicateIds(layout), ...duplicateMarks(layout), ...duplicateNumbers(layout)]
}

interface Named {
  readonly name: string
  readonly path: Path
}

function duplicates(names: readonly Named[], message: (name: string, first: string) => string): Problem[] {
  const seen = new Map<string, Path>()
  const problems: Problem[] = []
  for (const { name, path } of names) {
    const first = seen.get(name)
    if (first) problems.push(refused(path, message(name, fieldOf(first))))
    else seen.set(name, path)
  }
  return problems
}

const TABLES = [
  'levels',
  'gridLines',
  'strandTypes',
  'jacks',
  'hardware',
  'edgeLines',
  'joints',
  'obstructions',
  'pours',
  'edges',
  'pans',
  'tendons',
  'anchors',
  'steel',
  'barMarks',
  'concreteResults',
] as const
const POUR_PARTS = ['outline', 'regions', 'mats', 'stages'] as const

function duplicateIds(layout: LayoutFile): Problem[] {
  const taken = (id: string, first: string) => `the id "${id}" is taken by ${first}; every id of a kind must differ`
  const idsOf = (rows: readonly { readonly id: string }[], at: Path): Named[] =>
    rows.map(({ id }, i) => ({ name: id, path: [...at, i, 'id'] }))
  const tables = TABLES.flatMap((table) => duplicates(idsOf(layout[table], [table]), taken))
  const parts = POUR_PARTS.flatMap((part) =>
    duplicates(
      layout.pours.flatMap((pour, i) => idsOf(pour[part], ['pours', i, part])),
      taken,
    ),
  )
  const lengths = layout.edges.flatMap((edge, i) => idsOf(edge.lengths, ['edges', i, 'lengths']))
  return [...tables, ...parts, ...duplicates(lengths, taken)]
}

/** Marks name things on drawings and on the deck, so no two of a kind may share one where they are read together. */
function duplicateMarks(layout: LayoutFile): Problem[] {
  const levelOf = new Map(layout.pours.map((pour) => [pour.id, pour.levelId]))
  const taken = (what: string) => (name: string, first: string) => {
    const mark = name.slice(name.indexOf('|') + 1)
    return `"${mark}" is taken by ${first}; ${what}`
  }
  const named = <T extends { readonly mark: string }>(table: string, rows: readonly T[], scope: (row: T) => string) =>
    rows.map((row, i) => ({ name: `${scope(row)}|${row.mark}`, path: [table, i, 'mark'] }))
  const level = (pourId: string) => levelOf.get(pourId) ?? ''
  return [
    ...duplicates(
      named('levels', layout.levels, () => ''),
      taken('levels need different marks'),
    ),
    ...duplicates(
      layout.gridLines.map(({ name }, i) => ({ name: `|${name}`, path: ['gridLines', i, 'name'] })),
      taken('grid lines need different names'),
    ),
    ...duplicates(
      named('pours', layout.pours, (p) => p.levelId),
      taken('pours of a level need different marks'),
    ),
    ...duplicates(
      named('edgeLines', layout.edgeLines, (l) => l.levelId),
      taken('edge lines of a level need different marks'),
    ),
    ...duplicates(
      named('edges', layout.edges, (e) => level(e.pourId)),
      taken('edges of a level need different marks'),
    ),
    ...duplicates(
      named('pans', layout.pans, (p) => level(p.pourId)),
      taken('pans of a level need different marks'),
    ),
    ...duplicates(
      named('tendons', layout.tendons, (t) => t.pourId),
      taken('tendons of a pour need different marks'),
    ),
  ]
}

function duplicateNumbers(layout: LayoutFile): Problem[] {
  const anchors = layout.anchors.map(({ edgeId, panId, number }, i) => ({
    name: JSON.stringify([edgeId, panId, number]),
    path: ['anchors', i, 'number'],
  }))
  const marks = layout.barMarks.map(({ pourId, mark }, i) => ({
    name: JSON.stringify([pourId, mark]),
    path: ['barMarks', i, 'mark'],
  }))
  return [
    ...duplicates(anchors, (_, first) => `this number is taken by ${first}; anchors of one edge or pan need their own`),
    ...duplicates(marks, (_, first) => `this bar mark is taken by ${first}; a mark stands for one bar`),
  ]
}
