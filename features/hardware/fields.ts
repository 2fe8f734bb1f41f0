import type { HardwareData, JackData, StrandTypeData } from '@wedgeline/contract'
import type { FieldProps } from '@/components/ui/field'
import type { TypedSteel } from './typed'

/** Labels, units and usual ranges of what a supplier's sheet gives. Ranges are common practice unless they say more. */

export interface NumberSpec<Key extends string = string> extends Pick<FieldProps, 'label' | 'unit' | 'hint' | 'usual'> {
  readonly key: Key
  /** May stay empty. */
  readonly isOptional?: boolean
}

const usual = (range: string) => ({ range, source: 'common practice' })

export const DISTANCE_FIELDS: readonly NumberSpec<
  'spacingAlongMinMm' | 'spacingHeightMinMm' | 'edgeAlongMinMm' | 'edgeHeightMinMm'
>[] = [
  { key: 'spacingAlongMinMm', label: 'Centre to centre along the edge', unit: 'mm', usual: usual('200 to 500') },
  { key: 'spacingHeightMinMm', label: 'Centre to centre in height', unit: 'mm', usual: usual('100 to 400') },
  { key: 'edgeAlongMinMm', label: 'Centre to the end of the edge', unit: 'mm', usual: usual('100 to 250') },
  { key: 'edgeHeightMinMm', label: 'Centre to top or soffit', unit: 'mm', usual: usual('60 to 150') },
]

export const STRENGTH_FIELDS: readonly NumberSpec<'share' | 'strengthMinMPa'>[] = [
  { key: 'share', label: 'Share of the full jacking force', hint: '1 is the full force.', usual: usual('0.25 to 1') },
  { key: 'strengthMinMPa', label: 'Smallest cylinder strength', unit: 'MPa', usual: usual('9 to 30') },
]

export const SIZE_FIELDS: readonly NumberSpec<'widthMm' | 'heightMm'>[] = [
  { key: 'widthMm', label: 'Width along the edge', unit: 'mm' },
  { key: 'heightMm', label: 'Height', unit: 'mm' },
]
export const DEPTH_FIELDS: readonly NumberSpec<'depthMm'>[] = [
  { key: 'depthMm', label: 'Depth', unit: 'mm', usual: usual('80 to 150') },
]

export const LENGTH_FIELDS: readonly NumberSpec<
  keyof Pick<HardwareData, 'straightBehindMinMm' | 'strandTailMinMm' | 'drawInMm' | 'deviceLengthMm'>
>[] = [
  { key: 'straightBehindMinMm', label: 'Straight behind the bearing face', unit: 'mm', usual: usual('500 to 1000') },
  { key: 'strandTailMinMm', label: 'Strand tail for stressing', unit: 'mm', usual: usual('300 to 800') },
  { key: 'drawInMm', label: 'Draw-in at lock-off', unit: 'mm', usual: usual('5 to 8') },
  { key: 'deviceLengthMm', label: 'Bearing face to the end of the device', unit: 'mm', usual: usual('0 to 300') },
]

export const SPLAY_FIELDS: readonly NumberSpec<keyof Pick<HardwareData, 'splayLengthMm' | 'transmissionLengthMm'>>[] = [
  { key: 'splayLengthMm', label: 'Length of the splay behind the bulbs', unit: 'mm', usual: usual('200 to 400') },
  {
    key: 'transmissionLengthMm',
    label: 'Transmission length, upper value',
    unit: 'mm',
    usual: usual('500 to 1200'),
    isOptional: true,
  },
]

type SteelKey<K extends TypedSteel['kind']> = Exclude<
  keyof Extract<TypedSteel, { kind: K }>,
  'kind' | 'isTested' | 'lies'
>

const BAR = { key: 'diameterMm', label: 'Bar', unit: 'mm', hint: '6, 8, 10, 12, 16 or 20.' } as const
const FIRST = { key: 'firstMm', label: 'First, behind the bearing face', unit: 'mm', usual: usual('0 to 50') } as const
const PITCH = { key: 'pitchMm', label: 'Centre to centre', unit: 'mm', usual: usual('40 to 100') } as const

export const SPIRAL_FIELDS: readonly NumberSpec<SteelKey<'spiral'>>[] = [
  BAR,
  { key: 'outsideMm', label: 'Outside diameter', unit: 'mm', usual: usual('100 to 300') },
  { key: 'pitchMm', label: 'Pitch', unit: 'mm', usual: usual('40 to 60') },
  { key: 'turns', label: 'Turns', usual: usual('4 to 8') },
  { key: 'flatTurns', label: 'Of these flat at the ends, in all', usual: usual('0 to 2') },
  FIRST,
]
export const LINK_FIELDS: readonly NumberSpec<SteelKey<'links'>>[] = [
  BAR,
  { key: 'widthMm', label: 'Width, out to out', unit: 'mm', usual: usual('150 to 350') },
  { key: 'heightMm', label: 'Height, out to out', unit: 'mm', usual: usual('100 to 200') },
  { key: 'hookMm', label: 'Hook', unit: 'mm', usual: usual('80 to 150') },
  { key: 'count', label: 'How many', usual: usual('3 to 6') },
  FIRST,
  PITCH,
]
export const HAIRPIN_FIELDS: readonly NumberSpec<SteelKey<'hairpins'>>[] = [
  BAR,
  { key: 'legMm', label: 'Leg', unit: 'mm', usual: { range: '500 to 700', source: 'common practice, from memory' } },
  { key: 'bendMm', label: 'Across the bend, out to out', unit: 'mm', usual: usual('100 to 200') },
  { key: 'count', label: 'How many', usual: usual('2 to 6') },
  FIRST,
  PITCH,
]

export const JACK_FIELDS: readonly NumberSpec<Exclude<keyof JackData, 'id' | 'name' | 'description'>>[] = [
  { key: 'closedLengthMm', label: 'Length, closed', unit: 'mm', usual: usual('500 to 900') },
  { key: 'strokeMm', label: 'Stroke', unit: 'mm', usual: usual('150 to 300') },
  { key: 'strandTailMm', label: 'Strand beyond the jack', unit: 'mm', usual: usual('50 to 200') },
  { key: 'handRoomMm', label: 'Room behind it for hands', unit: 'mm', usual: usual('50 to 150') },
  { key: 'bodyDiameterMm', label: 'Body, diameter', unit: 'mm', usual: usual('100 to 250') },
  { key: 'noseDiameterMm', label: 'Nose, diameter', unit: 'mm', usual: usual('50 to 120') },
  { key: 'noseLengthMm', label: 'Nose, length', unit: 'mm', usual: usual('80 to 250') },
  { key: 'bentNoseMaxDeg', label: 'Nose bends by at most', unit: '°', usual: usual('0 to 30') },
  { key: 'sideRoomMm', label: 'Room beside the body', unit: 'mm', usual: usual('20 to 100') },
  { key: 'roomAboveMm', label: 'Room above the body', unit: 'mm', usual: usual('20 to 150') },
]

export const STRAND_FIELDS: readonly NumberSpec<Exclude<keyof StrandTypeData, 'id' | 'name'>>[] = [
  { key: 'diameterMm', label: 'Diameter', unit: 'mm', usual: usual('12.5 to 15.7') },
  { key: 'areaMm2', label: 'Area of one strand', unit: 'mm²', usual: usual('93 to 150') },
  { key: 'breakingLoadKN', label: 'Breaking load, characteristic', unit: 'kN', usual: usual('170 to 280') },
  { key: 'proofLoadKN', label: 'Proof load at 0.1 %', unit: 'kN', usual: usual('0.86 to 0.90 of the breaking load') },
  { key: 'modulusMPa', label: 'Modulus of elasticity', unit: 'MPa', usual: usual('190,000 to 200,000') },
]
