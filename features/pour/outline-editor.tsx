import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { NumberField } from '@/components/ui/number-field'
import { Tabs } from '@/components/ui/tabs'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { readCorners, type TypedCorner } from './outline-input'

/** What is typed for an outline, in both ways, so that changing between them loses nothing. */
export interface TypedOutline {
  readonly way: 'rectangle' | 'corners'
  readonly eastMm: number | null
  readonly northMm: number | null
  readonly originXMm: number | null
  readonly originYMm: number | null
  readonly corners: readonly TypedCorner[]
}

export interface OutlineEditorProps {
  readonly outline: TypedOutline
  readonly onChange: (outline: TypedOutline) => void
}

const WAYS = [
  { key: 'rectangle', label: 'Rectangle' },
  { key: 'corners', label: 'Corners' },
] as const

/** The outline of a pour: a rectangle by two sizes, or its corners one by one. */
export function OutlineEditor({ outline, onChange }: OutlineEditorProps) {
  return (
    <Tabs
      label="How the outline is given"
      tabs={WAYS}
      selected={outline.way}
      onSelect={(way) => onChange({ ...outline, way })}
    >
      {outline.way === 'rectangle' ? (
        <RectangleFields outline={outline} onChange={onChange} />
      ) : (
        <CornerFields outline={outline} onChange={onChange} />
      )}
    </Tabs>
  )
}

function RectangleFields({ outline, onChange }: OutlineEditorProps) {
  const field = (name: 'eastMm' | 'northMm' | 'originXMm' | 'originYMm', label: string, hint?: string) => (
    <View style={styles.field}>
      <NumberField
        label={label}
        unit="mm"
        hint={hint}
        value={outline[name]}
        required
        onCommit={(value) => onChange({ ...outline, [name]: value })}
      />
    </View>
  )
  return (
    <View style={styles.fields}>
      {field('eastMm', 'Size east', 'Metres can be typed with their unit: 18 m.')}
      {field('northMm', 'Size north')}
      {field('originXMm', 'South-west corner, x', 'Counted east from the zero of the grid.')}
      {field('originYMm', 'South-west corner, y', 'Counted north.')}
    </View>
  )
}

function CornerFields({ outline, onChange }: OutlineEditorProps) {
  const { corners } = outline
  const set = (at: number, changes: Partial<TypedCorner>) =>
    onChange({ ...outline, corners: corners.map((corner, i) => (i === at ? { ...corner, ...changes } : corner)) })
  return (
    <View style={styles.corners}>
      <Text kind="small" tone="soft">
        In the order in which one walks round the slab; either way round. x counts east, y north, in mm.
      </Text>
      {corners.map((corner, at) => (
        <View key={at} style={styles.corner}>
          <Text kind="strong" style={styles.number}>
            {at + 1}
          </Text>
          <View style={styles.field}>
            <NumberField
              label={`Corner ${at + 1}, x`}
              unit="mm"
              value={corner.xMm}
              onCommit={(xMm) => set(at, { xMm })}
            />
          </View>
          <View style={styles.field}>
            <NumberField
              label={`Corner ${at + 1}, y`}
              unit="mm"
              value={corner.yMm}
              onCommit={(yMm) => set(at, { yMm })}
            />
          </View>
          <Button
            kind="quiet"
            label={`Remove corner ${at + 1}`}
            iconOnly
            icon={<Icon name="remove" />}
            disabled={corners.length <= 3}
            onPress={() => onChange({ ...outline, corners: corners.filter((_, i) => i !== at) })}
          />
        </View>
      ))}
      <View style={styles.row}>
        <Button
          label="Add a corner"
          icon={<Icon name="plus" />}
          onPress={() => onChange({ ...outline, corners: [...corners, { xMm: null, yMm: null }] })}
        />
      </View>
      <PasteCorners onCorners={(pasted) => onChange({ ...outline, corners: pasted })} />
    </View>
  )
}

function PasteCorners({ onCorners }: { readonly onCorners: (corners: readonly TypedCorner[]) => void }) {
  const [text, setText] = useState('')
  const [problem, setProblem] = useState<string | null>(null)
  const take = () => {
    const read = readCorners(text)
    setProblem(read.problem)
    if (read.problem !== null) return
    onCorners(read.corners)
    setText('')
  }
  return (
    <View style={styles.paste}>
      <TextField
        label="Paste corners from a spreadsheet"
        hint="Two columns, x and y. They take the place of the corners above."
        value={text}
        onChangeText={setText}
        multiline
        rows={3}
        error={problem ?? undefined}
      />
      <View style={styles.row}>
        <Button label="Take these corners" icon={<Icon name="paste" />} disabled={text.trim() === ''} onPress={take} />
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  field: { flexGrow: 1, flexBasis: 120, minWidth: 0 },
  corners: { gap: space.s },
  corner: { flexDirection: 'row', alignItems: 'flex-end', gap: space.s },
  number: { width: 20, paddingBottom: space.s },
  row: { flexDirection: 'row' },
  paste: { gap: space.s, paddingTop: space.m, borderTopWidth: 1, borderColor: colour.rule },
})
