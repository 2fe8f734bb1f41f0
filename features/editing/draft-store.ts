import type { Batch, Conflict, LayoutFile } from '@wedgeline/contract'
import {
  acknowledged,
  edit,
  openDraft,
  redo,
  refusedAsStale,
  restore,
  settle,
  takeBatch,
  undo,
  type Change,
  type Draft,
  type Unsaved,
} from './draft'

/** What the store needs from outside: the wire, storage that outlives the tab, ids and a timer. */
export interface DraftPorts {
  load(): Promise<{ readonly layout: LayoutFile; readonly versions: Readonly<Record<string, number>> }>
  /** Sends a batch whole. A stale one answers with conflicts; a failing wire throws. */
  send(batch: Batch): Promise<Sent>
  keep(unsaved: Unsaved): Promise<void>
  kept(): Promise<Unsaved | null>
  newId(): string
  later(run: () => void, ms: number): () => void
}

export type Sent =
  | { readonly kind: 'stored'; readonly versions: Readonly<Record<string, number>> }
  | { readonly kind: 'stale'; readonly conflicts: readonly Conflict[] }
  | { readonly kind: 'refused'; readonly message: string }

export type SaveState = 'saved' | 'saving' | 'unsaved' | 'not-sent' | 'conflict' | 'refused'

export interface DraftView {
  readonly draft: Draft | null
  readonly save: SaveState
  /** Why the server refused or could not be reached; null otherwise. */
  readonly problem: string | null
  /** When the server last stored an edit of this page; null before the first. */
  readonly savedAtMs: number | null
  /** How many kept edits no longer fitted after a reload or a conflict. */
  readonly dropped: number
}

const SEND_AFTER_MS = 400
const RETRY_MS = [1000, 2000, 5000, 10_000, 30_000] as const

/** Holds one job's draft, saves it by itself, and never loses a key: what is unsent is kept before it is sent. */
export class DraftStore {
  private view: DraftView = { draft: null, save: 'saved', problem: null, savedAtMs: null, dropped: 0 }
  private readonly listeners = new Set<() => void>()
  private cancelTimer: (() => void) | null = null
  private failures = 0

  constructor(private readonly ports: DraftPorts) {}

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener)
    return () => this.listeners.delete(listener)
  }
  readonly current = (): DraftView => this.view

  /** Loads the layout and puts back what an earlier tab could not send. */
  async open(): Promise<void> {
    const kept = await this.ports.kept()
    const answer = kept?.sending ? await this.ports.send(kept.sending) : null
    const loaded = await this.ports.load()
    const fresh = openDraft({ jobId: loaded.layout.job.id, ...loaded })
    const isStored = answer?.kind === 'stored'
    const commands = [...(isStored ? [] : (kept?.sending?.commands ?? [])), ...(kept?.unsent ?? [])]
    const { draft, dropped } = restore(fresh, commands)
    const conflicts = answer?.kind === 'stale' ? answer.conflicts : []
    this.show({
      draft: { ...draft, conflicts },
      dropped: dropped.length,
      save: conflicts.length ? 'conflict' : 'saved',
    })
    if (draft.unsent.length > 0 && conflicts.length === 0) this.schedule(0)
  }

  /** Applies an edit at once and saves it soon. @throws CommandError when it does not fit; nothing is changed then. */
  edit(change: Change): void {
    this.change((draft) => edit(draft, change))
  }
  undo(): void {
    this.change(undo)
  }
  redo(): void {
    this.change(redo)
  }

  /** Sends now: on blur, on hiding or leaving the page. */
  async flush(): Promise<void> {
    this.cancelTimer?.()
    this.cancelTimer = null
    const draft = this.view.draft
    if (!draft) return
    const taken = takeBatch(draft, this.ports.newId())
    if (!taken.sending) return
    this.show({ draft: taken, save: 'saving', problem: null })
    await this.ports.keep({ sending: taken.sending, unsent: taken.unsent })
    await this.deliver(taken.sending)
  }

  /** Takes what the server holds now, with what is unsent here put back on it. */
  async reload(): Promise<void> {
    const loaded = await this.ports.load()
    const draft = this.view.draft
    if (!draft || draft.sending) return
    const { draft: next, dropped } = restore(openDraft({ jobId: draft.jobId, ...loaded }), draft.unsent)
    this.show({ draft: { ...next, undo: draft.undo, redo: draft.redo }, dropped: dropped.length })
  }

  /** Ends a conflict by keeping what was typed here or what the server holds. */
  async settle(keep: 'mine' | 'theirs'): Promise<void> {
    const draft = this.view.draft
    if (!draft) return
    const settled = settle(draft, await this.ports.load(), keep)
    this.show({
      draft: settled.draft,
      dropped: keep === 'mine' ? settled.dropped.length : 0,
      save: 'saved',
      problem: null,
    })
    await this.ports.keep({ sending: null, unsent: settled.draft.unsent })
    if (settled.draft.unsent.length > 0) this.schedule(0)
  }

  private change(step: (draft: Draft) => Draft): void {
    const { draft, save } = this.view
    if (!draft) return
    const next = step(draft)
    if (next === draft) return
    this.show({ draft: next, save: save === 'conflict' ? 'conflict' : 'unsaved', problem: null })
    void this.ports.keep({ sending: next.sending, unsent: next.unsent })
    if (!next.sending) this.schedule(SEND_AFTER_MS)
  }

  private schedule(ms: number): void {
    this.cancelTimer?.()
    this.cancelTimer = this.ports.later(() => void this.flush(), ms)
  }

  private async deliver(batch: Batch): Promise<void> {
    try {
      this.answered(await this.ports.send(batch))
      this.failures = 0
    } catch {
      const wait = RETRY_MS[Math.min(this.failures, RETRY_MS.length - 1)] ?? 1000
      this.failures += 1
      this.show({ save: 'not-sent', problem: 'Not sent yet: the server cannot be reached. Your work is kept here.' })
      this.cancelTimer = this.ports.later(() => void this.deliver(batch), wait)
    }
  }

  private answered(answer: Sent): void {
    const draft = this.view.draft
    if (!draft?.sending) return
    if (answer.kind === 'stored') {
      const next = acknowledged(draft, answer.versions)
      this.show({
        draft: next,
        save: next.unsent.length > 0 ? 'unsaved' : 'saved',
        problem: null,
        savedAtMs: Date.now(),
      })
      if (next.unsent.length > 0) this.schedule(SEND_AFTER_MS)
    } else if (answer.kind === 'stale') {
      this.show({ draft: refusedAsStale(draft, answer.conflicts), save: 'conflict', problem: null })
    } else {
      this.show({ draft: refusedAsStale(draft, []), save: 'refused', problem: answer.message })
    }
    const { sending, unsent } = this.view.draft ?? draft
    void this.ports.keep({ sending, unsent })
  }

  private show(part: Partial<DraftView>): void {
    this.view = { ...this.view, ...part }
    for (const listener of this.listeners) listener()
  }
}
