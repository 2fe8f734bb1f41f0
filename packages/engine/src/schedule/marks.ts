import type { BarMark, Layout } from '../model'
import { FAMILIES, type Family } from '../result'
import type { Step } from '../step'
import { barKey, barOfKey, typeLetterOf, type TypedBar, type TypeLetter } from './bar-key'
import { sizeOf, type BarStandard, type DimensionName, type Dimensions, type ShapeProblem } from './bar-standards'
import { barsOf, type Member, type ZoneBars } from './bars'
import { barStandardById, BS_8666_2020 } from './bs-8666'
import { cutLength, roundedShape, shapeProblems } from './cut-length'

/** One line of a schedule: a mark in one member with one number in each; mm and kg. */
export interface ScheduleRow {
  /** Null for a cancelled mark, whose bars are no longer in the pour. */
  readonly member: Member | null
  readonly markNumber: number
  /** Two digits or more, with leading zeros. */
  readonly mark: string
  readonly key: string
  readonly letter: TypeLetter
  readonly diameter: number
  readonly typeAndSize: string
  readonly members: number
  readonly inEach: number
  readonly total: number
  /** Length of each bar; null where the shape has an error. */
  readonly length: number | null
  readonly code: string
  readonly dimensions: Dimensions
  /** Letter of the issue in which the row last changed; empty before the first issue. */
  readonly revision: string
  readonly massEach: number | null
  /** Cut length as printed: formula, then rounded up. */
  readonly steps: readonly Step[]
  readonly notes: readonly string[]
  /** Names of the zones that hold these bars. */
  readonly zones: readonly string[]
}

export interface ScheduleProblem extends ShapeProblem {
  /** Null where the steel has no mark. */
  readonly mark: string | null
  readonly where: string
}

export interface ScheduleTotal {
  readonly typeAndSize: string
  readonly letter: TypeLetter
  readonly diameter: number
  readonly massPerMetre: number
  readonly bars: number
  readonly metres: number
  /** kg */
  readonly mass: number
}

export interface Schedule {
  readonly pourId: string
  readonly edition: string
  readonly grade: string
  readonly rows: readonly ScheduleRow[]
  readonly problems: readonly ScheduleProblem[]
  readonly totals: readonly ScheduleTotal[]
  readonly metres: number
  readonly mass: number
  /** Families of checks that were not made on what is scheduled here. */
  readonly notYetChecked: readonly Family[]
  /** Where the tables come from and what else a reader must know. Whole sentences. */
  readonly notes: readonly string[]
}

/** A mark given to bars that have none stored; whoever stores it gives it an id. */
export type NewMark = Omit<BarMark, 'id'>

/**
 * The bar schedule of a pour. It does not depend on the order of the steel, and a stored mark keeps its bar whatever is
 * added or taken away.
 *
 * @param notYetChecked families that the checks of this pour did not cover; all of them where no checks were run.
 */
export function scheduleOf(layout: Layout, pourId: string, notYetChecked: readonly Family[] = FAMILIES): Schedule {
  const { settings } = layout.job
  const found = barStandardById(settings.barStandard)
  const standard = found ?? BS_8666_2020
  const letter = typeLetterOf(settings.reinforcementGrade)
  const { bars, unplaced } = barsOf(layout, pourId)
  const groups = [...groupsOf(bars, standard, letter)].sort(byMemberThenKey)
  const stored = layout.barMarks.filter((mark) => mark.pourId === pourId)
  const marks = marksByKey(groups, stored)
  const context = { standard, marks, stockLength: settings.stockLength }
  const rows = [...groups.map((group) => rowOf(group, context)), ...cancelledRows(stored, groups, context)]
  rows.sort(byMemberThenMark)
  const totals = totalsOf(rows, standard)
  return {
    pourId,
    edition: standard.name,
    grade: settings.reinforcementGrade,
    rows,
    problems: [
      ...(found
        ? []
        : [layoutProblem('barStandard', `"${settings.barStandard}" is not known here. Use ${standard.id}.`)]),
      ...unplaced.map(({ steelId, message }) => layoutProblem('zone', message, `steel ${steelId}`)).sort(byWhere),
      ...(rows.length > 0
        ? []
        : [layoutProblem('steel', 'The pour has no bars yet. Give it steel, then schedule it.')]),
      ...repeatedMarks(stored),
      ...groups.flatMap((group) => groupProblems(group, context)),
    ],
    totals,
    metres: sum(totals.map((total) => total.metres)),
    mass: sum(totals.map((total) => total.mass)),
    notYetChecked,
    notes: notesOf(standard, letter, settings.reinforcementGrade),
  }
}

/** @returns the marks of a schedule that the layout does not hold yet, in their order. */
export function newMarks(schedule: Schedule, stored: readonly BarMark[]): readonly NewMark[] {
  const known = new Set(stored.filter((mark) => mark.pourId === schedule.pourId).map((mark) => mark.key))
  const fresh = new Map<string, NewMark>()
  for (const { key, markNumber } of schedule.rows) {
    if (!known.has(key)) fresh.set(key, { pourId: schedule.pourId, mark: markNumber, key })
  }
  return [...fresh.values()].sort((a, b) => a.mark - b.mark)
}

// Grouping ----------------------------------------------------------------------------------------------------------

/** Zones of one member that hold the same number of the same bar. */
interface Group {
  readonly member: Member
  readonly bar: TypedBar
  readonly key: string
  readonly inEach: number
  readonly zones: readonly string[]
  readonly roundings: readonly string[]
}

interface ZoneGroup extends Omit<Group, 'zones' | 'roundings'> {
  readonly zoneName: string
  readonly roundings: readonly string[]
}

function groupsOf(bars: readonly ZoneBars[], standard: BarStandard, letter: TypeLetter): readonly Group[] {
  const perZone = new Map<string, ZoneGroup>()
  for (const { member, zoneId, zoneName, shape, count } of bars) {
    const rounded = roundedShape(shape, standard)
    const bar = { letter, shape: rounded }
    const key = barKey(bar)
    const id = `${member.id}|${zoneId}|${key}`
    const before = perZone.get(id)
    const roundings = [...(before?.roundings ?? []), ...roundingsOf(shape.dimensions, rounded.dimensions)]
    perZone.set(id, { member, bar, key, zoneName, inEach: (before?.inEach ?? 0) + count, roundings })
  }
  const groups = new Map<string, ZoneGroup[]>()
  for (const zone of perZone.values()) {
    const id = `${zone.member.id}|${zone.key}|${zone.inEach}`
    const group = groups.get(id)
    if (group) group.push(zone)
    else groups.set(id, [zone])
  }
  return [...groups.values()].flatMap(([first, ...more]) => {
    if (!first) return []
    const all = [first, ...more]
    const roundings = [...new Set(all.flatMap((zone) => zone.roundings))].sort()
    return [{ ...first, zones: all.map((zone) => zone.zoneName).sort(inText), roundings }]
  })
}

/** A dimension that moved by rounding is said, because it takes from cover or from a lap. */
const roundingsOf = (asked: Dimensions, rounded: Dimensions): readonly string[] =>
  (Object.keys(asked) as DimensionName[])
    .filter((name) => asked[name] !== rounded[name])
    .map((name) => `${name} ${Math.round((asked[name] ?? 0) * 10) / 10} is scheduled as ${rounded[name]}`)

const TEXT_ORDER = new Intl.Collator('en', { numeric: true })
const inText = (a: string, b: string): number => TEXT_ORDER.compare(a, b) || (a < b ? -1 : a > b ? 1 : 0)

const byMember = (a: Member, b: Member): number =>
  Number(a.kind === 'pan') - Number(b.kind === 'pan') || inText(a.name, b.name) || inText(a.id, b.id)

/** The order of the steel in the layout must not show anywhere. */
const byMemberThenKey = (a: Group, b: Group): number =>
  byMember(a.member, b.member) || inText(a.key, b.key) || a.inEach - b.inEach

function byMemberThenMark(a: ScheduleRow, b: ScheduleRow): number {
  // A cancelled mark stands last: it has no member.
  if (a.member === null || b.member === null) {
    return Number(a.member === null) - Number(b.member === null) || a.markNumber - b.markNumber
  }
  return byMember(a.member, b.member) || a.markNumber - b.markNumber || a.inEach - b.inEach
}

// Marks -------------------------------------------------------------------------------------------------------------

/** Stored marks first; then the next free numbers, above every number ever given, in order of shape, size and key. */
function marksByKey(groups: readonly Group[], stored: readonly BarMark[]): ReadonlyMap<string, number> {
  const marks = new Map<string, number>()
  for (const { key, mark } of [...stored].sort((a, b) => a.mark - b.mark)) {
    if (!marks.has(key)) marks.set(key, mark)
  }
  let next = stored.reduce((most, { mark }) => Math.max(most, mark), 0) + 1
  const fresh = new Map(groups.filter(({ key }) => !marks.has(key)).map((group) => [group.key, group]))
  for (const { key } of [...fresh.values()].sort(inMarkOrder)) marks.set(key, next++)
  return marks
}

const inMarkOrder = (a: Group, b: Group): number =>
  inText(a.bar.shape.code, b.bar.shape.code) || a.bar.shape.diameter - b.bar.shape.diameter || inText(a.key, b.key)

const markText = (mark: number): string => String(mark).padStart(2, '0')

function repeatedMarks(stored: readonly BarMark[]): readonly ScheduleProblem[] {
  const keys = new Map<number, Set<string>>()
  for (const { mark, key } of stored) keys.set(mark, (keys.get(mark) ?? new Set()).add(key))
  return [...keys]
    .filter(([, of]) => of.size > 1)
    .map(([mark, of]) => ({
      mark: markText(mark),
      where: 'stored marks',
      field: 'barMarks',
      severity: 'error',
      message: `Mark ${markText(mark)} stands for ${of.size} different bars. Give each bar its own mark.`,
    }))
}

// Rows --------------------------------------------------------------------------------------------------------------

interface RowContext {
  readonly standard: BarStandard
  readonly marks: ReadonlyMap<string, number>
  readonly stockLength: number
}

function rowOf(group: Group, { standard, marks }: RowContext): ScheduleRow {
  const bar = barColumns(group.bar, standard)
  const total = group.zones.length * group.inEach
  const mark = marks.get(group.key) ?? 0
  return {
    member: group.member,
    markNumber: mark,
    mark: markText(mark),
    key: group.key,
    ...bar,
    members: group.zones.length,
    inEach: group.inEach,
    total,
    notes: [...bar.notes, ...group.roundings],
    zones: group.zones,
  }
}

type BarColumns = Pick<
  ScheduleRow,
  'letter' | 'diameter' | 'typeAndSize' | 'length' | 'code' | 'dimensions' | 'revision' | 'massEach' | 'steps' | 'notes'
>

function barColumns({ letter, shape }: TypedBar, standard: BarStandard): BarColumns {
  const cut = cutLength(shape, standard)
  const turns = shape.dimensions.C ?? 0
  const flat = shape.flatTurns > 0 ? [`${turns} turns of which ${shape.flatTurns} flat`] : []
  return {
    letter,
    diameter: shape.diameter,
    typeAndSize: `${letter}${shape.diameter}`,
    length: cut?.length ?? null,
    code: shape.code,
    dimensions: shape.dimensions,
    revision: '',
    massEach: cut?.massEach ?? null,
    steps: cut?.steps ?? [],
    notes: flat,
  }
}

/** A mark whose bars are gone stays on the list with none, so that nobody gives its number to another bar. */
function cancelledRows(
  stored: readonly BarMark[],
  groups: readonly Group[],
  { standard, marks }: RowContext,
): readonly ScheduleRow[] {
  const used = new Set(groups.map((group) => group.key))
  return stored.flatMap(({ key, mark }) => {
    const bar = barOfKey(key)
    if (used.has(key) || marks.get(key) !== mark || !bar) return []
    const columns = barColumns(bar, standard)
    const none = { member: null, members: 0, inEach: 0, total: 0, zones: [] }
    return [
      { ...columns, ...none, key, markNumber: mark, mark: markText(mark), notes: [...columns.notes, 'cancelled'] },
    ]
  })
}

function groupProblems(group: Group, { standard, marks, stockLength }: RowContext): readonly ScheduleProblem[] {
  const mark = markText(marks.get(group.key) ?? 0)
  return shapeProblems(group.bar.shape, standard, stockLength).map((problem) => ({
    ...problem,
    mark,
    where: group.zones.join(', '),
  }))
}

const layoutProblem = (field: string, message: string, where = 'pour'): ScheduleProblem => ({
  mark: null,
  where,
  field,
  severity: 'error',
  message,
})

const byWhere = (a: ScheduleProblem, b: ScheduleProblem): number => inText(a.where, b.where)

// Totals ------------------------------------------------------------------------------------------------------------

const sum = (values: readonly number[]): number => values.reduce((all, value) => all + value, 0)

function totalsOf(rows: readonly ScheduleRow[], standard: BarStandard): readonly ScheduleTotal[] {
  const totals = new Map<string, ScheduleTotal>()
  for (const { typeAndSize, letter, diameter, total, length } of rows) {
    if (total === 0 || length === null) continue
    const massPerMetre = sizeOf(standard, diameter)?.massPerMetre ?? 0
    const before = totals.get(typeAndSize)
    // Whole millimetres are added, so that no fraction creeps in and a spreadsheet's sum agrees to the last digit.
    const metres = (Math.round((before?.metres ?? 0) * 1000) + total * length) / 1000
    const bars = (before?.bars ?? 0) + total
    totals.set(typeAndSize, { typeAndSize, letter, diameter, massPerMetre, bars, metres, mass: metres * massPerMetre })
  }
  return [...totals.values()].sort((a, b) => a.diameter - b.diameter || inText(a.letter, b.letter))
}

function notesOf(standard: BarStandard, letter: TypeLetter, grade: string): readonly string[] {
  return [
    ...standard.provenance,
    ...(letter === 'X' ? [`Type X is reinforcement of grade ${grade}.`] : []),
    'The cut length of a helix pays for its flat turns: C counts all turns.',
  ]
}
