import type { Check, Family, Zone } from '@wedgeline/engine'

interface Made {
  readonly zone: Zone
  readonly check: Check
}

export interface OverWithReason {
  readonly reason: string
  /** The planted fault that it is, or follows from; null for what the demo's own layout leaves open. */
  readonly fault: string | null
  readonly covers: (made: Made) => boolean
}

interface Place {
  readonly reason: string
  readonly fault: string | null
  /** Ids of the zones. */
  readonly zones: RegExp
  readonly families: readonly Family[]
}

const PLANTED: readonly Place[] = [
  {
    fault: 'F1',
    reason: 'centre 55 above the soffit: plate, pocket and links too low',
    zones: /^anchor:L1P1-E03W$/,
    families: ['cover', 'fit'],
  },
  {
    fault: 'F2',
    reason: 'pan moved towards the wall: no room for the jack, and its recess takes the place of an edge bar',
    zones: /^(pan:PN03|edge:E4-P1)$/,
    families: ['pan-access', 'fit'],
  },
  {
    fault: 'F4 and F12',
    reason: 'cylinders of P2 at 96 h and at 144 h',
    zones: /^pour:P2$/,
    families: ['strength'],
  },
  {
    fault: 'F5 and F11',
    reason: 'lowered by 80: spiral and pocket take the place of bottom edge bars as well',
    zones: /^(anchor:EB2-T[12]S|edge:E2-P2|edge:E3)$/,
    families: ['cover', 'fit'],
  },
  {
    fault: 'F6',
    reason: '300 apart: pockets and links touch',
    zones: /^anchor:L1P1-E0[56]W$/,
    families: ['spacing', 'cover', 'fit'],
  },
  {
    fault: 'F7',
    reason: '120 from the re-entrant edge: pocket and links outside, and in the place of its edge bars',
    zones: /^(anchor:L2P3-N08N|edge:E7-ER)$/,
    families: ['spacing', 'cover', 'fit'],
  },
]

/** Open in the demo as it was drawn up: its steel was never designed, and no bar of the job's sizes and kinds fits. */
const OPEN: readonly Place[] = [
  {
    fault: null,
    reason: 'pairs 260 apart in beams 600 wide: straight transverse bars as long as the tie asks for leave the beam',
    zones: /^(group:EB|anchor:EB)[12]-T[12]/,
    families: ['bursting-plan', 'bursting-thickness'],
  },
  {
    fault: null,
    reason: 'beside the beams and at the joint’s ends wedge bars pile up or meet pocket or beam',
    zones: /^gap:(E1|E2-P1|J1-P1|E4-P1|E3|J1-P2):start:|^gap:(E2-P2|E3|E4-P2):(EB[12]-T[12][SEN]|L1P2-E06E):/,
    families: ['edge-wedge'],
  },
  {
    fault: null,
    reason: 'corners have the bars of the two gaps beside them, and those are open',
    zones: /^corner:/,
    families: ['edge-wedge'],
  },
  {
    fault: null,
    reason: 'a condition of the demo: no east-west tendons reach this edge of P3, so that no bars are proposed at it',
    zones: /^gap:E7-ER:start:end$/,
    families: ['edge-wedge'],
  },
  {
    fault: null,
    reason: 'a condition of the demo: another tendon crosses the splay at J1 and stands in the way of links',
    zones: /^anchor:L1P[12]-E06J$/,
    families: ['bursting-thickness'],
  },
  {
    fault: null,
    reason: 'lap bars across the strip in front of a pan do not reach their anchorage before the edge or meet a recess',
    zones: /^pan:PN0[1-8]$/,
    families: ['pan-bars'],
  },
  {
    fault: null,
    reason:
      'bars spread evenly over the gap would meet the recess of a pan in it, or the pocket at a corner: none is proposed',
    zones:
      /^(gap:E4-P1:|gap:E6:|gap:E3:L1P2-E07E:end|gap:J1-P2:L1P2-E07J:end|gap:E7-E:L2P3-E03E:end|pan:PN0[1-8]$|anchor:(L1P2-N0[28]N|L2P3-N))/,
    families: ['fit', 'edge-wedge'],
  },
  {
    fault: null,
    reason: 'the strip without precompression at J1 is up to 25 m wide: no bars across it pass',
    zones: /^joint:J1$/,
    families: ['joint'],
  },
]

export const zonesOverWithReason: readonly OverWithReason[] = [...PLANTED, ...OPEN].map(
  ({ fault, reason, zones, families }) => ({
    fault,
    reason,
    covers: ({ zone, check }) => zones.test(zone.id) && families.includes(check.family),
  }),
)
