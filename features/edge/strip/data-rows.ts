import { jackingForce } from '@wedgeline/engine/geometry'
import type { LayoutIndex, ZoneResult } from '@wedgeline/engine'
import { worstShort, worstWords } from '../../checks/words'
import { steelWords } from '../steel-words'
import type { DataCell } from './data-row'
import type { StripData } from './strip-data'

export interface Row {
  readonly label: string
  readonly cells: readonly DataCell[]
  /** Its cells can be pressed, and so need the height of a thumb. */
  readonly isPressed: boolean
}

export interface RowsOf {
  readonly index: LayoutIndex
  readonly data: StripData
  readonly results: ReadonlyMap<string, ZoneResult>
  readonly selected: string | null
  readonly onSelect: (zoneId: string) => void
  readonly isTableOpen: boolean
}

/** The figures under the drawing, a row each; those that the open table repeats are left out. */
export function dataRows(of: RowsOf): readonly Row[] {
  const { isTableOpen } = of
  const repeated = [heightRow(of), forceRow(of), steelRow(of)]
  return [anchorRow(of), worstRow(of), ...(isTableOpen ? [] : repeated), wedgeRow(of), wedgeBarsRow(of)]
}

/** Marks end in two figures; the edge's own mark is in the screen's title. */
const shortMark = (mark: string): string => mark.slice(mark.lastIndexOf('-') + 1)

function anchorRow({ data, results, selected, onSelect }: RowsOf): Row {
  const cells = data.ends.map((end): DataCell => {
    const zoneId = `anchor:${end.id}`
    const result = results.get(zoneId)
    const worst = result ? worstWords(result) : null
    const place = end.isInPan ? `${end.mark} pan` : `${shortMark(end.mark)} ${end.end}`
    return {
      id: end.id,
      chainage: end.chainage,
      text: place,
      isStrong: true,
      isSelected: selected === zoneId,
      spoken: `${end.mark}, ${end.end} end${worst ? `, ${worst.words}` : ''}`,
      weight: selected === zoneId ? 1 : 0,
      onPress: () => onSelect(zoneId),
    }
  })
  return { label: 'Anchor', cells, isPressed: true }
}

const WORST_WEIGHT = { stop: 6, over: 5, 'not-covered': 4, 'needs-judgement': 3, near: 2, within: 1 } as const

function worstRow({ data, results, onSelect }: RowsOf): Row {
  const cells = data.ends.flatMap((end): DataCell[] => {
    const result = results.get(`anchor:${end.id}`)
    const worst = result ? worstShort(result) : null
    const whole = result ? worstWords(result) : null
    if (!worst) return []
    return [
      {
        id: end.id,
        chainage: end.chainage,
        text: worst.words,
        status: worst.status,
        weight: WORST_WEIGHT[worst.status],
        spoken: `${end.mark}: ${whole?.words ?? worst.words}`,
        onPress: () => onSelect(`anchor:${end.id}`),
      },
    ]
  })
  return { label: 'Worst check', cells, isPressed: true }
}

function heightRow({ data }: RowsOf): Row {
  const cells = data.ends.map((end): DataCell => ({
    id: end.id,
    chainage: end.chainage,
    text: String(end.heightAbove),
  }))
  return { label: 'Height, mm', cells, isPressed: false }
}

function forceRow({ index, data }: RowsOf): Row {
  const cells = data.ends.flatMap((end): DataCell[] => {
    const tendon = index.tendons.get(index.anchors.get(end.id)?.tendonId ?? '')
    const strand = index.strandTypes.get(tendon?.strandTypeId ?? '')
    if (!tendon || !strand) return []
    const force = jackingForce(tendon, strand).value
    return [{ id: end.id, chainage: end.chainage, text: (force / 1000).toFixed(0) }]
  })
  return { label: 'Jacking force, kN', cells, isPressed: false }
}

function steelRow({ index, data }: RowsOf): Row {
  const cells = data.ends.map((end): DataCell => {
    const shapes = (index.steelOfZone.get(`anchor:${end.id}`) ?? []).map(({ shape }) => shape)
    return { id: end.id, chainage: end.chainage, text: shapes.map(steelWords).join(', ') || 'none' }
  })
  return { label: 'Steel', cells, isPressed: false }
}

function wedgeRow({ data, selected, onSelect }: RowsOf): Row {
  const cells = data.wedges.map(({ zoneId, depth, area, middle }): DataCell => ({
    id: zoneId,
    chainage: middle,
    text: depth.toFixed(0),
    isSelected: selected === zoneId,
    spoken: `Gap: edge wedge ${depth.toFixed(0)} mm deep, ${(area / 1e6).toFixed(3)} m²`,
    weight: depth,
    onPress: () => onSelect(zoneId),
  }))
  return { label: 'Edge wedge depth, mm', cells, isPressed: true }
}

function wedgeBarsRow({ index, data }: RowsOf): Row {
  const cells = data.wedges.map(({ zoneId, middle }): DataCell => {
    const bars = (index.steelOfZone.get(zoneId) ?? []).map(({ shape }) => steelWords(shape)).join(', ')
    return { id: zoneId, chainage: middle, text: bars || 'none', weight: bars ? 1 : 0 }
  })
  return { label: 'Wedge bars', cells, isPressed: false }
}
