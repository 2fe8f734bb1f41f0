/**
 * The one chainage axis that every band of an edge strip shares, in px. Plan and face are what somebody outside sees
 * who faces the slab; on the deck both are turned round. Nothing is mirrored: where chainage runs from right to left
 * in that view its figures fall from left to right.
 */
export interface StripScale {
  /** Chainage at the two ends of what is in view, from < to, mm. */
  readonly from: number
  readonly to: number
  readonly left: number
  readonly width: number
  readonly pxPerMm: number
  /** Chainage grows to the right on screen. */
  readonly growsRight: boolean
  x(chainage: number): number
  chainage(x: number): number
}

export interface View {
  readonly from: number
  readonly to: number
}

/** The scale that fits a view into a width in px, from `left` on. */
export function stripScale(of: {
  readonly view: View
  readonly left: number
  readonly width: number
  readonly growsRight: boolean
}): StripScale {
  const { view, left, width, growsRight } = of
  const { from, to } = view
  const pxPerMm = width / (to - from)
  return {
    ...view,
    left,
    width,
    pxPerMm,
    growsRight,
    x: (chainage) => left + (growsRight ? chainage - from : to - chainage) * pxPerMm,
    chainage: (x) => (growsRight ? from + (x - left) / pxPerMm : to - (x - left) / pxPerMm),
  }
}

/** Least length of edge in view, mm: one anchor's own surroundings. */
const VIEW_MIN_MM = 800

/** The view with `factor` times the length, about a chainage that holds its place; never beyond the edge. */
export function zoomed(view: View, edge: View, { factor, about }: { factor: number; about: number }): View {
  const length = clamp((view.to - view.from) * factor, Math.min(VIEW_MIN_MM, edge.to - edge.from), edge.to - edge.from)
  const share = (about - view.from) / (view.to - view.from)
  return within({ from: about - share * length, to: about + (1 - share) * length }, edge)
}

/** The view moved by so many mm of chainage; never beyond the edge. */
export function scrolled(view: View, edge: View, by: number): View {
  return within({ from: view.from + by, to: view.to + by }, edge)
}

/** The same view with a chainage brought into it, a fifth of its length from the nearer end. */
export function showing(view: View, edge: View, chainage: number): View {
  const length = view.to - view.from
  const margin = length / 5
  if (chainage < view.from + margin) return within({ from: chainage - margin, to: chainage - margin + length }, edge)
  if (chainage > view.to - margin) return within({ from: chainage + margin - length, to: chainage + margin }, edge)
  return view
}

function within(view: View, edge: View): View {
  const length = view.to - view.from
  const from = clamp(view.from, edge.from, Math.max(edge.from, edge.to - length))
  return { from, to: from + length }
}

const clamp = (value: number, least: number, most: number): number => Math.min(Math.max(value, least), most)

const STRETCHES = [1, 1.5, 2, 3, 4, 5, 6, 8, 10] as const

/** The largest plain factor by which heights may be stretched so that the face still fits its band. */
export function heightStretch(depthMm: number, pxPerMm: number, bandPx: number): number {
  return STRETCHES.findLast((factor) => depthMm * pxPerMm * factor <= bandPx) ?? 1
}

export interface Label {
  readonly id: string
  readonly x: number
  readonly width: number
  /** Higher wins the place. */
  readonly weight: number
}

/** Which labels of a row can stand without touching another; the heavier ones are placed first. */
export function fittingLabels(labels: readonly Label[], gapPx = 6): ReadonlySet<string> {
  const placed: Label[] = []
  for (const label of [...labels].sort((a, b) => b.weight - a.weight || a.x - b.x)) {
    const clear = placed.every((other) => Math.abs(other.x - label.x) >= (other.width + label.width) / 2 + gapPx)
    if (clear) placed.push(label)
  }
  return new Set(placed.map(({ id }) => id))
}
