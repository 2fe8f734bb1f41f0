/** Draw-in of the wedges at lock-off: how far along the tendon it is felt, and what force it leaves at the anchor. */

import { step, type Clause, type Step } from '../step'

/** The tendon slips back against friction: the diagram is mirrored as far as its area makes up the draw-in. */
const DRAW_IN: Clause = {
  source: 'Draw-in against friction',
  section: 'mirrored exponential diagram, even curvature',
  tag: 'derived',
}

/** Below this the exponent is no friction at all, and the whole tendon shortens evenly. */
const NO_FRICTION = 1e-9

export interface DrawInInput {
  /** Force while jacking at this end, N. */
  readonly P0: number
  /** Exponent of friction over the whole tendon. */
  readonly u: number
  /** Length of the tendon and draw-in at this end, mm. */
  readonly L: number
  readonly w: number
  /** Modulus and area of the whole tendon, MPa and mm2. */
  readonly E: number
  readonly A: number
}

export interface DrawIn {
  /** Length from the anchor over which the force falls, mm; the tendon's own where it falls throughout. */
  readonly reach: number
  /** Whether the dead end's force falls as well. */
  readonly isWhole: boolean
  /** Force at the anchor after lock-off, N; not above 0 where the draw-in takes all of it. */
  readonly locked: number
  readonly steps: readonly Step[]
}

/**
 * Force after lock-off at one end, by the exact form (1 - e^(-lambda l))^2 = w E A lambda / P0.
 *
 * Where that length is longer than the tendon the force falls at the dead end as well: the area between the two
 * diagrams over the whole tendon is then w E A.
 */
export function drawIn(input: DrawInInput): DrawIn {
  const { L, u } = input
  if (u < NO_FRICTION) return evenly(input)
  const q = step(
    {
      symbol: 'q',
      meaning: 'Share of the force lost on the way to where draw-in ends',
      formula: 'sqrt(w * E * A * u / L / P0)',
      unit: '-',
      clause: DRAW_IN,
    },
    { w: input.w, E: input.E, A: input.A, u, L, P0: input.P0 },
    (v) => Math.sqrt((v.w * v.E * v.A * v.u) / v.L / v.P0),
  )
  if (q.value >= 1 - Math.exp(-u)) return throughout(input, q)
  const reach = step(
    {
      symbol: 'lSet',
      meaning: 'Length over which draw-in is felt',
      formula: '(0 - log(1 - q)) * L / u',
      unit: 'mm',
      clause: DRAW_IN,
    },
    { q: q.value, L, u },
    (v) => ((0 - Math.log(1 - v.q)) * v.L) / v.u,
  )
  const locked = step(
    {
      symbol: 'Panchor',
      meaning: 'Force at the anchor after lock-off',
      formula: 'P0 * exp(0 - 2 * u * lSet / L)',
      unit: 'N',
      clause: DRAW_IN,
    },
    { P0: input.P0, u, lSet: reach.value, L },
    (v) => v.P0 * Math.exp(0 - (2 * v.u * v.lSet) / v.L),
  )
  return { reach: reach.value, isWhole: false, locked: locked.value, steps: [q, reach, locked] }
}

function throughout({ P0, u, L, w, E, A }: DrawInInput, q: Step): DrawIn {
  const locked = step(
    {
      symbol: 'Panchor',
      meaning: 'Force at the anchor after lock-off; draw-in is felt as far as the other end',
      formula: '(P0 * (1 - exp(0 - u)) - w * E * A * u / L) / (exp(u) - 1)',
      unit: 'N',
      clause: DRAW_IN,
    },
    { P0, u, w, E, A, L },
    (v) => (v.P0 * (1 - Math.exp(0 - v.u)) - (v.w * v.E * v.A * v.u) / v.L) / (Math.exp(v.u) - 1),
  )
  return { reach: L, isWhole: true, locked: locked.value, steps: [q, locked] }
}

function evenly({ P0, L, w, E, A }: DrawInInput): DrawIn {
  const locked = step(
    {
      symbol: 'Panchor',
      meaning: 'Force at the anchor after lock-off, without friction',
      formula: 'P0 - w * E * A / L',
      unit: 'N',
      clause: DRAW_IN,
    },
    { P0, w, E, A, L },
    (v) => v.P0 - (v.w * v.E * v.A) / v.L,
  )
  return { reach: L, isWhole: true, locked: locked.value, steps: [locked] }
}
