import type { LayoutFile } from '@wedgeline/contract'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Table } from '@/components/ui/table'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { readPasted, type Pasted } from '../edge/paste'

export interface QuickPasteProps {
  readonly text: string
  readonly pasted: Pasted
  readonly onChange: (text: string) => void
}

export const readQuick = (text: string, hardware: readonly LayoutFile['hardware'][number][]): Pasted =>
  readPasted(text, { hardware })

/** Where the anchors are pasted or typed, and what cannot be read of them. */
export function QuickPaste({ text, pasted, onChange }: QuickPasteProps) {
  const { anchors, problems } = pasted
  return (
    <View style={styles.all}>
      <TextField
        label="Anchors: distance, height, strands, end, hardware, set-back"
        hint="A line an anchor, mm, parted by tabs, spaces or semicolons. Only the distance from the start is needed; a first line of words names the columns."
        value={text}
        onChangeText={onChange}
        multiline
        rows={9}
        autoFocus
      />
      <View role="status" style={styles.read}>
        <Text kind="strong">{readWords(anchors.map(({ chainageMm }) => chainageMm))}</Text>
        {problems.map(({ line, message }) => (
          <Text key={line} tone="over">{`Line ${line}. ${message}`}</Text>
        ))}
      </View>
    </View>
  )
}

function readWords(chainages: readonly number[]): string {
  if (chainages.length === 0) return 'Nothing read yet.'
  const anchors = chainages.length === 1 ? '1 anchor' : `${chainages.length} anchors`
  return `${anchors} read, from ${Math.min(...chainages)} to ${Math.max(...chainages)} mm.`
}

/** What the anchors came to, those that were left out of the paste included. */
export function AnchorsRead({ layout }: { readonly layout: LayoutFile }) {
  const rows = anchorLines(layout)
  return (
    <Table
      caption="Anchors as they were read"
      rows={rows}
      rowKey={({ id }) => id}
      maxHeight={260}
      columns={[
        { key: 'mark', head: 'Anchor', isRowHead: true, cell: ({ mark }) => mark, width: 70 },
        { key: 'chainage', head: 'Distance', align: 'end', cell: ({ chainageMm }) => chainageMm, width: 70 },
        { key: 'height', head: 'Height', align: 'end', cell: ({ heightMm }) => heightMm, width: 60 },
        { key: 'strands', head: 'Strands', align: 'end', cell: ({ strands }) => strands, width: 60 },
        { key: 'end', head: 'End', cell: ({ end }) => end, width: 60 },
        { key: 'hardware', head: 'Hardware', cell: ({ hardware }) => hardware, width: 90 },
        { key: 'setBack', head: 'Set-back', align: 'end', cell: ({ setBackMm }) => setBackMm, width: 70 },
      ]}
    />
  )
}

export interface AnchorLine {
  readonly id: string
  readonly mark: string
  readonly chainageMm: number
  readonly heightMm: number
  readonly strands: number
  readonly end: string
  readonly hardware: string
  readonly setBackMm: number
}

export function anchorLines({ anchors, tendons, hardware }: LayoutFile): readonly AnchorLine[] {
  const strands = new Map(tendons.map((tendon) => [tendon.id, tendon.strands]))
  const names = new Map(hardware.map(({ id, name }) => [id, name]))
  return [...anchors]
    .sort((a, b) => a.chainageMm - b.chainageMm)
    .map((anchor) => ({
      ...anchor,
      mark: `E1-${String(anchor.number).padStart(2, '0')}`,
      strands: strands.get(anchor.tendonId) ?? 0,
      hardware: names.get(anchor.hardwareId) ?? '',
    }))
}

const styles = StyleSheet.create({ all: { gap: space.m }, read: { gap: space.xs } })
