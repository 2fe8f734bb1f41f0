import type { AnchorData, LayoutFile } from '../layout'
import type { SteelData } from '../steel-schema'
import { shapeProblems } from './hardware'
import { byId, refused, type Path, type Problem } from './problem'

/** Steel whose zone lies in another pour, gaps between anchors that are not there, and shapes that cannot be bent. */
export function steelProblems(layout: LayoutFile): Problem[] {
  const places: Places = {
    edges: new Map(layout.edges.map((edge) => [edge.id, edge.pourId])),
    pans: new Map(layout.pans.map((pan) => [pan.id, pan.pourId])),
    anchors: byId(layout.anchors),
    joints: new Map(layout.joints.map((joint) => [joint.id, joint.edgeLineId])),
    sides: new Set(layout.edges.map((edge) => JSON.stringify([edge.edgeLineId, edge.pourId]))),
  }
  return layout.steel.flatMap((steel, i) => [
    ...shapeProblems(steel.shape, ['steel', i, 'shape']),
    ...zoneProblems(steel, places, ['steel', i]),
  ])
}

interface Places {
  /** Pour of each edge and pan. */
  readonly edges: ReadonlyMap<string, string>
  readonly pans: ReadonlyMap<string, string>
  readonly anchors: ReadonlyMap<string, AnchorData>
  /** Edge line of each joint. */
  readonly joints: ReadonlyMap<string, string>
  /** Edge line and pour of each edge. */
  readonly sides: ReadonlySet<string>
}

function zoneProblems(steel: SteelData, places: Places, path: Path): Problem[] {
  const { zone } = steel
  switch (zone.kind) {
    case 'anchor':
      return samePour(steel, places.anchors.get(zone.anchorId)?.castWithPourId, path)
    case 'edge':
      return samePour(steel, places.edges.get(zone.edgeId), path)
    case 'pan':
      return samePour(steel, places.pans.get(zone.panId), path)
    case 'gap':
      return [...samePour(steel, places.edges.get(zone.edgeId), path), ...besideGap(zone, places, [...path, 'zone'])]
    case 'joint': {
      const line = places.joints.get(zone.jointId)
      if (line === undefined || places.sides.has(JSON.stringify([line, steel.pourId]))) return []
      return [refused([...path, 'pourId'], 'this pour has no edge on the joint; must be one of the pours beside it')]
    }
  }
}

function samePour(steel: SteelData, pourId: string | undefined, path: Path): Problem[] {
  if (pourId === undefined || pourId === steel.pourId) return []
  return [refused([...path, 'pourId'], `the zone of these bars lies in pour "${pourId}"; must be that pour`)]
}

/** A gap lies between tendon ends of one edge; those in pans of its pour may end it too. */
function besideGap(zone: Extract<SteelData['zone'], { kind: 'gap' }>, places: Places, path: Path): Problem[] {
  const pourId = places.edges.get(zone.edgeId)
  const problems = (['afterAnchorId', 'beforeAnchorId'] as const).flatMap((key) => {
    const anchor = places.anchors.get(zone[key] ?? '')
    if (!anchor) return []
    const isThere = anchor.edgeId === zone.edgeId || (anchor.panId !== null && places.pans.get(anchor.panId) === pourId)
    if (isThere) return []
    const message = `anchor "${anchor.id}" stands neither on this edge nor in a pan of its pour; must be beside the gap`
    return [refused([...path, key], message)]
  })
  if (zone.afterAnchorId !== null && zone.afterAnchorId === zone.beforeAnchorId) {
    problems.push(refused([...path, 'beforeAnchorId'], 'is the anchor before the gap as well; must be the next one'))
  }
  return problems
}
