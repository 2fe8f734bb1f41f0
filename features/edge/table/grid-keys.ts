/** Where a cell stands in the grid; the row after the last holds the next anchor. */
export interface Place {
  readonly row: number
  readonly column: number
}

export interface Extent {
  readonly rows: number
  readonly columns: number
}

export interface KeyPress {
  readonly key: string
  readonly ctrl: boolean
  readonly shift: boolean
}

/** Where a key moves the focus, or null for a key that does not move it. Home and End go along the row, with Ctrl to the corners. */
export function moved(place: Place, { rows, columns }: Extent, press: KeyPress): Place | null {
  const last = { row: rows - 1, column: columns - 1 }
  switch (press.key) {
    case 'ArrowUp':
      return held({ ...place, row: press.ctrl ? 0 : place.row - 1 }, last)
    case 'ArrowDown':
      return held({ ...place, row: press.ctrl ? last.row : place.row + 1 }, last)
    case 'ArrowLeft':
      return held({ ...place, column: place.column - 1 }, last)
    case 'ArrowRight':
      return held({ ...place, column: place.column + 1 }, last)
    case 'Home':
      return { row: press.ctrl ? 0 : place.row, column: 0 }
    case 'End':
      return { row: press.ctrl ? last.row : place.row, column: last.column }
    case 'PageUp':
      return held({ ...place, row: place.row - 10 }, last)
    case 'PageDown':
      return held({ ...place, row: place.row + 10 }, last)
    default:
      return null
  }
}

/** Where Enter and Tab go after a cell was typed into; null where Tab leaves the grid. */
export function afterCommit(place: Place, { rows, columns }: Extent, press: KeyPress): Place | null {
  const last = { row: rows - 1, column: columns - 1 }
  if (press.key === 'Enter') return held({ ...place, row: place.row + (press.shift ? -1 : 1) }, last)
  const column = place.column + (press.shift ? -1 : 1)
  if (column < 0) return place.row === 0 ? null : { row: place.row - 1, column: last.column }
  if (column > last.column) return place.row === last.row ? null : { row: place.row + 1, column: 0 }
  return { row: place.row, column }
}

/** A key that types a character, and so begins to overwrite the cell. */
export const isTyping = ({ key, ctrl }: KeyPress): boolean => key.length === 1 && !ctrl

const held = ({ row, column }: Place, last: Place): Place => ({
  row: Math.min(Math.max(row, 0), last.row),
  column: Math.min(Math.max(column, 0), last.column),
})
