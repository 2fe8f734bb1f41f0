import type { HardwareData, PourData, SteelData, SteelShapeData, SteelZoneData } from '@wedgeline/contract'
import { steelKey } from '@wedgeline/engine/geometry'

/** The kinds of steel that may be entered at each kind of zone of an edge, with their fields and usual values. */

export type SteelKind = SteelShapeData['kind']

export const KINDS_OF_ZONE: Readonly<Record<'anchor' | 'gap' | 'edge', readonly SteelKind[]>> = {
  anchor: ['links', 'spiral', 'hairpins', 'transverse-bars'],
  gap: ['wedge-bars'],
  edge: ['edge-bars'],
}

export interface SteelField {
  readonly key: string
  readonly label: string
  readonly unit: string | null
  readonly usual?: { readonly range: string; readonly source: string }
  /** Words to choose from instead of a number. */
  readonly choices?: readonly { readonly value: string; readonly label: string }[]
}

const practice = (range: string) => ({ range, source: 'common practice' })

const SIZES = [6, 8, 10, 12, 16, 20, 25, 32, 40].map((d) => ({ value: String(d), label: String(d) }))
const size = (usual: string): SteelField => ({
  key: 'diameterMm',
  label: 'Bar size',
  unit: 'mm',
  usual: practice(usual),
  choices: SIZES,
})
const LAYERS: SteelField = {
  key: 'layers',
  label: 'Layers',
  unit: null,
  choices: [
    { value: 'both', label: 'top and bottom' },
    { value: 'top', label: 'top' },
    { value: 'bottom', label: 'bottom' },
  ],
}

/** Straight bars round a pan: `usual` gives the range of each number. */
const placed = (usual: Readonly<Record<'size' | 'count' | 'length' | 'pitch', string>>): readonly SteelField[] => [
  size(usual.size),
  { key: 'count', label: 'Bars in each layer', unit: null, usual: practice(usual.count) },
  { key: 'lengthMm', label: 'Length', unit: 'mm', usual: practice(usual.length) },
  { key: 'pitchMm', label: 'Pitch', unit: 'mm', usual: practice(usual.pitch) },
  LAYERS,
  {
    key: 'runs',
    label: 'They run',
    unit: null,
    choices: [
      { value: 'along', label: 'along the jack' },
      { value: 'across', label: 'across it' },
    ],
  },
]

const FIELDS: Readonly<Partial<Record<SteelKind, readonly SteelField[]>>> = {
  spiral: [
    size('8 to 16'),
    { key: 'outsideMm', label: 'Outside diameter', unit: 'mm', usual: practice('plate + 20, inside both covers') },
    { key: 'pitchMm', label: 'Pitch', unit: 'mm', usual: practice('40 to 60') },
    { key: 'turns', label: 'Turns in all', unit: null, usual: practice('3 to 7') },
    { key: 'flatTurns', label: 'Of which flat end turns', unit: null, usual: practice('2') },
    { key: 'firstMm', label: 'First turn behind the bearing face', unit: 'mm', usual: practice('0 to 20') },
  ],
  links: [
    size('8 to 10'),
    { key: 'count', label: 'Number', unit: null, usual: practice('3 to 5') },
    { key: 'widthMm', label: 'Width, outside', unit: 'mm', usual: practice('plate + 80') },
    { key: 'heightMm', label: 'Height, outside', unit: 'mm', usual: practice('depth less both covers') },
    { key: 'hookMm', label: 'Hooks', unit: 'mm', usual: { range: '115 for 8, 130 for 10', source: 'BS 8666' } },
    { key: 'firstMm', label: 'First behind the bearing face', unit: 'mm', usual: practice('30 to 50') },
    { key: 'pitchMm', label: 'Pitch', unit: 'mm', usual: practice('50') },
  ],
  hairpins: [
    size('10 to 12'),
    { key: 'count', label: 'Number', unit: null, usual: practice('1 or 2 at each anchor') },
    { key: 'legMm', label: 'Legs, outside', unit: 'mm', usual: practice('500 to 700') },
    { key: 'bendMm', label: 'Bend, outside', unit: 'mm', usual: practice('depth less both covers') },
    { key: 'firstMm', label: 'Bend from the bearing face', unit: 'mm', usual: practice('3/8 to 1/2 of the depth') },
    { key: 'pitchMm', label: 'Between hairpins', unit: 'mm' },
    {
      key: 'lies',
      label: 'They stand',
      unit: null,
      choices: [
        { value: 'upright', label: 'upright, bend through the thickness' },
        { value: 'flat', label: 'flat, bend in plan' },
      ],
    },
  ],
  'transverse-bars': [
    size('12 to 16'),
    { key: 'count', label: 'Positions', unit: null, usual: practice('4 to 8') },
    { key: 'lengthMm', label: 'Length', unit: 'mm', usual: practice('the prism less 2 covers, or continuous') },
    {
      key: 'firstMm',
      label: 'First behind the bearing face',
      unit: 'mm',
      usual: { range: '0.2 to 1.0 of the prism', source: 'reading of the window' },
    },
    { key: 'pitchMm', label: 'Pitch', unit: 'mm', usual: practice('100 to 200') },
    LAYERS,
  ],
  'wedge-bars': [
    size('10 to 16'),
    { key: 'count', label: 'Positions', unit: null },
    { key: 'lengthMm', label: 'Length', unit: 'mm', usual: practice('wedge depth + anchorage') },
    LAYERS,
  ],
  'edge-bars': [
    size('12 to 16'),
    { key: 'countTop', label: 'Top', unit: null, usual: practice('2') },
    { key: 'countBottom', label: 'Bottom', unit: null, usual: practice('2') },
    { key: 'firstMm', label: 'First from the slab edge', unit: 'mm', usual: practice('cover + 10 to 20') },
    { key: 'pitchMm', label: 'Between bars', unit: 'mm', usual: practice('60 to 100') },
    { key: 'fromMm', label: 'From chainage', unit: 'mm' },
    { key: 'toMm', label: 'To chainage', unit: 'mm' },
  ],
  'tie-back-bars': placed({
    size: '12 to 16',
    count: 'an even number, clear of the recess at the top',
    length: 'twice the anchorage',
    pitch: 'width of the pan + 2 covers',
  }),
  trimmers: placed({
    size: 'as the bars cut',
    count: 'as many as are cut, half on each side',
    length: 'pan + 2 anchorages',
    pitch: '50 to 100',
  }),
  diagonals: placed({ size: '12', count: '2 at each corner', length: '1000 to 1200', pitch: '50 to 100' }),
  'lap-bars': placed({
    size: '12 to 20',
    count: 'an even number',
    length: 'twice the way to the edge',
    pitch: '100 to 300',
  }),
}

export const steelFields = (kind: SteelKind): readonly SteelField[] => FIELDS[kind] ?? []

export interface Place {
  readonly pour: PourData
  readonly depthMm: number
  readonly hardware: HardwareData | null
  readonly from: number
  readonly to: number
  /** Prism of the anchor in plan, mm; the spacing where nothing better is known. */
  readonly prismMm: number
  readonly wedgeDepthMm: number
}

const down5 = (value: number): number => Math.floor(value / 5) * 5

/** A set of bars as somebody would begin with it here; every value is then changed as wished. */
export function usualSteel(kind: SteelKind, place: Place): SteelShapeData | null {
  const local = place.hardware?.localSteel
  if (local?.kind === kind) {
    const { isTested: _isTested, ...shape } = local
    return shape
  }
  switch (kind) {
    case 'spiral':
    case 'links':
    case 'hairpins':
      return usualLocal(kind, place)
    case 'transverse-bars':
      return usualTransverse(place)
    case 'wedge-bars':
      return {
        kind,
        diameterMm: 12,
        lengthMm: Math.ceil((place.wedgeDepthMm + 500) / 25) * 25,
        count: Math.max(1, Math.ceil((place.to - place.from) / 300)),
        layers: 'both',
      }
    case 'edge-bars':
      return {
        kind,
        diameterMm: 12,
        countTop: 2,
        countBottom: 2,
        firstMm: place.pour.coverEdgeMm + 20,
        pitchMm: 80,
        fromMm: place.from + place.pour.coverEdgeMm,
        toMm: place.to - place.pour.coverEdgeMm,
      }
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return null
  }
}

/** Steel round the tendon just behind the plate, as deep as the covers allow. */
function usualLocal(kind: 'spiral' | 'links' | 'hairpins', { pour, hardware, depthMm }: Place): SteelShapeData {
  const between = down5(depthMm - pour.coverTopMm - pour.coverSoffitMm)
  const plateMm = hardware?.plate.widthMm ?? 200
  // The hooks of a closed link 10 may not exceed its height: under 130 it has to be an 8 (BS 8666).
  const link = between >= 130 ? { diameterMm: 10, hookMm: 130 } : { diameterMm: 8, hookMm: 115 }
  const [pitchMm, firstMm] = [50, 30]
  switch (kind) {
    case 'spiral': {
      const outsideMm = Math.min(between, plateMm + 20)
      return { kind, diameterMm: 10, outsideMm, pitchMm, turns: 5, flatTurns: 2, firstMm: 0 }
    }
    case 'links':
      return { kind, ...link, widthMm: plateMm + 80, heightMm: between, count: 4, firstMm, pitchMm }
    case 'hairpins': {
      const atMm = down5(depthMm / 2)
      return { kind, diameterMm: 10, legMm: 600, bendMm: between, count: 1, lies: 'upright', firstMm: atMm, pitchMm: 0 }
    }
  }
}

/** Positions over the window, 0.2 to 1.0 of the prism, at 150 where that many fit. */
function usualTransverse({ prismMm }: Place): SteelShapeData {
  const firstMm = Math.max(down5(0.25 * prismMm), 50)
  const count = Math.max(1, Math.min(6, Math.floor((0.95 * prismMm - firstMm) / 150) + 1))
  const lengthMm = down5(Math.max(prismMm, 600))
  return { kind: 'transverse-bars', diameterMm: 12, lengthMm, count, layers: 'both', firstMm, pitchMm: 150 }
}

/** Shown text of a field's value. */
export function fieldValue(shape: SteelShapeData, key: string): string | number | null {
  const value: unknown = Object.entries(shape).find(([name]) => name === key)?.[1]
  return typeof value === 'string' || typeof value === 'number' ? value : null
}

/** The sets of bars that belong to a zone. */
export const steelOfZone = (steel: readonly SteelData[], wanted: SteelZoneData): readonly SteelData[] =>
  steel.filter(({ zone }) => steelKey(zone) === steelKey(wanted))
