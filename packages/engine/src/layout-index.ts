/** Look-ups by id and by place, made once for a layout, so that 20,000 anchors stay quick. */

import { frameOfSide, type EdgeFrame } from './frame'
import type {
  Anchor,
  Edge,
  EdgeLine,
  Hardware,
  Jack,
  Joint,
  Layout,
  Level,
  Obstruction,
  Pan,
  Pour,
  Steel,
  SteelZone,
  StrandType,
  Tendon,
} from './model'

type ById<T> = ReadonlyMap<string, T>
type Lists<T> = ReadonlyMap<string, readonly T[]>

export interface LayoutIndex {
  readonly layout: Layout
  /** One object for all indexes of a layout that differ in nothing but steel. */
  readonly concrete: object
  readonly levels: ById<Level>
  readonly pours: ById<Pour>
  readonly edgeLines: ById<EdgeLine>
  readonly edges: ById<Edge>
  readonly frames: ById<EdgeFrame>
  readonly joints: ById<Joint>
  readonly pans: ById<Pan>
  readonly tendons: ById<Tendon>
  readonly anchors: ById<Anchor>
  readonly hardware: ById<Hardware>
  readonly jacks: ById<Jack>
  readonly strandTypes: ById<StrandType>
  readonly edgesOfPour: Lists<Edge>
  readonly edgesOfLine: Lists<Edge>
  readonly openingsOfLevel: Lists<Obstruction>
  readonly pansOfPour: Lists<Pan>
  readonly tendonsOfPour: Lists<Tendon>
  /** By chainage, then height, then id. */
  readonly anchorsOfEdge: Lists<Anchor>
  /** The anchors of all edges on the same side of the same edge line, whatever their pour; ordered likewise. */
  readonly rowOfEdge: Lists<Anchor>
  readonly anchorsOfPan: Lists<Anchor>
  readonly anchorsOfTendon: Lists<Anchor>
  /** By the key of `steelKey`. */
  readonly steelOfZone: Lists<Steel>
}

/**
 * Indexes a layout whose references have been checked; the same layout keeps its index.
 *
 * @throws where an edge names a pour, edge line or corner that is not there: such a layout never gets this far.
 */
export function layoutIndex(layout: Layout): LayoutIndex {
  return indexAfter(null, layout)
}

/** A layout's index is kept with it, with all that has been worked out for it. */
const kept = new WeakMap<Layout, LayoutIndex>()

/**
 * Indexes a layout that has been edited: tables that are the same as before are not indexed again.
 *
 * @param before index of the layout before the edit; null indexes all tables.
 */
export function indexAfter(before: LayoutIndex | null, layout: Layout): LayoutIndex {
  const known = kept.get(layout)
  if (known) return known
  const isSame = (...tables: readonly (keyof Layout)[]) =>
    before !== null && tables.every((table) => before.layout[table] === layout[table])
  const places = before && isSame('pours', 'edgeLines', 'edges') ? before : placesOf(layout)
  const ends = before && isSame('pours', 'edgeLines', 'edges', 'anchors') ? before : endsOf(layout, places)
  const index: LayoutIndex = {
    ...fixedOf(before && isSame(...FIXED) ? before : null, layout),
    ...partOf(places, PLACES),
    ...partOf(ends, ENDS),
    layout,
    concrete: {},
    tendons: before && isSame('tendons') ? before.tendons : byId(layout.tendons),
    tendonsOfPour:
      before && isSame('tendons') ? before.tendonsOfPour : grouped(layout.tendons, (tendon) => tendon.pourId),
    steelOfZone: before && isSame('steel') ? before.steelOfZone : grouped(layout.steel, ({ zone }) => steelKey(zone)),
  }
  kept.set(layout, index)
  return index
}

const FIXED = ['levels', 'joints', 'pans', 'hardware', 'jacks', 'strandTypes', 'obstructions'] as const
type Fixed = 'levels' | 'joints' | 'pans' | 'hardware' | 'jacks' | 'strandTypes' | 'openingsOfLevel' | 'pansOfPour'
const FIXED_PARTS = [
  'levels',
  'joints',
  'pans',
  'hardware',
  'jacks',
  'strandTypes',
  'openingsOfLevel',
  'pansOfPour',
] as const

function fixedOf(before: LayoutIndex | null, layout: Layout): Pick<LayoutIndex, Fixed> {
  if (before) return partOf(before, FIXED_PARTS)
  return {
    levels: byId(layout.levels),
    joints: byId(layout.joints),
    pans: byId(layout.pans),
    hardware: byId(layout.hardware),
    jacks: byId(layout.jacks),
    strandTypes: byId(layout.strandTypes),
    openingsOfLevel: grouped(layout.obstructions, ({ kind, levelId }) => (kind === 'opening' ? levelId : null)),
    pansOfPour: grouped(layout.pans, (pan) => pan.pourId),
  }
}

const PLACES = ['pours', 'edgeLines', 'edges', 'frames', 'edgesOfPour', 'edgesOfLine'] as const
type Places = Pick<LayoutIndex, (typeof PLACES)[number]>

function placesOf(layout: Layout): Places {
  const pours = byId(layout.pours)
  const edgeLines = byId(layout.edgeLines)
  const frames = layout.edges.map((edge): [string, EdgeFrame] => [
    edge.id,
    frameOfSide({
      edge,
      line: found(edgeLines, edge.edgeLineId, 'edge line'),
      pour: found(pours, edge.pourId, 'pour'),
    }),
  ])
  return {
    pours,
    edgeLines,
    edges: byId(layout.edges),
    frames: new Map(frames),
    edgesOfPour: grouped(layout.edges, (edge) => edge.pourId),
    edgesOfLine: grouped(layout.edges, (edge) => edge.edgeLineId),
  }
}

const ENDS = ['anchors', 'anchorsOfEdge', 'rowOfEdge', 'anchorsOfPan', 'anchorsOfTendon'] as const
type Ends = Pick<LayoutIndex, (typeof ENDS)[number]>

function endsOf(layout: Layout, { frames }: Places): Ends {
  const anchors = layout.anchors.map(atPanFace)
  const anchorsOfEdge = grouped([...anchors].sort(alongEdge), (anchor) => anchor.edgeId)
  return {
    anchors: byId(anchors),
    anchorsOfEdge,
    rowOfEdge: rowsOf(layout.edges, { frames, anchorsOfEdge }),
    anchorsOfPan: grouped(anchors, (anchor) => anchor.panId),
    anchorsOfTendon: grouped(anchors, (anchor) => anchor.tendonId),
  }
}

function partOf<K extends keyof LayoutIndex>(index: Pick<LayoutIndex, K>, names: readonly K[]): Pick<LayoutIndex, K> {
  return Object.fromEntries(names.map((name) => [name, index[name]])) as Pick<LayoutIndex, K>
}

/**
 * The same index with other steel in some zones; everything that does not hang on steel is kept.
 *
 * @param changed the whole steel of each zone that changes, by the key of `steelKey`.
 */
export function withSteel(index: LayoutIndex, changed: ReadonlyMap<string, readonly Steel[]>): LayoutIndex {
  const steelOfZone = new Map(index.steelOfZone)
  for (const [key, steel] of changed) steelOfZone.set(key, steel)
  return { ...index, steelOfZone, layout: { ...index.layout, steel: [...steelOfZone.values()].flat() } }
}

/** The zone id that a set of bars belongs to, the same as the id of its `Zone`. */
export function steelKey(zone: SteelZone): string {
  switch (zone.kind) {
    case 'anchor':
      return `anchor:${zone.anchorId}`
    case 'gap':
      return gapId(zone.edgeId, zone.afterAnchorId, zone.beforeAnchorId)
    case 'edge':
      return `edge:${zone.edgeId}`
    case 'pan':
      return `pan:${zone.panId}`
    case 'joint':
      return `joint:${zone.jointId}`
  }
}

/** Id of the gap between two tendon ends of an edge; null stands for the end of the edge. */
export function gapId(edgeId: string, afterAnchorId: string | null, beforeAnchorId: string | null): string {
  return `gap:${edgeId}:${afterAnchorId ?? 'start'}:${beforeAnchorId ?? 'end'}`
}

/** Looks up a record that must be there. @throws where it is not: references are checked on the way in. */
export function found<T>(map: ById<T>, id: string, what: string): T {
  const record = map.get(id)
  if (record === undefined) throw new Error(`No ${what} has the id "${id}".`)
  return record
}

/** An anchor in a pan stands in the middle of the pan's bearing face, whatever its own chainage and set-back say. */
function atPanFace(anchor: Anchor): Anchor {
  const isThere = anchor.panId === null || (anchor.chainage === 0 && anchor.setBack === 0)
  return isThere ? anchor : { ...anchor, chainage: 0, setBack: 0 }
}

/** Edges on the two sides of one line, as at a joint, face each other: their anchors stand in two rows. */
export function rowsOf(
  edges: readonly Edge[],
  { frames, anchorsOfEdge }: Pick<LayoutIndex, 'frames' | 'anchorsOfEdge'>,
): Lists<Anchor> {
  const sideOf = (edge: Edge) => {
    const frame = found(frames, edge.id, 'edge')
    return `${edge.edgeLineId}:${frame.runsLeftToRight ? 'left to right' : 'right to left'}`
  }
  const edgesOfSide = grouped(edges, sideOf)
  const rowOfSide = new Map<string, readonly Anchor[]>()
  for (const [side, members] of edgesOfSide) {
    const anchors = members.flatMap((edge) => anchorsOfEdge.get(edge.id) ?? [])
    rowOfSide.set(side, members.length > 1 ? anchors.sort(alongEdge) : anchors)
  }
  return new Map(edges.map((edge) => [edge.id, rowOfSide.get(sideOf(edge)) ?? []]))
}

function byId<T extends { readonly id: string }>(records: readonly T[]): Map<string, T> {
  return new Map(records.map((record) => [record.id, record]))
}

function grouped<T>(records: readonly T[], keyOf: (record: T) => string | null): Map<string, T[]> {
  const lists = new Map<string, T[]>()
  for (const record of records) {
    const key = keyOf(record)
    if (key === null) continue
    const list = lists.get(key)
    if (list) list.push(record)
    else lists.set(key, [record])
  }
  return lists
}

function alongEdge(a: Anchor, b: Anchor): number {
  return a.chainage - b.chainage || a.height - b.height || (a.id < b.id ? -1 : 1)
}
