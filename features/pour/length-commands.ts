import type { EdgeData } from '@wedgeline/contract'

type Length = EdgeData['lengths'][number]

/** The lengths of an edge in order of chainage: they cover it from end to end without gap or overlap. */
export const inOrder = (lengths: readonly Length[]): readonly Length[] =>
  [...lengths].sort((a, b) => a.fromMm - b.fromMm)

/** Moves the place where a length ends and the next begins; both follow. Null where it would leave either without room. */
export function movedEnd(lengths: readonly Length[], id: string, toMm: number): Length[] | null {
  const ordered = inOrder(lengths)
  const at = ordered.findIndex((length) => length.id === id)
  const [here, next] = [ordered[at], ordered[at + 1]]
  if (!here || !next || toMm <= here.fromMm || toMm >= next.toMm) return null
  return ordered.map((length) => {
    if (length.id === here.id) return { ...length, toMm }
    return length.id === next.id ? { ...length, fromMm: toMm } : length
  })
}

/** Two lengths in place of one, alike but for their ends, parted in the middle at a whole millimetre. */
export function split(lengths: readonly Length[], id: string, newId: string): Length[] {
  return inOrder(lengths).flatMap((length) => {
    const middle = Math.round((length.fromMm + length.toMm) / 2)
    if (length.id !== id || middle <= length.fromMm || middle >= length.toMm) return [length]
    return [
      { ...length, toMm: middle },
      { ...length, id: newId, fromMm: middle },
    ]
  })
}

/** Takes a length away; the one before it, or after the first, takes up its place. The last one stays. */
export function joined(lengths: readonly Length[], id: string): Length[] {
  const ordered = inOrder(lengths)
  const at = ordered.findIndex((length) => length.id === id)
  const gone = ordered[at]
  const heir = ordered[at - 1] ?? ordered[at + 1]
  if (!gone || !heir) return [...ordered]
  const fromMm = Math.min(gone.fromMm, heir.fromMm)
  const toMm = Math.max(gone.toMm, heir.toMm)
  return ordered
    .filter((length) => length.id !== id)
    .map((length) => (length.id === heir.id ? { ...heir, fromMm, toMm } : length))
}
