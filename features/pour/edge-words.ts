import type { LengthKind } from '@wedgeline/engine'

export const LENGTH_KIND_WORDS: Readonly<Record<LengthKind, string>> = {
  free: 'free',
  'construction-joint': 'construction joint',
  'movement-joint': 'movement joint',
  'against-wall': 'against a wall',
}

export const LENGTH_KINDS = Object.keys(LENGTH_KIND_WORDS) as LengthKind[]
