import type { Status } from '@wedgeline/engine'
import type { ReactNode } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { colour, space } from '@/components/theme'
import { fittingLabels, type StripScale } from './scale'

export interface DataCell {
  readonly id: string
  readonly chainage: number
  readonly text: string
  /** Status to mark the cell with; its word is read out. */
  readonly status?: Status | undefined
  readonly isStrong?: boolean
  readonly isSelected?: boolean
  /** Said instead of the text where that is too short to stand alone. */
  readonly spoken?: string
  readonly onPress?: (() => void) | undefined
  /** Higher keeps its place where labels would touch. */
  readonly weight?: number
}

export interface DataRowProps {
  readonly label: string
  readonly scale: StripScale
  readonly height: number
  readonly cells: readonly DataCell[]
  readonly gutter: number
  /** On a phone the name stands over its row instead of beside it. */
  readonly isLabelAbove?: boolean
}

const CHAR_PX = 7
/** How far a label may reach past the end of the strip, into its margin. */
const END_PX = 6
const ICON_PX = 20

const STATUS_COLOUR = {
  stop: 'over',
  over: 'over',
  near: 'near',
  within: 'within',
  'needs-judgement': 'ink',
  'not-covered': 'ink',
} as const

const LABEL_PX = 18

const STATUS_TONE = {
  stop: 'over',
  over: 'over',
  near: 'near',
  within: 'ink',
  'needs-judgement': 'ink',
  'not-covered': 'ink',
} as const

/** A row of figures in line with what they describe. Where they would touch, a cell keeps only its mark. */
export function DataRow({ label, scale, height, cells, gutter, isLabelAbove = false }: DataRowProps) {
  const inView = cells.filter(({ chainage }) => chainage >= scale.from && chainage <= scale.to)
  const widthOf = (cell: DataCell) => cell.text.length * CHAR_PX + (cell.status ? ICON_PX : 0)
  // A label at an end of the strip stands inside it.
  const middleOf = (cell: DataCell) => {
    const half = widthOf(cell) / 2
    const { left, width } = scale
    return Math.min(Math.max(scale.x(cell.chainage), left + half - END_PX), left + width - half + END_PX)
  }
  const fitting = fittingLabels(
    inView.map((cell) => ({ id: cell.id, x: middleOf(cell), width: widthOf(cell), weight: cell.weight ?? 0 })),
  )
  const shown = inView.filter(
    (cell) => fitting.has(cell.id) || isClear(cell, { scale, inView, fitting, widthOf, middleOf }),
  )
  return (
    <View style={[styles.row, { height: isLabelAbove ? height + LABEL_PX : height }]}>
      <View style={isLabelAbove ? styles.labelAbove : [styles.label, { width: gutter }]}>
        <Text kind="small" tone="soft" numberOfLines={1}>
          {label}
        </Text>
      </View>
      {shown.map((cell) => {
        const isWhole = fitting.has(cell.id)
        const width = isWhole ? widthOf(cell) + 12 : ICON_PX
        const left = (isWhole ? middleOf(cell) : scale.x(cell.chainage)) - width / 2
        return (
          <Cell key={cell.id} cell={cell} style={{ left, width, height }}>
            {cell.status ? <Icon name={cell.status} size={14} colour={colour[STATUS_COLOUR[cell.status]]} /> : null}
            {isWhole ? (
              <Text
                kind={cell.isStrong ? 'figureStrong' : 'figure'}
                tone={cell.status ? STATUS_TONE[cell.status] : 'ink'}
                numberOfLines={1}
              >
                {cell.text}
              </Text>
            ) : cell.status ? null : (
              <View style={styles.dot} />
            )}
          </Cell>
        )
      })}
    </View>
  )
}

/** A cell that keeps only its mark still needs room for it beside the labels that stand whole. */
function isClear(
  cell: DataCell,
  row: {
    readonly scale: StripScale
    readonly inView: readonly DataCell[]
    readonly fitting: ReadonlySet<string>
    readonly widthOf: (cell: DataCell) => number
    readonly middleOf: (cell: DataCell) => number
  },
): boolean {
  const x = row.scale.x(cell.chainage)
  return row.inView.every(
    (other) =>
      !row.fitting.has(other.id) || Math.abs(row.middleOf(other) - x) >= (row.widthOf(other) + ICON_PX) / 2 + 2,
  )
}

function Cell(props: {
  readonly cell: DataCell
  readonly style: { readonly left: number; readonly width: number; readonly height: number }
  readonly children: ReactNode
}) {
  const { cell, style, children } = props
  const selected = cell.isSelected ? styles.selected : null
  if (!cell.onPress) return <View style={[styles.cell, style, selected]}>{children}</View>
  return (
    <Pressable
      role="button"
      aria-label={cell.spoken ?? cell.text}
      aria-pressed={cell.isSelected ?? false}
      onPress={cell.onPress}
      style={(state) => [styles.cell, style, selected, state.hovered && styles.over]}
    >
      {children}
    </Pressable>
  )
}

const styles = StyleSheet.create({
  row: { borderTopWidth: 1, borderColor: colour.rule },
  label: {
    position: 'absolute',
    left: 0,
    top: 0,
    bottom: 0,
    justifyContent: 'center',
    alignItems: 'flex-end',
    paddingRight: space.s,
  },
  labelAbove: { paddingHorizontal: space.m, height: LABEL_PX },
  cell: {
    position: 'absolute',
    bottom: 0,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 4,
  },
  selected: { backgroundColor: colour.wash },
  over: { backgroundColor: colour.wash },
  dot: { width: 3, height: 3, backgroundColor: colour.soft },
})
