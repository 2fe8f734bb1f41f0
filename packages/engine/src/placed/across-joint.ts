import { found, type LayoutIndex } from '../layout-index'
import type { Edge, Joint, PlacedBarsShape, SteelShape } from '../model'
import { placed } from '../placed'
import { sectionBehind } from '../section'
import { about, type Drawn, type PlacedBar } from './bar'
import { layersOf } from './layers'

/** The edge by whose coordinates the bars of a joint are measured: that of the pour cast first. */
export function edgeOfJoint(index: LayoutIndex, joint: Joint): Edge | null {
  const edges = index.edgesOfLine.get(joint.edgeLineId) ?? []
  return edges.find(({ pourId }) => pourId === joint.firstPourId) ?? edges[0] ?? null
}

/** Bars of a joint, in its edge's coordinates: square to it, half in each pour, spread at their pitch about its middle. */
export function barsOfJoint(index: LayoutIndex, jointId: string): PlacedBar[] {
  const edge = edgeOfJoint(index, found(index.joints, jointId, 'joint'))
  if (!edge) return []
  const zoneId = `joint:${jointId}`
  return (index.steelOfZone.get(zoneId) ?? []).flatMap((steel) => {
    const { shape } = steel
    return isPlaced(shape)
      ? across(index, edge, shape).map((bar) => placed(bar, { steel, zoneId, anchor: null, shape }))
      : []
  })
}

const isPlaced = (shape: SteelShape): shape is PlacedBarsShape => 'runs' in shape

function across(index: LayoutIndex, edge: Edge, shape: PlacedBarsShape): Drawn[] {
  const pour = found(index.pours, edge.pourId, 'pour')
  const frame = found(index.frames, edge.id, 'edge')
  return about((frame.from + frame.to) / 2, shape.count, shape.pitch).flatMap((chainage) => {
    const section = sectionBehind(pour, { frame, chainage, depth: shape.length / 4 })
    return layersOf(section, { ...shape, way: frame.inward, mats: pour.mats }).map(({ face, height }) => ({
      layer: face,
      path: [-shape.length / 2, shape.length / 2].map((depth) => ({ chainage, depth, height })),
    }))
  })
}
