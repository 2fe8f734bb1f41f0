/** What the exports need of a spreadsheet library; `excel-book.ts` is the one place that knows which it is. */

/** A formula carries the value that it comes to: some yards read with formulas off. */
export interface Formula {
  readonly formula: string
  readonly result: number
}

/** Text stays text whatever it begins with; a number is a number; null leaves the cell empty. */
export type CellValue = string | number | Formula | null

export interface CellStyle {
  readonly isBold?: boolean
  readonly isWrapped?: boolean
  readonly isHead?: boolean
  readonly align?: 'left' | 'center' | 'right'
  readonly format?: string
  readonly size?: number
}

export interface Column {
  readonly title: string
  readonly width: number
  readonly style?: CellStyle
}

/** A block of rows under titles; its top left cell is the first title. */
export interface TableBlock {
  readonly name: string
  readonly row: number
  readonly columns: readonly Column[]
  readonly rows: readonly (readonly CellValue[])[]
}

export interface PageSetup {
  /** A1:N40 */
  readonly area: string
  /** Rows repeated on every page. */
  readonly titleRows: string
  readonly footer: string
}

export interface Picture {
  readonly png: Uint8Array
  /** As shown, in pixels. */
  readonly width: number
  readonly height: number
}

export interface SheetWriter {
  /** Columns and rows count from 1. */
  put(row: number, column: number, cell: { readonly value: CellValue; readonly style?: CellStyle }): void
  table(block: TableBlock): void
  widths(widths: readonly number[]): void
  /** Height of a row in points, whatever its texts need. */
  rowHeight(row: number, points: number): void
  /** A picture in a cell, moving with it. */
  picture(row: number, column: number, picture: Picture): void
  freeze(rows: number): void
  page(setup: PageSetup): void
}

export interface BookProperties {
  readonly title: string
  readonly subject: string
  readonly author: string
  readonly atMs: number
}

export interface BookWriter {
  sheet(name: string): SheetWriter
  /** A name for a range such as Schedule!$C$10:$C$24. */
  name(name: string, range: string): void
  finish(): Promise<Buffer>
}

/** A range on a sheet, whose name is quoted where it is more than one word. */
export const onSheet = (sheet: string, range: string): string =>
  `${/^\w+$/.test(sheet) ? sheet : `'${sheet}'`}!${range}`

/** A, B, ... Z, AA for 1, 2, ... 26, 27. */
export function columnLetter(column: number): string {
  const last = String.fromCharCode(65 + ((column - 1) % 26))
  return column <= 26 ? last : columnLetter(Math.floor((column - 1) / 26)) + last
}
