import { applyCommands, type Batch, type Command, type Conflict, type LayoutFile } from '@wedgeline/contract'

/**
 * The client's side of editing: what the server last said, the batches that it has not answered yet, and the way back.
 * Plain data in, plain data out; timers, storage and the wire are in draft-store.ts.
 */
export interface Draft {
  readonly jobId: string
  /** The layout as the server last sent it. */
  readonly base: LayoutFile
  readonly versions: Readonly<Record<string, number>>
  /** What is on screen: base with everything unsent applied. */
  readonly layout: LayoutFile
  /** Batch on its way; kept until the server answers. */
  readonly sending: Batch | null
  readonly unsent: readonly Command[]
  readonly undo: readonly Change[]
  readonly redo: readonly Change[]
  readonly conflicts: readonly Conflict[]
}

/** One step of undo: what it was called, and the commands that take it back. */
export interface Change {
  readonly label: string
  readonly commands: readonly Command[]
  /** Changes that follow each other with the same key, the keys typed into one field, are one step of undo. */
  readonly key?: string
}

const UNDO_LEVELS = 200

/** A draft of a layout as the server sent it, with nothing unsent. */
export function openDraft(loaded: Pick<Draft, 'jobId' | 'versions'> & { readonly layout: LayoutFile }): Draft {
  const { jobId, versions, layout } = loaded
  return { jobId, versions, base: layout, layout, sending: null, unsent: [], undo: [], redo: [], conflicts: [] }
}

/** Applies commands on screen and puts them with the unsent ones. @throws CommandError when they do not fit. */
export function edit(draft: Draft, change: Change): Draft {
  const { layout, inverse } = applyCommands(draft.layout, change.commands)
  const last = draft.undo.at(-1)
  const goesOn = change.key !== undefined && last?.key === change.key
  const undo = goesOn ? draft.undo : [...draft.undo, { ...change, commands: inverse }].slice(-UNDO_LEVELS)
  const unsent = goesOn ? withoutOverwritten(draft.unsent, change.commands) : draft.unsent
  return { ...draft, layout, unsent: [...unsent, ...change.commands], undo, redo: [] }
}

/** Drops the last unsent command when the next one sets the same fields of the same row again. */
function withoutOverwritten(unsent: readonly Command[], next: readonly Command[]): readonly Command[] {
  const last = unsent.at(-1)
  const [first] = next
  if (next.length !== 1 || last?.type !== 'set' || first?.type !== 'set') return unsent
  const isSame = last.table === first.table && last.id === first.id && sameFields(last.changes, first.changes)
  return isSame ? unsent.slice(0, -1) : unsent
}

const sameFields = (a: Readonly<Record<string, unknown>>, b: Readonly<Record<string, unknown>>): boolean =>
  Object.keys(a).sort().join() === Object.keys(b).sort().join()

/** Takes the last change back; the same draft where there is none. */
export const undo = (draft: Draft): Draft => stepBack(draft, 'undo', 'redo')

/** Makes the change that was taken back last again; the same draft where there is none. */
export const redo = (draft: Draft): Draft => stepBack(draft, 'redo', 'undo')

type Way = 'undo' | 'redo'

/** Applies the last change of one list and puts its inverse on the other. */
function stepBack(draft: Draft, from: Way, to: Way): Draft {
  const last = draft[from].at(-1)
  if (!last) return draft
  const { layout, inverse } = applyCommands(draft.layout, last.commands)
  return {
    ...draft,
    layout,
    unsent: [...draft.unsent, ...last.commands],
    [from]: draft[from].slice(0, -1),
    [to]: [...draft[to], { label: last.label, commands: inverse }],
  }
}

/** Makes one batch of everything unsent. While a batch is on its way nothing more is sent. */
export function takeBatch(draft: Draft, batchId: string): Draft {
  if (draft.sending || draft.unsent.length === 0 || draft.conflicts.length > 0) return draft
  const bases = Object.fromEntries(
    unitsOf(draft.base, draft.unsent).map((unit) => [unit, draft.versions[unit] ?? 0] as const),
  )
  return { ...draft, unsent: [], sending: { id: batchId, jobId: draft.jobId, bases, commands: [...draft.unsent] } }
}

function unitsOf(base: LayoutFile, commands: readonly Command[]): readonly string[] {
  return applyCommands(base, commands).units
}

/** The server stored the batch. */
export function acknowledged(draft: Draft, versions: Readonly<Record<string, number>>): Draft {
  if (!draft.sending) return draft
  const base = applyCommands(draft.base, draft.sending.commands).layout
  return { ...draft, base, sending: null, versions: { ...draft.versions, ...versions } }
}

/** Somebody else changed the same unit first: nothing was stored, and both values are shown. */
export function refusedAsStale(draft: Draft, conflicts: readonly Conflict[]): Draft {
  if (!draft.sending) return draft
  return { ...draft, conflicts, unsent: [...draft.sending.commands, ...draft.unsent], sending: null }
}

/** After a stale batch: takes the server's newer layout and keeps or drops what was typed here. */
export function settle(
  draft: Draft,
  newer: { readonly layout: LayoutFile; readonly versions: Readonly<Record<string, number>> },
  keep: 'mine' | 'theirs',
): { readonly draft: Draft; readonly dropped: readonly Command[] } {
  const fresh = openDraft({ jobId: draft.jobId, ...newer })
  return keep === 'theirs' ? { draft: fresh, dropped: draft.unsent } : restore(fresh, draft.unsent)
}

/** Everything typed here that the server has not confirmed, for keeping through a reload. */
export interface Unsaved {
  readonly sending: Batch | null
  readonly unsent: readonly Command[]
}

/**
 * Puts commands kept from before a reload on a freshly loaded layout, one by one.
 * Those that no longer fit, because their row is gone, are returned so that the person can be told.
 */
export function restore(
  draft: Draft,
  commands: readonly Command[],
): { readonly draft: Draft; readonly dropped: readonly Command[] } {
  const dropped: Command[] = []
  let next = draft
  for (const command of commands) {
    try {
      const { layout } = applyCommands(next.layout, [command])
      next = { ...next, layout, unsent: [...next.unsent, command] }
    } catch {
      dropped.push(command)
    }
  }
  return { draft: next, dropped }
}
