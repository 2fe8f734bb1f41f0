import type { CSSProperties, ReactNode } from 'react'
import { colour, font, useWide } from '@/components/theme'
import type { Column, TableProps } from './table'

export type { Column, TableProps } from './table'

/** A real table; it scrolls sideways by itself where it does not fit, and is then reached with the keyboard. */
export function Table<Row>(props: TableProps<Row>) {
  const { caption, showCaption, columns, rows, rowKey, selectedKey, onSelect, foot, maxHeight } = props
  const isWide = useWide()
  const cell: CSSProperties = { ...styles.cell, height: isWide ? 24 : 44 }
  return (
    <div role="region" aria-label={caption} tabIndex={0} style={{ ...styles.scroll, maxHeight }}>
      <table style={styles.table}>
        <caption className={showCaption ? undefined : 'visually-hidden'} style={styles.caption}>
          {caption}
        </caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th key={column.key} scope="col" style={{ ...styles.head, ...placed(column) }}>
                {column.head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, index) => (
            <tr
              key={rowKey(row)}
              className={onSelect ? 'table-row pressable' : 'table-row'}
              aria-current={rowKey(row) === selectedKey ? 'true' : undefined}
              onClick={onSelect && (() => onSelect(row))}
            >
              {columns.map((column) =>
                column.isRowHead ? (
                  <th key={column.key} scope="row" style={{ ...cell, ...placed(column), fontWeight: 600 }}>
                    {onSelect ? <RowButton>{column.cell(row, index)}</RowButton> : column.cell(row, index)}
                  </th>
                ) : (
                  <td key={column.key} style={{ ...cell, ...placed(column) }}>
                    {column.cell(row, index)}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
        {foot ? (
          <tfoot>
            <tr>
              {columns.map((column) => (
                <td key={column.key} style={{ ...cell, ...placed(column), ...styles.foot }}>
                  {foot[column.key]}
                </td>
              ))}
            </tr>
          </tfoot>
        ) : null}
      </table>
    </div>
  )
}

/** The row takes the click; the button lets the keyboard reach it. */
function RowButton({ children }: { children: ReactNode }) {
  return (
    <button type="button" style={styles.button}>
      {children}
    </button>
  )
}

function placed<Row>(column: Column<Row>): CSSProperties {
  const { align = 'start', width, wraps } = column
  return { textAlign: align, width, minWidth: wraps ? width : undefined, whiteSpace: wraps ? 'normal' : 'nowrap' }
}

const styles = {
  scroll: { overflow: 'auto', maxWidth: '100%', minWidth: 0 },
  table: {
    borderCollapse: 'separate',
    borderSpacing: 0,
    minWidth: '100%',
    fontFamily: font.figures,
    fontSize: 15,
    lineHeight: '20px',
    color: colour.ink,
    fontVariantNumeric: 'tabular-nums',
  },
  caption: { textAlign: 'start', fontFamily: font.text, fontWeight: 600, padding: '4px 8px' },
  head: {
    position: 'sticky',
    top: 0,
    zIndex: 1,
    background: colour.sheet,
    color: colour.soft,
    fontFamily: font.text,
    fontSize: 13,
    fontWeight: 500,
    padding: '6px 8px',
    borderBottom: `1px solid ${colour.ink}`,
  },
  cell: { padding: '1px 8px', borderBottom: `1px solid ${colour.rule}`, fontWeight: 400, verticalAlign: 'middle' },
  foot: { borderTop: `1px solid ${colour.ink}`, borderBottom: 'none', fontWeight: 600 },
  button: {
    font: 'inherit',
    color: 'inherit',
    textAlign: 'inherit',
    background: 'none',
    border: 0,
    padding: 0,
    minHeight: 24,
    minWidth: 24,
    cursor: 'pointer',
  },
} as const satisfies Record<string, CSSProperties>
