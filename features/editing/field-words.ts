import { toEngine, type Conflict, type EditableTable, type LayoutFile } from '@wedgeline/contract'
import { anchorMark, layoutIndex } from '@wedgeline/engine/geometry'

/** How rows and fields are called on the screen. */

const TABLE_WORDS: Readonly<Record<EditableTable, string>> = {
  levels: 'level',
  gridLines: 'grid line',
  edgeLines: 'edge line',
  joints: 'joint',
  obstructions: 'obstruction',
  pours: 'pour',
  edges: 'edge',
  pans: 'pan',
  tendons: 'tendon',
  anchors: 'anchor',
  steel: 'steel',
  concreteResults: 'concrete result',
}

const FIELD_WORDS: Readonly<Record<string, string>> = {
  id: 'the whole row',
  chainage: 'distance along the edge',
  height: 'height',
  setBack: 'set-back of the bearing face',
  skew: 'skew',
  elevation: 'slope up or down',
  straightBehind: 'straight length behind the anchor',
  hardwareId: 'hardware',
  castWithPourId: 'pour that it is cast with',
  stressedWithPourId: 'pour that it is stressed with',
  strandTypeId: 'strand type',
  jackId: 'jack',
  x: 'distance east',
  y: 'distance north',
  azimuth: 'direction',
  mark: 'mark',
  title: 'title',
  name: 'name',
  shape: 'bars',
  isLocked: 'kept from proposals',
  jackingRatio: 'jacking, share of the breaking load',
  lengths: 'lengths of the edge',
  outline: 'outline',
  regions: 'beams, bands, drops and folds',
  mats: 'mats',
  stages: 'stages of stressing',
  fck: 'concrete strength',
}

const UNIT = /(Mm2|MPa|Deg|Mm|KN)$/
const UNIT_WORDS: Readonly<Record<string, string>> = { Mm2: 'mm²', MPa: 'MPa', Deg: '°', Mm: 'mm', KN: 'kN' }

/** anchor E6-03; grid line A; the row's own kind where it has no mark. */
export function rowName(layout: LayoutFile, table: EditableTable, id: string): string {
  const row = (layout[table] as readonly { readonly id: string }[]).find((each) => each.id === id)
  if (!row) return `a ${TABLE_WORDS[table]} that is no longer there`
  const mark = table === 'anchors' ? markOfAnchor(layout, id) : markOf(row)
  return mark ? `${TABLE_WORDS[table]} ${mark}` : TABLE_WORDS[table]
}

function markOf(row: object): string | null {
  const named = row as { readonly mark?: unknown; readonly name?: unknown }
  const mark = named.mark ?? named.name
  return typeof mark === 'string' ? mark : null
}

function markOfAnchor(layout: LayoutFile, id: string): string | null {
  const index = layoutIndex(toEngine(layout))
  const anchor = index.anchors.get(id)
  return anchor ? anchorMark(index, anchor) : null
}

/** distance along the edge; a field that has no word of its own is read apart: `roomAboveMm` is "room above". */
export function fieldName(field: string): string {
  const [first = ''] = field.split('.')
  const bare = first.replace(UNIT, '')
  return (
    FIELD_WORDS[bare] ??
    bare.replace(/([a-z])([A-Z])/g, (_, before: string, next: string) => `${before} ${next}`).toLowerCase()
  )
}

/** A value with its unit; what has parts is said to be changed, and the screen shows it. */
export function valueText(layout: LayoutFile, field: string, value: unknown): string {
  if (value === null || value === undefined) return 'none'
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (typeof value === 'object') return Array.isArray(value) ? `${value.length} entries` : 'other values'
  const unit = UNIT_WORDS[UNIT.exec(field)?.[1] ?? '']
  const text = typeof value === 'number' || typeof value === 'string' ? String(value) : 'another value'
  if (unit) return unit === '°' ? `${text}°` : `${text} ${unit}`
  return nameOfReferred(layout, field, text) ?? text
}

/** What an id stands for. */
function nameOfReferred(layout: LayoutFile, field: string, id: string): string | null {
  if (!field.endsWith('Id')) return null
  const rows = [...layout.hardware, ...layout.jacks, ...layout.strandTypes, ...layout.pours, ...layout.levels]
  const row = rows.find((each) => each.id === id)
  return row ? markOf(row) : 'another one'
}

/** A conflict in words. */
export function conflictWords(layout: LayoutFile, { table, id, field, mine, theirs }: Conflict) {
  return {
    row: rowName(layout, table, id),
    field: fieldName(field),
    mine: valueText(layout, field, mine),
    theirs: valueText(layout, field, theirs),
  }
}
