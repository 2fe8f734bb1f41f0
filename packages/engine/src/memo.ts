import type { LayoutIndex } from './layout-index'

/** Works something out once for each index and key that asks: what neighbouring zones have in common is made once. */
export function perIndex<T>(make: (index: LayoutIndex, key: string) => T): (index: LayoutIndex, key: string) => T {
  const ofIndex = new WeakMap<LayoutIndex, Map<string, { readonly value: T }>>()
  return (index, key) => {
    const made = ofIndex.get(index) ?? new Map<string, { readonly value: T }>()
    ofIndex.set(index, made)
    const known = made.get(key) ?? { value: make(index, key) }
    made.set(key, known)
    return known.value
  }
}
