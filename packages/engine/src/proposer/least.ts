/**
 * The least value of a rising series for which something holds, by halving.
 *
 * @param holds once true for a value, taken to be true for every larger one.
 * @returns null where it does not hold for the largest.
 */
export function leastOf(
  { from, to, step }: { readonly from: number; readonly to: number; readonly step: number },
  holds: (value: number) => boolean,
): number | null {
  const last = Math.floor((to - from) / step)
  if (last < 0 || !holds(from + last * step)) return null
  let [low, high] = [0, last]
  while (low < high) {
    const middle = Math.floor((low + high) / 2)
    if (holds(from + middle * step)) high = middle
    else low = middle + 1
  }
  return from + high * step
}
