import type { ReactNode } from 'react'
import { ScrollView, StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Text } from './text'

export interface Column<Row> {
  readonly key: string
  readonly head: string
  /** Figures stand at the end, words at the start. */
  readonly align?: 'start' | 'end'
  readonly width?: number
  /** Long words may take several lines; without it the row stays one line high and the table scrolls. */
  readonly wraps?: boolean
  /** The column that names the row; exactly one has it. */
  readonly isRowHead?: boolean
  readonly cell: (row: Row, index: number) => ReactNode
}

export interface TableProps<Row> {
  /** Names the table; read out, and shown with `showCaption`. */
  readonly caption: string
  readonly showCaption?: boolean
  readonly columns: readonly Column<Row>[]
  readonly rows: readonly Row[]
  readonly rowKey: (row: Row) => string
  readonly selectedKey?: string | null
  /** Pressing a row or its head. */
  readonly onSelect?: (row: Row) => void
  /** Totals: a cell for each column key that has one. */
  readonly foot?: Readonly<Record<string, ReactNode>>
  /** Height in px above which the rows scroll under a head that stays. */
  readonly maxHeight?: number
}

/** Rows and columns that scroll sideways where they do not fit. */
export function Table<Row>(props: TableProps<Row>) {
  const { caption, columns, rows, rowKey, onSelect, selectedKey } = props
  return (
    <ScrollView horizontal aria-label={caption}>
      <View>
        <View style={styles.row}>
          {columns.map((column) => (
            <Text key={column.key} kind="label" tone="soft" style={[styles.cell, { width: column.width ?? 120 }]}>
              {column.head}
            </Text>
          ))}
        </View>
        {rows.map((row, index) => (
          <View key={rowKey(row)} style={[styles.row, rowKey(row) === selectedKey && styles.selected]}>
            {columns.map((column) => (
              <View key={column.key} style={[styles.cell, { width: column.width ?? 120 }]}>
                <Text
                  kind={column.isRowHead ? 'figureStrong' : 'figure'}
                  {...(onSelect ? { onPress: () => onSelect(row) } : {})}
                >
                  {column.cell(row, index)}
                </Text>
              </View>
            ))}
          </View>
        ))}
      </View>
    </ScrollView>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', borderBottomWidth: 1, borderColor: colour.rule },
  cell: { paddingVertical: space.xs, paddingHorizontal: space.s },
  selected: { backgroundColor: colour.wash },
})
