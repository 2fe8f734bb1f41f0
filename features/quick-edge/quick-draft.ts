import { useEffect, useState } from 'react'
import type { QuickForm } from './quick-form'

/** What somebody typed for a quick edge, kept on this device until it is kept in the company. */
export interface QuickDraft {
  readonly companyId: string
  /** Null until the company's hardware has given the usual values. */
  readonly form: QuickForm | null
  readonly text: string
  readonly begunAtMs: number
}

const PREFIX = 'wedgeline-quick-edge/'

export interface KeptDraft {
  readonly draft: QuickDraft
  readonly change: (changes: Partial<QuickDraft>) => void
  readonly forget: () => void
}

/** The draft of one person; written with every key, so that a reload straight after it loses nothing. */
export function useQuickDraft(personId: string, companyId: string): KeptDraft {
  const key = PREFIX + personId
  const [draft, setDraft] = useState(() => read(key, companyId) ?? empty(companyId))
  useEffect(() => {
    if (draft.text !== '' || draft.form !== null) write(key, draft)
  }, [key, draft])
  return {
    draft,
    change: (changes) => setDraft((now) => ({ ...now, ...changes })),
    forget: () => {
      write(key, null)
      setDraft(empty(companyId))
    },
  }
}

const empty = (companyId: string): QuickDraft => ({ companyId, form: null, text: '', begunAtMs: Date.now() })

/** Null where there is none, where it cannot be read, and where it is of a company that the person has left. */
function read(key: string, companyId: string): QuickDraft | null {
  try {
    const kept = localStorage.getItem(key)
    if (kept === null) return null
    const draft = JSON.parse(kept) as QuickDraft
    return typeof draft.text === 'string' && draft.companyId === companyId ? draft : null
  } catch {
    return null
  }
}

function write(key: string, draft: QuickDraft | null): void {
  try {
    if (draft) localStorage.setItem(key, JSON.stringify(draft))
    else localStorage.removeItem(key)
  } catch {
    // Refused in a private window: the draft then lasts as long as the page.
  }
}
