import { useState } from 'react'

/**
 * State of a form that outlives a reload and a turn to another page in this tab. Nothing typed is lost until it is
 * stored or put back.
 */
export function useKeptForm<T>(key: string, stored: T) {
  const [typed, setTyped] = useState<T | null>(() => keptAt<T>(key))
  const set = (next: T | null) => {
    keep(key, next)
    setTyped(next)
  }
  return { form: typed ?? stored, isTyped: typed !== null, set }
}

function keptAt<T>(key: string): T | null {
  try {
    const kept = sessionStorage.getItem(key)
    return kept === null ? null : (JSON.parse(kept) as T)
  } catch {
    return null
  }
}

function keep(key: string, form: unknown): void {
  try {
    if (form === null) sessionStorage.removeItem(key)
    else sessionStorage.setItem(key, JSON.stringify(form))
  } catch {
    // Storage is refused or full: the form then lasts as long as the page.
  }
}
