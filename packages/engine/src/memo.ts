import type { LayoutIndex } from './layout-index'

type Memo<T> = (index: LayoutIndex, key: string) => T

/** Works something out once for each index and key that asks: what neighbouring zones have in common is made once. */
export function perIndex<T>(make: Memo<T>): Memo<T> {
  return remembered(make, (index) => index)
}

/**
 * Likewise for what does not hang on any steel: it is made once for all indexes of a layout that differ in steel alone,
 * so that trying steel does not work out the concrete again.
 */
export function perConcrete<T>(make: Memo<T>): Memo<T> {
  return remembered(make, (index) => index.concrete)
}

interface Made {
  readonly value: unknown
}

/** By function: what it has made for an index. */
const madeBy = new WeakMap<object, (index: LayoutIndex) => Map<string, Made>>()

function remembered<T>(make: Memo<T>, holderOf: (index: LayoutIndex) => object): Memo<T> {
  const ofHolder = new WeakMap<object, Map<string, { readonly value: T }>>()
  const madeFor = (index: LayoutIndex) => {
    const holder = holderOf(index)
    const made = ofHolder.get(holder) ?? new Map<string, { readonly value: T }>()
    ofHolder.set(holder, made)
    return made
  }
  const recall = (index: LayoutIndex, key: string): T => {
    const made = madeFor(index)
    const known = made.get(key) ?? { value: make(index, key) }
    made.set(key, known)
    return known.value
  }
  madeBy.set(recall, madeFor)
  return recall
}

/** What a remembering function has made already; undefined where it has not been asked for. */
export function madeAlready<T>(memo: Memo<T>, index: LayoutIndex, key: string): T | undefined {
  return madeBy.get(memo)?.(index).get(key)?.value as T | undefined
}

/** Gives a remembering function what it would make, where that is known from elsewhere. */
export function remember<T>(memo: Memo<T>, { index, key }: { index: LayoutIndex; key: string }, value: T): void {
  madeBy.get(memo)?.(index).set(key, { value })
}

/** Carries what a function has made for one index over to another, for the keys that stand as they stood. */
export function carryOver(
  memo: Memo<unknown>,
  { from, to, isAsBefore }: { from: LayoutIndex; to: LayoutIndex; isAsBefore: (key: string) => boolean },
): void {
  const target = madeBy.get(memo)?.(to)
  for (const [key, made] of madeBy.get(memo)?.(from) ?? []) if (target && isAsBefore(key)) target.set(key, made)
}
