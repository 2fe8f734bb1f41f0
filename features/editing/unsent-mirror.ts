import type { Unsaved } from './draft'

/**
 * What is unsent, written before the next line runs. IndexedDB takes any size but only promises to write: a page that
 * is reloaded straight after a key can end before that promise does. This copy is always as new or newer.
 */

const PREFIX = 'wedgeline-unsent/'

export function mirrorUnsent(key: string, unsaved: Unsaved): void {
  try {
    localStorage.setItem(PREFIX + key, JSON.stringify(unsaved))
  } catch {
    // Too large, or refused in a private window: then IndexedDB alone holds it.
    dropMirror(key)
  }
}

/** Null where there is no copy, or where it cannot be read. */
export function mirroredUnsent(key: string): Unsaved | null {
  try {
    const text = localStorage.getItem(PREFIX + key)
    return text === null ? null : (JSON.parse(text) as Unsaved)
  } catch {
    return null
  }
}

function dropMirror(key: string): void {
  try {
    localStorage.removeItem(PREFIX + key)
  } catch {
    // Nothing is stored where storage is refused.
  }
}
