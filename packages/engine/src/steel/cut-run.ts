/** Cuts one long straight bar into lapped pieces that the yard stocks. Lengths and places in mm along the bar. */

export interface Span {
  readonly from: number
  readonly to: number
}

export interface Run extends Span {
  /** Least length of a lap. */
  readonly lap: number
  /** Longest piece. */
  readonly stockLength: number
  /** Where no lap may lie. */
  readonly keepClear: readonly Span[]
  /** Whether a second bar beside this one must have its laps elsewhere. */
  readonly isStaggered: boolean
  /** From middle to middle of two laps that stand in different sections, in lap lengths: the basis's. */
  readonly stagger: number
}

export interface Cut {
  readonly pieces: readonly Span[]
  /** The same pieces laid from the other end, for every second bar. */
  readonly mirrored: readonly Span[]
  /** Laps of the two stand in different sections. */
  readonly isStaggered: boolean
  /** Least distance of a lap from what it must keep clear of; below 0 it lies over it by so much. */
  readonly clearance: number
}

/** Pieces come in whole steps of this, so that what is scheduled is what was placed. */
const STEP = 25
const COARSE = 100
const MIDDLE_STEP = 250
/** A sum of decimals may end a hair above a whole step. */
const HAIR = 1e-6

/**
 * Where to cut a bar: clear of the places named first, then staggered, then in few different lengths.
 *
 * @returns one piece where the bar is short enough; null where a lap leaves no room for a piece within the stock length.
 */
export function cutRun(run: Run): Cut | null {
  const whole = run.to - run.from
  if (whole <= run.stockLength + HAIR) {
    const piece = [{ from: run.from, to: run.to }]
    return { pieces: piece, mirrored: piece, isStaggered: true, clearance: Infinity }
  }
  if (run.stockLength < 3 * run.lap) return null
  const least = Math.ceil((whole - run.lap) / (run.stockLength - run.lap) - HAIR)
  const fewest = bestOf(run, least)
  if (fewest && fewest.cut.clearance >= 0 && fewest.cut.isStaggered) return fewest.cut
  const more = bestOf(run, least + 1)
  return [fewest, more].filter((one) => one !== null).sort(byRank)[0]?.cut ?? null
}

interface Ranked {
  readonly cut: Cut
  /** Compared place by place; the larger first. */
  readonly rank: readonly number[]
}

function byRank(one: Ranked, other: Ranked): number {
  const at = one.rank.findIndex((value, i) => value !== other.rank[i])
  return at < 0 ? 0 : (other.rank[at] ?? 0) - (one.rank[at] ?? 0)
}

function bestOf(run: Run, count: number): Ranked | null {
  let best: Ranked | null = null
  for (const [first, middle] of choices(run, count)) {
    const pieces = piecesOf(run, { count, first, middle })
    if (!pieces) continue
    const made = ranked(run, pieces)
    if (!best || byRank(made, best) < 0) best = made
  }
  return best
}

/** Lengths of the first and of the middle pieces that are tried: among them pieces that are all equal. */
function choices(run: Run, count: number): readonly (readonly [first: number, middle: number])[] {
  const { lap, stockLength } = run
  const most = Math.floor(stockLength / STEP + HAIR) * STEP
  const fewest = Math.ceil((2 * lap) / STEP) * STEP
  const equal = roundUp((run.to - run.from + (count - 1) * lap) / count)
  const step = count === 2 ? STEP : COARSE
  const firsts = series(most, fewest, step)
  const middles = count === 2 ? [0] : [...series(most, fewest, MIDDLE_STEP), equal]
  return [...middles.flatMap((middle) => firsts.map((first) => [first, middle] as const)), [equal, equal]]
}

const roundUp = (value: number): number => Math.ceil(value / STEP - HAIR) * STEP
const series = (most: number, least: number, step: number): readonly number[] =>
  Array.from({ length: Math.max(0, Math.floor((most - least) / step) + 1) }, (_, k) => most - k * step)

/** The last piece takes up what is left, in whole steps: its lap may be up to a step longer. */
function piecesOf(run: Run, of: { count: number; first: number; middle: number }): readonly Span[] | null {
  const pieces: Span[] = [{ from: run.from, to: run.from + of.first }]
  let end = run.from + of.first
  for (let k = 1; k < of.count - 1; k++) {
    pieces.push({ from: end - run.lap, to: end - run.lap + of.middle })
    end += of.middle - run.lap
  }
  const last = roundUp(run.to - (end - run.lap))
  if (end >= run.to || last > run.stockLength || last < 2 * run.lap) return null
  pieces.push({ from: run.to - last, to: run.to })
  return pieces
}

/** Where each piece overlaps the one before. */
export const lapsOf = (pieces: readonly Span[]): readonly Span[] =>
  pieces.slice(1).map(({ from }, k) => ({ from, to: pieces[k]?.to ?? from }))

function ranked(run: Run, pieces: readonly Span[]): Ranked {
  const mirror = ({ from, to }: Span): Span => ({ from: run.from + run.to - to, to: run.from + run.to - from })
  const laps = lapsOf(pieces)
  const other = laps.map(mirror)
  const isStaggered = laps.every((lap) => other.every((its) => apart(lap, its) >= run.stagger * run.lap - HAIR))
  const counted = run.isStaggered ? [...laps, ...other] : laps
  const clearance = counted.reduce(
    (least, lap) => run.keepClear.reduce((so, body) => Math.min(so, between(lap, body)), least),
    Infinity,
  )
  const isClear = clearance >= 0
  const lengths = new Set(pieces.map(({ from, to }) => Math.round(to - from)))
  const staggers = isStaggered || !run.isStaggered
  return {
    cut: { pieces, mirrored: pieces.map(mirror).reverse(), isStaggered, clearance },
    rank: [
      Number(isClear),
      isClear ? 0 : clearance,
      Number(staggers),
      -pieces.length,
      -lengths.size,
      isClear ? Math.min(clearance, 1e9) : 0,
    ],
  }
}

const apart = (one: Span, other: Span): number => Math.abs(one.from + one.to - other.from - other.to) / 2
/** Clear distance between two spans; below 0 they overlap by so much. */
const between = (one: Span, other: Span): number => Math.max(one.from - other.to, other.from - one.to)
