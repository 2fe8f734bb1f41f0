import {
  checkPour,
  type Check,
  type Compared,
  type Jack,
  type Layout,
  type Obstruction,
  type Pan,
  type PlacedBarsShape,
  type Point,
  type Steel,
} from '@wedgeline/engine'
import { inPan, layout, pan, type Parts } from './sample-layout'

/** 620 closed, 200 stroke, 150 tail, 230 for a hand: 1200. Body 90 round, nose 60 round and 250 long. */
export const JACK: Jack = {
  id: 'J1',
  name: 'J1',
  description: '',
  closedLength: 620,
  stroke: 200,
  strandTail: 150,
  handRoom: 230,
  bodyDiameter: 90,
  noseDiameter: 60,
  noseLength: 250,
  bentNoseMax: Math.PI / 12,
  sideRoom: 50,
  roomAbove: 600,
}

/** As J1, 200 shorter: 1000. */
export const SHORT_JACK: Jack = { ...JACK, id: 'J2', name: 'J2', closedLength: 420 }

/** A body of the level between two corners of a rectangle. */
export const standing = (kind: Obstruction['kind'], from: Point, to: Point): Obstruction => ({
  id: `${kind}-${from.x}-${from.y}`,
  levelId: 'L1',
  kind,
  mark: 'X1',
  note: '',
  outline: [from, { x: to.x, y: from.y }, to, { x: from.x, y: to.y }],
  cageCover: null,
  cageBars: '',
})

export const steelAt = (shapes: readonly PlacedBarsShape[]): Steel[] =>
  shapes.map((shape, at) => ({
    id: `s${at}`,
    pourId: 'P1',
    zone: { kind: 'pan', panId: 'PN' },
    shape,
    source: 'by-hand',
    isLocked: false,
  }))

interface PanParts {
  readonly pan?: Partial<Pan>
  readonly jacks?: readonly Jack[]
  readonly obstructions?: readonly Obstruction[]
  readonly bars?: readonly PlacedBarsShape[]
  readonly others?: readonly Pan[]
  readonly parts?: Parts
}

/**
 * One pan in a pour of 19.2 by 17.4 m: bearing face at x 9600, y 12000, jack to the north, where the edge is 5400 away.
 * Anchor at mid-thickness of 220, four strands, 588.8 kN.
 */
export function withPan(of: PanParts = {}): Layout {
  const { jacks = [JACK], obstructions = [], bars = [], others = [], parts = {} } = of
  return layout({
    ...parts,
    anchors: [...(parts.anchors ?? []), inPan('PN')],
    pans: [pan('PN', { x: 9600, y: 12000, jackId: jacks[0]?.id ?? null, headroom: 3000, ...of.pan }), ...others],
    steel: steelAt(bars),
    more: { jacks, obstructions, ...parts.more },
  })
}

export function panChecks(of: Layout, panId = 'PN'): readonly Check[] {
  const zone = checkPour(of, { pourId: 'P1', withSteps: true }).zones.find((one) => one.zone.id === `pan:${panId}`)
  if (!zone) throw new Error(`No zone of ${panId}`)
  return zone.checks
}

export function panCheck(of: Layout, name: string, kind: 'compared'): Compared
export function panCheck(of: Layout, name: string, kind: Check['kind']): Check
export function panCheck(of: Layout, name: string, kind: Check['kind']): Check {
  const check = panChecks(of).find((one) => one.name === name && one.kind === kind)
  if (!check) throw new Error(`No ${kind} ${name}`)
  return check
}

/** Turned over from west to east. */
export function mirrored(of: Layout): Layout {
  const turn = <T extends Point>(point: T): T => ({ ...point, x: 19200 - point.x })
  return {
    ...of,
    pans: of.pans.map((one) => ({ ...turn(one), azimuth: -one.azimuth })),
    obstructions: of.obstructions.map((one) => ({ ...one, outline: [...one.outline].reverse().map(turn) })),
  }
}
