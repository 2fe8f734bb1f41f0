/**
 * Few different marks over a pour for little extra steel: which option each group of like zones takes.
 *
 * A facility-location problem: a mark once opened may be used by every group. It is solved exactly for every number of
 * marks at once, by branching on marks (open or closed) with the mass of all undecided marks open as the bound.
 */

export interface Choosable {
  /** Of one zone, kg. */
  readonly mass: number
  /** Marks that it needs. */
  readonly keys: readonly string[]
}

export interface Group {
  /** Zones that take the same option. */
  readonly weight: number
  readonly options: readonly Choosable[]
}

export interface Choice {
  /** Marks that are not free. */
  readonly marks: number
  /** All zones of all groups, kg. */
  readonly mass: number
  /** The place of each group's option. */
  readonly picks: readonly number[]
}

export interface Choices {
  /** By rising number of marks and falling mass. */
  readonly curve: readonly Choice[]
  readonly isExact: boolean
}

/** Branches that are looked at in one connected part before the best found so far is taken. */
const NODES_MAX = 20_000

/** @param free marks that the pour has anyway. */
export function choices(groups: readonly Group[], free: ReadonlySet<string>): Choices {
  const paid = groups.map(({ weight, options }) => ({
    weight,
    options: options.map(({ mass, keys }) => ({ mass: mass * weight, keys: keys.filter((key) => !free.has(key)) })),
  }))
  const parts = partsOf(paid).map((members) => ({ members, ...solve(members.map((at) => paid[at]?.options ?? [])) }))
  const start: Choice = { marks: 0, mass: 0, picks: groups.map(() => 0) }
  const curve = parts.reduce<readonly Choice[]>(
    (all, { members, found }) => lowest(all.flatMap((one) => found.map((more) => joined(one, more, members)))),
    [start],
  )
  return { curve, isExact: parts.every(({ isExact }) => isExact) }
}

/** The point of a curve with the least mass and price of marks; of equal ones that with fewer marks. */
export function cheapest(curve: readonly Choice[], massPerMark: number): Choice | undefined {
  const price = ({ mass, marks }: Choice) => mass + massPerMark * marks
  return curve.reduce<Choice | undefined>(
    (best, one) => (best === undefined || price(one) < price(best) - 1e-9 ? one : best),
    undefined,
  )
}

interface Paid {
  readonly mass: number
  readonly keys: readonly string[]
}

/** Groups that could share a mark, directly or through others, are solved together; the rest apart. */
function partsOf(groups: readonly { readonly options: readonly Paid[] }[]): number[][] {
  const part = groups.map((_, at) => at)
  const rootOf = (at: number): number => {
    const up = part[at] ?? at
    return up === at ? at : rootOf(up)
  }
  const holder = new Map<string, number>()
  for (const [at, { options }] of groups.entries()) {
    for (const key of options.flatMap(({ keys }) => keys)) {
      const other = holder.get(key)
      if (other === undefined) holder.set(key, at)
      else part[rootOf(at)] = rootOf(other)
    }
  }
  const members = new Map<number, number[]>()
  for (const at of groups.keys()) members.set(rootOf(at), [...(members.get(rootOf(at)) ?? []), at])
  return [...members.values()]
}

function joined(one: Choice, more: Choice, members: readonly number[]): Choice {
  const picks = [...one.picks]
  for (const [i, at] of members.entries()) picks[at] = more.picks[i] ?? 0
  return { marks: one.marks + more.marks, mass: one.mass + more.mass, picks }
}

/** Only what no other point beats in both marks and mass. */
function lowest(points: readonly Choice[]): Choice[] {
  const kept: Choice[] = []
  for (const point of [...points].sort((a, b) => a.marks - b.marks || a.mass - b.mass)) {
    const last = kept.at(-1)
    if (last === undefined || point.mass < last.mass - 1e-9) kept.push(point)
  }
  return kept
}

interface Search {
  readonly groups: readonly (readonly Paid[])[]
  /** The lightest found with exactly so many marks. */
  readonly best: Map<number, Choice>
  nodes: number
}

function solve(groups: readonly (readonly Paid[])[]): { readonly found: readonly Choice[]; readonly isExact: boolean } {
  const search: Search = { groups, best: new Map(), nodes: 0 }
  branch(search, new Set(), new Set())
  return { found: lowest([...search.best.values()]), isExact: search.nodes < NODES_MAX }
}

function branch(search: Search, open: ReadonlySet<string>, closed: ReadonlySet<string>): void {
  if (search.nodes >= NODES_MAX) return
  search.nodes += 1
  const relaxed = lightest(search.groups, open, closed)
  if (relaxed === null || isBeaten(search.best, open.size, relaxed.mass)) return
  note(search.best, relaxed.choice)
  const next = heaviestUndecided(relaxed.used, open)
  if (next === null) return
  branch(search, new Set([...open, next]), closed)
  branch(search, open, new Set([...closed, next]))
}

interface Relaxed {
  readonly mass: number
  readonly choice: Choice
  /** Mass that hangs on each mark used. */
  readonly used: ReadonlyMap<string, number>
}

/** Every group takes its lightest option whose marks are not closed; of equal ones that with fewest marks not open yet. */
function lightest(groups: Search['groups'], open: ReadonlySet<string>, closed: ReadonlySet<string>): Relaxed | null {
  const used = new Map<string, number>()
  const picks: number[] = []
  let mass = 0
  for (const options of groups) {
    const at = pick(options, open, closed)
    const option = options[at]
    if (!option) return null
    picks.push(at)
    mass += option.mass
    for (const key of option.keys) used.set(key, (used.get(key) ?? 0) + option.mass)
  }
  return { mass, used, choice: { marks: used.size, mass, picks } }
}

function pick(options: readonly Paid[], open: ReadonlySet<string>, closed: ReadonlySet<string>): number {
  let [best, bestMass, bestFresh] = [-1, Infinity, Infinity]
  for (const [at, { mass, keys }] of options.entries()) {
    if (mass > bestMass + 1e-9 || keys.some((key) => closed.has(key))) continue
    const fresh = keys.filter((key) => !open.has(key)).length
    if (mass < bestMass - 1e-9 || fresh < bestFresh) [best, bestMass, bestFresh] = [at, mass, fresh]
  }
  return best
}

/** Nothing in this branch can be lighter than what is known for every number of marks that it could end with. */
function isBeaten(best: ReadonlyMap<number, Choice>, marks: number, bound: number): boolean {
  for (let fewer = marks; fewer >= 0; fewer--) {
    const known = best.get(fewer)
    if (known && known.mass <= bound + 1e-9) return true
  }
  return false
}

function note(best: Map<number, Choice>, choice: Choice): void {
  const known = best.get(choice.marks)
  if (!known || choice.mass < known.mass - 1e-9) best.set(choice.marks, choice)
}

function heaviestUndecided(used: ReadonlyMap<string, number>, open: ReadonlySet<string>): string | null {
  let [best, most] = [null as string | null, -1]
  for (const [key, mass] of used) {
    if (open.has(key)) continue
    if (mass > most || (mass === most && best !== null && key < best)) [best, most] = [key, mass]
  }
  return best
}
