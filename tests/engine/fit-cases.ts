import {
  checkPour,
  type Check,
  type Compared,
  type Layout,
  type Obstruction,
  type Steel,
  type SteelShape,
  type SteelZone,
} from '../../packages/engine/src'
import { anchor, B7, D4, layout, S4, type Parts } from './sample-layout'

/** Hardware without local steel of its own, so that a test places what it checks. */
export const PLAIN = { ...S4, localSteel: null }
export const BARE = { ...B7, localSteel: null }
export const SPLAY = D4

export const at = (chainage: number, change: Parameters<typeof anchor>[2] = {}, number = 1) =>
  anchor('E2', number, { chainage, ...change })

export const steel = (id: string, zone: SteelZone, shape: SteelShape): Steel => ({
  id,
  pourId: 'P1',
  zone,
  shape,
  source: 'by-hand',
  isLocked: false,
})
export const ofAnchor = (number = 1): SteelZone => ({ kind: 'anchor', anchorId: `E2-${number}` })
export const ofEdge = (edgeId = 'E2'): SteelZone => ({ kind: 'edge', edgeId })

export type Of<K extends SteelShape['kind']> = Extract<SteelShape, { readonly kind: K }>

export const spiralOf = (change: Partial<Of<'spiral'>> = {}): Of<'spiral'> => ({
  kind: 'spiral',
  diameter: 10,
  outside: 150,
  pitch: 50,
  turns: 6,
  flatTurns: 2,
  first: 0,
  ...change,
})
export const linksOf = (change: Partial<Of<'links'>> = {}): Of<'links'> => ({
  kind: 'links',
  diameter: 10,
  width: 300,
  height: 140,
  hook: 130,
  count: 3,
  first: 30,
  pitch: 50,
  ...change,
})
export const hairpinsOf = (change: Partial<Of<'hairpins'>> = {}): Of<'hairpins'> => ({
  kind: 'hairpins',
  diameter: 10,
  leg: 600,
  bend: 140,
  count: 1,
  lies: 'upright',
  first: 50,
  pitch: 0,
  ...change,
})
export const edgeBarsOf = (change: Partial<Of<'edge-bars'>> = {}): Of<'edge-bars'> => ({
  kind: 'edge-bars',
  diameter: 12,
  countTop: 1,
  countBottom: 0,
  first: 165,
  pitch: 100,
  from: 4000,
  to: 6000,
  ...change,
})
export const wedgeBarsOf = (change: Partial<Of<'wedge-bars'>> = {}): Of<'wedge-bars'> => ({
  kind: 'wedge-bars',
  diameter: 12,
  length: 1500,
  count: 4,
  layers: 'top',
  ...change,
})

export const obstruction = (
  kind: Obstruction['kind'],
  [x0, y0, x1, y1]: readonly [number, number, number, number],
  change: Partial<Obstruction> = {},
): Obstruction => ({
  id: 'o',
  levelId: 'L1',
  kind,
  mark: 'W9',
  note: '',
  outline: [
    { x: x0, y: y0 },
    { x: x1, y: y0 },
    { x: x1, y: y1 },
    { x: x0, y: y1 },
  ],
  cageCover: null,
  cageBars: '',
  ...change,
})

export const fitOf = (of: Layout, zoneId: string): Check[] => {
  const { zones } = checkPour(of, { pourId: 'P1', withSteps: true })
  return (zones.find(({ zone }) => zone.id === zoneId)?.checks ?? []).filter(({ family }) => family === 'fit')
}

/** The one check of a zone whose name fits: status, what is there and what is asked for. */
export function theFit(parts: Parts, zoneId: string, name: RegExp) {
  const checks = fitOf(layout(parts), zoneId)
  const found = checks.filter((check): check is Compared => check.kind === 'compared' && name.test(check.name))
  const [only] = found
  if (!only || found.length > 1) throw new Error(`${found.length} of ${checks.map((c) => c.name).join('; ')}`)
  return { status: only.status, there: Number(only.demand.toFixed(6)), asked: only.limit }
}

/** Whether any check of a zone is over or a stop. */
export const faultsOf = (parts: Parts, zoneId: string): string[] =>
  fitOf(layout(parts), zoneId).flatMap((check) =>
    check.kind === 'compared' && check.status !== 'within' ? [check.name] : [],
  )
