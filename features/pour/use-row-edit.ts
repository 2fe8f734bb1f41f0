import { applyCommands, layoutProblems, type Command } from '@wedgeline/contract'
import { useState } from 'react'
import type { Change } from '../editing/draft'
import { useJobDraft } from '../editing/job-draft'

export interface RowEdit {
  /** Why the last edit was not taken; null once one is. */
  readonly refusal: string | null
  readonly canEdit: boolean
  /** Applies an edit unless it would contradict the layout; answers whether it was taken. */
  readonly apply: (change: Change) => boolean
}

/** Edits of a pour and its edges: what the server would refuse is said here, before anything is sent. */
export function useRowEdit(): RowEdit {
  const { layout, edit, canEdit } = useJobDraft()
  const [refusal, setRefusal] = useState<string | null>(null)
  const apply = (change: Change): boolean => {
    const problem = problemOf(layout, change.commands)
    setRefusal(problem)
    if (problem !== null) return false
    edit(change)
    return true
  }
  return { refusal, canEdit, apply }
}

function problemOf(layout: Parameters<typeof applyCommands>[0], commands: readonly Command[]): string | null {
  try {
    const known = new Set(layoutProblems(layout).map(({ field, message }) => `${field} ${message}`))
    const next = layoutProblems(applyCommands(layout, commands).layout)
    const fresh = next.find(
      ({ severity, field, message }) => severity === 'refused' && !known.has(`${field} ${message}`),
    )
    return fresh ? `Not taken: ${fresh.message}.` : null
  } catch (error) {
    return `Not taken: ${error instanceof Error ? error.message : String(error)}.`
  }
}
