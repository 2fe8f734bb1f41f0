import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Text } from '@/components/ui/text'

export interface SheetColumn<Row> {
  readonly head: string
  /** Share of the width. */
  readonly share: number
  readonly isFigure?: boolean
  readonly cell: (row: Row) => ReactNode
}

export interface SheetColumnsProps<Row> {
  readonly title: string
  readonly rows: readonly Row[]
  readonly columns: readonly SheetColumn<Row>[]
  /** Rows that the sheet has room for. */
  readonly most: number
}

/** A short table for print: every row on one line. */
export function SheetColumns<Row>({ title, rows, columns, most }: SheetColumnsProps<Row>) {
  const text = ({ share, isFigure }: SheetColumn<Row>) => [{ flex: share }, styles.cell, isFigure && styles.figure]
  return (
    <View>
      <Text kind="strong">{title}</Text>
      <View style={styles.row}>
        {columns.map((column) => (
          <Text key={column.head} kind="small" tone="soft" style={text(column)}>
            {column.head}
          </Text>
        ))}
      </View>
      {rows.slice(0, most).map((row, at) => (
        <View key={at} style={styles.row}>
          {columns.map((column) => {
            const shown = column.cell(row)
            const isText = typeof shown === 'string' || typeof shown === 'number'
            return isText ? (
              <Text key={column.head} kind="figure" numberOfLines={1} style={text(column)}>
                {shown}
              </Text>
            ) : (
              <View key={column.head} style={[{ flex: column.share }, styles.cell]}>
                {shown}
              </View>
            )
          })}
        </View>
      ))}
      {rows.length > most ? <Text kind="small">{`and ${rows.length - most} more`}</Text> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space.xs, borderBottomWidth: 1, borderColor: colour.rule, alignItems: 'center' },
  cell: { minWidth: 0 },
  figure: { textAlign: 'right', paddingRight: space.m },
})
