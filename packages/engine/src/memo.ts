import type { LayoutIndex } from './layout-index'

/** Works something out once for each index and key that asks: what neighbouring zones have in common is made once. */
export function perIndex<T>(make: (index: LayoutIndex, key: string) => T): (index: LayoutIndex, key: string) => T {
  return remembered(make, (index) => index)
}

/**
 * Likewise for what does not hang on any steel: it is made once for all indexes of a layout that differ in steel alone,
 * so that trying steel does not work out the concrete again.
 */
export function perConcrete<T>(make: (index: LayoutIndex, key: string) => T): (index: LayoutIndex, key: string) => T {
  return remembered(make, (index) => index.concrete)
}

function remembered<T>(make: (index: LayoutIndex, key: string) => T, holderOf: (index: LayoutIndex) => object) {
  const ofHolder = new WeakMap<object, Map<string, { readonly value: T }>>()
  return (index: LayoutIndex, key: string): T => {
    const holder = holderOf(index)
    const made = ofHolder.get(holder) ?? new Map<string, { readonly value: T }>()
    ofHolder.set(holder, made)
    const known = made.get(key) ?? { value: make(index, key) }
    made.set(key, known)
    return known.value
  }
}
