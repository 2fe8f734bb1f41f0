import type { Command } from '@wedgeline/contract'
import type { ClipboardEvent, CSSProperties, KeyboardEvent, RefObject } from 'react'
import { useEffect, useId, useRef, useState } from 'react'
import { StatusMark } from '@/components/ui/status-mark'
import { colour, font } from '@/components/theme'
import type { AnchorRow } from './anchor-rows'
import type { AnchorTableProps } from './anchor-table'
import { EDITABLE_COLUMNS, type AnchorColumn } from './columns'
import { afterCommit, isTyping, moved, type Extent, type KeyPress, type Place } from './grid-keys'

export type { AnchorTableProps } from './anchor-table'

const CHAINAGE = EDITABLE_COLUMNS.findIndex(({ key }) => key === 'chainageMm')

/** A cell that is being typed into. Rows keep their order meanwhile, so that none runs away under the cursor. */
interface Editing {
  readonly place: Place
  readonly text: string
  /** What Esc brings back. */
  readonly before: string
  readonly order: readonly string[]
}

/**
 * The anchors of an edge as a grid: arrows, Home and End move; typing or F2 edits; Enter and Tab commit and move on;
 * Esc brings back; Delete takes the anchor away. The last row takes the next anchor: a distance, or a pasted block.
 */
export function AnchorTable(props: AnchorTableProps) {
  const tableRef = useRef<HTMLTableElement>(null)
  const grid = useGrid(props, tableRef)
  const { rows, edge, canEdit } = props
  const id = useId()
  return (
    <div style={styles.scroll}>
      <table
        role="grid"
        aria-label={`Anchors of edge ${edge.mark}`}
        aria-describedby={`${id}-keys`}
        style={styles.table}
        ref={tableRef}
        onKeyDown={grid.onKeyDown}
        onPaste={grid.onPaste}
      >
        <thead>
          <tr>
            <th scope="col" style={styles.head}>
              Anchor
            </th>
            {EDITABLE_COLUMNS.map(({ key, head, align, width }) => (
              <th key={key} scope="col" style={{ ...styles.head, textAlign: align, width }}>
                {head}
              </th>
            ))}
            <th scope="col" style={styles.head}>
              Steel
            </th>
            <th scope="col" style={styles.head}>
              Worst check
            </th>
          </tr>
        </thead>
        <tbody>
          {grid.rows.map((row, at) => (
            <AnchorLine key={row.anchor.id} row={row} at={at} grid={grid} props={props} />
          ))}
          {canEdit ? <NextLine at={rows.length} grid={grid} /> : null}
        </tbody>
      </table>
      <p id={`${id}-keys`} className="visually-hidden">
        Arrows move, typing or F2 edits, Enter commits, Escape brings back, Delete takes an anchor away.
      </p>
      <p role="status" aria-live="polite" style={grid.problem ? styles.problem : styles.hint}>
        {grid.problem ??
          (canEdit
            ? 'Last row: type the next distance and Enter, or paste distance, height, strands from a spreadsheet.'
            : '')}
      </p>
    </div>
  )
}

type Grid = ReturnType<typeof useGrid>

function useGrid(props: AnchorTableProps, tableRef: RefObject<HTMLTableElement | null>) {
  const { layout, rows: sorted, canEdit, onSelect, onEdit, onInsert, onRemove } = props
  const [place, setPlace] = useState<Place>({ row: 0, column: CHAINAGE })
  const [editing, setEditing] = useState<Editing | null>(null)
  const [problem, setProblem] = useState<string | null>(null)
  const rows = editing ? inOrder(sorted, editing.order) : sorted
  const extent: Extent = { rows: rows.length + (canEdit ? 1 : 0), columns: EDITABLE_COLUMNS.length }
  const focused = useRef(false)
  const go = (next: Place) => {
    focused.current = true
    setPlace(next)
    const row = rows[next.row]
    if (row) onSelect(`anchor:${row.anchor.id}`)
  }
  useEffect(() => {
    if (!focused.current || editing) return
    cellAt(tableRef.current, place)?.focus({ preventScroll: false })
  }, [place, editing, rows.length, tableRef])

  const textAt = ({ row, column }: Place): string | null => {
    const line = rows[row]
    if (!line) return column === CHAINAGE ? '' : null
    return EDITABLE_COLUMNS[column]?.text(line) ?? null
  }
  const begin = (at: Place, first: string | null) => {
    const before = textAt(at)
    if (!canEdit || before === null) return
    focused.current = true
    setPlace(at)
    setProblem(null)
    setEditing({ place: at, before, text: first ?? before, order: rows.map(({ anchor }) => anchor.id) })
    if (first !== null) apply(at, first, true)
  }
  /** Applies a typed text. While typing, what cannot be read yet is left alone. */
  const apply = (at: Place, text: string, isTypingOn: boolean): boolean => {
    const row = rows[at.row]
    const column = EDITABLE_COLUMNS[at.column]
    if (!column) return false
    if (!row) {
      if (isTypingOn || text.trim() === '') return true
      const refused = onInsert(text)
      setProblem(refused)
      return refused === null
    }
    if (isTypingOn && (column.key === 'fromLast' || column.choices)) return true
    const read = column.read(text, row, layout)
    if (read.kind === 'change') onEdit(read.change)
    setProblem(read.kind === 'unreadable' && !isTypingOn ? read.message : null)
    return read.kind !== 'unreadable'
  }
  const type = (text: string) => {
    if (!editing) return
    setEditing({ ...editing, text })
    apply(editing.place, text, true)
  }
  const commit = (press: KeyPress | null): boolean => {
    if (!editing) return true
    if (!apply(editing.place, editing.text, false)) return false
    const isNext = editing.place.row >= rows.length
    setEditing(null)
    if (press && isNext && press.key === 'Enter') setPlace({ row: rows.length + 1, column: CHAINAGE })
    else if (press) {
      const next = afterCommit(editing.place, extent, press)
      if (next) go(next)
    }
    return true
  }
  const restore = () => {
    if (!editing) return
    if (editing.text !== editing.before) apply(editing.place, editing.before, false)
    setEditing(null)
    setProblem(null)
  }
  const onKeyDown = (event: KeyboardEvent) => {
    const press = { key: event.key, ctrl: event.ctrlKey || event.metaKey, shift: event.shiftKey }
    if (editing) return editingKey(event, press)
    const next = moved(place, extent, press)
    if (next) {
      event.preventDefault()
      return go(next)
    }
    if (press.key === 'Enter' || press.key === 'F2') {
      event.preventDefault()
      return begin(place, null)
    }
    const row = rows[place.row]
    if (press.key === 'Delete' && canEdit && row) return onRemove([row.anchor.id])
    if (isTyping(press) && canEdit) {
      event.preventDefault()
      begin(place, press.key)
    }
  }
  const editingKey = (event: KeyboardEvent, press: KeyPress) => {
    if (press.key === 'Enter' || press.key === 'Tab') {
      const leaves = press.key === 'Tab' && afterCommit(editing?.place ?? place, extent, press) === null
      if (!leaves) event.preventDefault()
      commit(press)
    } else if (press.key === 'Escape') {
      event.preventDefault()
      restore()
    }
  }
  const onPaste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text')
    const isBlock = /[\t\n]/.test(text.trim())
    if (!canEdit || (editing && !isBlock)) return
    event.preventDefault()
    setEditing(null)
    if (place.row >= rows.length) return setProblem(onInsert(text))
    const { commands, refused } = pastedOver({ text, place, rows, layout })
    if (commands.length > 0) onEdit({ label: 'Paste', commands })
    setProblem(refused)
  }
  return { rows, place, editing, problem, go, begin, type, commit, onKeyDown, onPaste }
}

/** A pasted block laid over existing rows, one change in all. */
function pastedOver(of: {
  readonly text: string
  readonly place: Place
  readonly rows: readonly AnchorRow[]
  readonly layout: AnchorTableProps['layout']
}): { readonly commands: readonly Command[]; readonly refused: string | null } {
  const commands: Command[] = []
  let refused: string | null = null
  of.text
    .replace(/\r?\n$/, '')
    .split(/\r?\n/)
    .forEach((line, i) => {
      line.split('\t').forEach((cell, j) => {
        const row = of.rows[of.place.row + i]
        const column = EDITABLE_COLUMNS[of.place.column + j]
        if (!row || !column || cell.trim() === '') return
        const read = column.read(cell, row, of.layout)
        if (read.kind === 'change') commands.push(...read.change.commands)
        else if (read.kind === 'unreadable') refused ??= `Line ${i + 1}, ${column.head}: ${read.message}`
      })
    })
  return { commands, refused }
}

function inOrder(rows: readonly AnchorRow[], order: readonly string[]): readonly AnchorRow[] {
  const byId = new Map(rows.map((row) => [row.anchor.id, row]))
  const kept = order.flatMap((id) => byId.get(id) ?? [])
  return kept.length === rows.length ? kept : rows
}

const cellAt = (table: HTMLTableElement | null, { row, column }: Place): HTMLElement | null =>
  table?.querySelector<HTMLElement>(`[data-place="${row}:${column}"]`) ?? null

function AnchorLine(of: {
  readonly row: AnchorRow
  readonly at: number
  readonly grid: Grid
  readonly props: AnchorTableProps
}) {
  const { row, at, grid, props } = of
  const isPicked = props.selected === `anchor:${row.anchor.id}`
  return (
    <tr style={isPicked ? styles.picked : undefined} aria-selected={isPicked}>
      <th
        scope="row"
        style={{ ...styles.cell, fontWeight: 600 }}
        onClick={() => grid.go({ row: at, column: CHAINAGE })}
      >
        {row.mark}
      </th>
      {EDITABLE_COLUMNS.map((column, index) => (
        <GridCell
          key={column.key}
          text={column.text(row)}
          place={{ row: at, column: index }}
          {...{ column, grid, props }}
        />
      ))}
      <td style={{ ...styles.words, maxWidth: 120 }} title={row.steel}>
        {row.steel || 'none'}
      </td>
      <td style={styles.words}>
        {row.worst ? <StatusMark status={row.worst.status} words={row.worst.words} kind="figure" oneLine /> : '–'}
      </td>
    </tr>
  )
}

function NextLine({ at, grid }: { readonly at: number; readonly grid: Grid }) {
  return (
    <tr>
      <th scope="row" style={{ ...styles.cell, color: colour.soft, fontWeight: 400 }}>
        next
      </th>
      {EDITABLE_COLUMNS.map((column, index) => (
        <GridCell
          key={column.key}
          text={index === CHAINAGE ? '' : null}
          place={{ row: at, column: index }}
          {...{ column, grid }}
        />
      ))}
      <td style={styles.words} colSpan={2} />
    </tr>
  )
}

function GridCell(of: {
  readonly text: string | null
  readonly place: Place
  readonly column: AnchorColumn
  readonly grid: Grid
  readonly props?: AnchorTableProps
}) {
  const { text, place, column, grid, props } = of
  const isHere = grid.place.row === place.row && grid.place.column === place.column
  const editing =
    grid.editing?.place.row === place.row && grid.editing.place.column === place.column ? grid.editing : null
  const choices = props && column.choices?.(props.layout)
  return (
    <td
      data-place={`${place.row}:${place.column}`}
      tabIndex={isHere && !editing ? 0 : -1}
      style={{ ...styles.cell, textAlign: column.align, ...(editing ? styles.here : null) }}
      onClick={() => (isHere && !editing ? grid.begin(place, null) : editing ? undefined : grid.go(place))}
      onDoubleClick={() => grid.begin(place, null)}
    >
      {editing ? (
        choices ? (
          <select
            autoFocus
            aria-label={column.head}
            value={editing.text}
            onChange={(event) => grid.type(event.target.value)}
            onBlur={() => grid.commit(null)}
            style={{ ...styles.input, textAlign: column.align }}
          >
            {choices.map((choice) => (
              <option key={choice}>{choice}</option>
            ))}
          </select>
        ) : (
          <input
            autoFocus
            aria-label={column.head}
            aria-invalid={grid.problem !== null}
            inputMode="decimal"
            value={editing.text}
            onChange={(event) => grid.type(event.target.value)}
            onBlur={() => grid.commit(null)}
            style={{ ...styles.input, textAlign: column.align, ...(grid.problem ? styles.unreadable : null) }}
          />
        )
      ) : (
        (text ?? (props ? '–' : ''))
      )}
    </td>
  )
}

const styles = {
  scroll: { overflow: 'auto', minWidth: 0, flex: 1, position: 'relative' },
  table: {
    borderCollapse: 'separate',
    borderSpacing: 0,
    width: '100%',
    fontFamily: font.figures,
    fontSize: 15,
    lineHeight: '20px',
    color: colour.ink,
    fontVariantNumeric: 'tabular-nums',
  },
  head: {
    position: 'sticky',
    top: 0,
    zIndex: 1,
    background: colour.sheet,
    color: colour.soft,
    fontFamily: font.text,
    fontSize: 13,
    fontWeight: 500,
    padding: '4px 8px',
    textAlign: 'start',
    borderBottom: `1px solid ${colour.ink}`,
    whiteSpace: 'nowrap',
  },
  cell: {
    padding: '1px 8px',
    height: 24,
    borderBottom: `1px solid ${colour.rule}`,
    cursor: 'cell',
    whiteSpace: 'nowrap',
    fontWeight: 400,
    textAlign: 'start',
  },
  words: {
    padding: '1px 8px',
    borderBottom: `1px solid ${colour.rule}`,
    whiteSpace: 'nowrap',
    maxWidth: 215,
    overflow: 'hidden',
    textOverflow: 'ellipsis',
  },
  here: { boxShadow: `inset 0 0 0 2px ${colour.ink}` },
  picked: { background: colour.wash },
  input: {
    font: 'inherit',
    color: colour.ink,
    background: colour.input,
    border: 0,
    outline: 'none',
    width: '100%',
    minWidth: 48,
    padding: 0,
    margin: 0,
  },
  unreadable: { outline: `2px solid ${colour.over}` },
  hint: { margin: 0, padding: '4px 8px', fontFamily: font.text, fontSize: 13, color: colour.soft },
  problem: { margin: 0, padding: '4px 8px', fontFamily: font.text, fontSize: 13, color: colour.over },
} as const satisfies Record<string, CSSProperties>
