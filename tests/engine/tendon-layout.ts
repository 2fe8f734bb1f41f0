import type { Anchor, JobSettings, Layout, StrandType, Tendon } from '@wedgeline/engine'
import { anchor, layout, SETTINGS, type Parts } from './sample-layout'

interface Change {
  readonly tendon?: Partial<Tendon>
  readonly strand?: Partial<StrandType>
  readonly settings?: Partial<JobSettings>
  readonly drawIn?: number
  /** The end on the south edge; the one on the north edge is live. */
  readonly far?: Partial<Anchor>
  readonly parts?: Parts
}

/** One tendon T from a live plate on the north edge to a plate on the south edge, 17,180 between the two faces. */
export function oneTendon(change: Change = {}): Layout {
  const anchors = [
    anchor('E4', 1, { tendonId: 'T', chainage: 9600 }),
    anchor('E2', 1, { tendonId: 'T', chainage: 9600, end: 'dead', ...change.far }),
  ]
  const given = layout({ anchors, ...change.parts })
  const strand = given.strandTypes[0]
  const tendon = given.tendons[0]
  if (!strand || !tendon) throw new Error('The sample has a strand type and a tendon.')
  return {
    ...given,
    job: { ...given.job, settings: { ...SETTINGS, ...change.settings } },
    hardware: given.hardware.map((one) => ({ ...one, drawIn: change.drawIn ?? one.drawIn })),
    strandTypes: [{ ...strand, ...change.strand }],
    tendons: [
      { ...tendon, length: 17_180, drape: 0.3, ...change.tendon },
      ...given.tendons.filter(({ id }) => id !== tendon.id),
    ],
  }
}

/** The same pair as nominal, low and high. */
export const allPairs = (mu: number, wobble: number): Partial<JobSettings> => ({
  frictionMu: mu,
  frictionMuLow: mu,
  frictionMuHigh: mu,
  frictionWobble: wobble,
  frictionWobbleLow: wobble,
  frictionWobbleHigh: wobble,
})
