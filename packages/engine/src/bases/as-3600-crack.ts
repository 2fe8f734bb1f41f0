import { step, type Clause } from '../step'
import { AS_CRACK_EDGE_BARS, AS_CRACK_MINOR, AS_CRACK_MODERATE, AS_CRACK_STRONG } from './as-3600-readings'
import type { CrackChoice, CrackInput, CrackRule } from './basis'

/** AS 3600:2018, 9.5.3: shrinkage and temperature steel of a restrained slab; read in secondary sources. */
const CRACK: Clause = { source: 'AS 3600:2018', section: '9.5.3.4', tag: 'secondary' }
const SPACING: Clause = { source: 'AS 3600:2018', section: '9.5.3', tag: 'secondary' }

/** Thicker slabs get the steel of their outer 250 at each face. */
const THICKNESS_COUNTED_MAX = 500

/** Every degree of crack control, from the least to the most. */
export const AS_CRACK_CHOICES: readonly CrackChoice[] = [
  { readingId: AS_CRACK_EDGE_BARS, title: 'Ordinary edge bars only', steel: () => null },
  degree(AS_CRACK_MINOR, 'Minor degree of crack control', 1.75),
  degree(AS_CRACK_MODERATE, 'Moderate degree of crack control', 3.5),
  degree(AS_CRACK_STRONG, 'Strong degree of crack control', 6),
]

function degree(readingId: string, title: string, c: number): CrackChoice {
  return { readingId, title, steel: (input) => crackSteel(input, c) }
}

function crackSteel({ thickness, compression }: CrackInput, c: number): CrackRule {
  const D = step(
    {
      symbol: 'D',
      meaning: 'Thickness that counts: 250 at each face at most',
      formula: 'min(h, 500)',
      unit: 'mm',
      clause: CRACK,
    },
    { h: thickness },
    (v) => Math.min(v.h, THICKNESS_COUNTED_MAX),
  )
  const As = step(
    {
      symbol: 'AsCrack',
      meaning: 'Least steel per metre, both faces together',
      formula: 'max(0, c - 2.5 * sigmaCp) * 1000 * D / 1000',
      unit: 'mm2/m',
      clause: CRACK,
    },
    { c, sigmaCp: compression, D: D.value },
    (v) => Math.max(0, v.c - 2.5 * v.sigmaCp) * v.D,
  )
  const s = step(
    {
      symbol: 'sMax',
      meaning: 'Largest spacing of the bars',
      formula: 'min(1.5 * h, 200)',
      unit: 'mm',
      clause: SPACING,
    },
    { h: thickness },
    (v) => Math.min(1.5 * v.h, 200),
  )
  return { areaPerMetre: As.value, spacingMax: s.value, clause: CRACK, steps: [D, As, s] }
}
