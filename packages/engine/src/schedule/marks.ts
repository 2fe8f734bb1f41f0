import type { BarMark, Delivery, Layout, Pour } from '../model'
import { FAMILIES, type Family } from '../result'
import { barKey, barOfKey, typeLetterOf, type TypedBar, type TypeLetter } from './bar-key'
import type { BarStandard, DimensionName, Dimensions } from './bar-standards'
import { barsOf, type Member, type ZoneBars } from './bars'
import { barStandardById, BS_8666_2020 } from './bs-8666'
import { cutLength, roundedShape, shapeProblems } from './cut-length'
import { inText } from './in-text'
import { oneLengthChances } from './one-length'
import type { ScheduleProblem, ScheduleRow } from './schedule-row'
import {
  deliveryOf,
  deliveryTotals,
  kindTotals,
  longestBar,
  type ScheduleDelivery,
  totalsOf,
  type ScheduleKind,
  type ScheduleTotal,
} from './schedule-totals'

export interface Schedule {
  readonly pourId: string
  readonly edition: string
  readonly standardId: string
  /** Longest straight bar that is ordered, mm. */
  readonly stockLength: number
  readonly grade: string
  readonly rows: readonly ScheduleRow[]
  readonly problems: readonly ScheduleProblem[]
  readonly totals: readonly ScheduleTotal[]
  readonly metres: number
  readonly mass: number
  /** Empty where the pour has no deliveries. */
  readonly deliveries: readonly ScheduleDelivery[]
  readonly kinds: readonly ScheduleKind[]
  readonly longest: { readonly mark: string; readonly length: number } | null
  /** Where wedge bars could take one length; whole sentences. */
  readonly chances: readonly string[]
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
  const pour = layout.pours.find(({ id }) => id === pourId)
  const deliveries = pour?.deliveries ?? []
  const marks = marksByKey(groups, stored, pour?.firstMark ?? 1)
  const markText = markTextOf(pour)
  const context = { standard, marks, stockLength: settings.stockLength, deliveries, markText }
  const rows = [...groups.map((group) => rowOf(group, context)), ...cancelledRows(stored, groups, context)]
  rows.sort(byMemberThenMark)
  const totals = totalsOf(rows, standard)
  return {
    pourId,
    edition: standard.name,
    standardId: standard.id,
    stockLength: settings.stockLength,
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
      ...repeatedMarks(stored, markText),
      ...repeatedMembers(deliveries, groups),
      ...groups.flatMap((group) => groupProblems(group, context)),
    ],
    totals,
    metres: sum(totals.map((total) => total.metres)),
    mass: sum(totals.map((total) => total.mass)),
    deliveries: deliveryTotals(deliveries, rows),
    kinds: kindTotals(bars, standard),
    longest: longestBar(rows),
    chances: oneLengthChances(bars, standard, settings),
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
  for (const { member, zoneId, zoneName, shape, count, notes } of bars) {
    const rounded = roundedShape(shape, standard)
    const bar = { letter, shape: rounded }
    const key = barKey(bar)
    const id = `${member.id}|${zoneId}|${key}`
    const before = perZone.get(id)
    const roundings = [...(before?.roundings ?? []), ...notes, ...roundingsOf(shape.dimensions, rounded.dimensions)]
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

/**
 * Stored marks first; then the next free numbers, from the pour's first mark on and above every number ever given, in
 * order of shape, size and key.
 */
function marksByKey(
  groups: readonly Group[],
  stored: readonly BarMark[],
  firstMark: number,
): ReadonlyMap<string, number> {
  const marks = new Map<string, number>()
  for (const { key, mark } of [...stored].sort((a, b) => a.mark - b.mark)) {
    if (!marks.has(key)) marks.set(key, mark)
  }
  let next = stored.reduce((most, { mark }) => Math.max(most, mark + 1), firstMark)
  const fresh = new Map(groups.filter(({ key }) => !marks.has(key)).map((group) => [group.key, group]))
  for (const { key } of [...fresh.values()].sort(inMarkOrder)) marks.set(key, next++)
  return marks
}

const inMarkOrder = (a: Group, b: Group): number =>
  inText(a.bar.shape.code, b.bar.shape.code) || a.bar.shape.diameter - b.bar.shape.diameter || inText(a.key, b.key)

type MarkText = (mark: number) => string

const markTextOf =
  (pour: Pour | undefined): MarkText =>
  (mark) =>
    `${pour?.markPrefix ?? ''}${String(mark).padStart(2, '0')}`

/** An edge or a pan in two deliveries counts in the first of them; somebody must say which it is. */
function repeatedMembers(deliveries: readonly Delivery[], groups: readonly Group[]): readonly ScheduleProblem[] {
  const members = new Map(groups.map(({ member }) => [member.id, member]))
  return [...members.values()].sort(byMember).flatMap((member): readonly ScheduleProblem[] => {
    const of = deliveries.filter((delivery) => deliveryOf([delivery], member) !== null)
    if (of.length < 2) return []
    const names = of.map(({ name }) => name).join(' and ')
    const message = `${member.name} stands in the deliveries ${names}; its bars are counted in the first. Take it out of the others.`
    return [{ mark: null, where: 'pour', field: 'deliveries', severity: 'warning', message }]
  })
}

function repeatedMarks(stored: readonly BarMark[], markText: MarkText): readonly ScheduleProblem[] {
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
  readonly deliveries: readonly Delivery[]
  readonly markText: MarkText
}

function rowOf(group: Group, { standard, marks, deliveries, markText }: RowContext): ScheduleRow {
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
    notes: [...bar.notes, ...bundleNote(total * (bar.massEach ?? 0)), ...group.roundings],
    zones: group.zones,
    deliveryId: deliveryOf(deliveries, group.member)?.id ?? null,
  }
}

/** Largest bundle that a crane and a lorry take, kg (from memory, unsure): said, and never a limit. */
const BUNDLE_MAX = 2000

const bundleNote = (mass: number): readonly string[] =>
  mass > BUNDLE_MAX
    ? [`${Math.round(mass)} kg: ${Math.ceil(mass / BUNDLE_MAX)} bundles of ${BUNDLE_MAX} kg or less`]
    : []

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
  { standard, marks, markText }: RowContext,
): readonly ScheduleRow[] {
  const used = new Set(groups.map((group) => group.key))
  return stored.flatMap(({ key, mark }) => {
    const bar = barOfKey(key)
    if (used.has(key) || marks.get(key) !== mark || !bar) return []
    const columns = barColumns(bar, standard)
    const none = { member: null, members: 0, inEach: 0, total: 0, zones: [], deliveryId: null }
    return [
      { ...columns, ...none, key, markNumber: mark, mark: markText(mark), notes: [...columns.notes, 'cancelled'] },
    ]
  })
}

function groupProblems(
  group: Group,
  { standard, marks, stockLength, markText }: RowContext,
): readonly ScheduleProblem[] {
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

function notesOf(standard: BarStandard, letter: TypeLetter, grade: string): readonly string[] {
  return [
    ...standard.provenance,
    ...(letter === 'X' ? [`Type X is reinforcement of grade ${grade}.`] : []),
    'The cut length of a helix pays for its flat turns: C counts all turns.',
    'Supports: chairs and spacers are not scheduled here; they are held to the cover of the pour and come with the mats.',
    'From memory: each bundle is tagged with schedule reference, mark, size and number of bars, and weighs 2000 kg or less.',
  ]
}
