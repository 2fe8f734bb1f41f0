import type { LayoutFile } from '@wedgeline/contract'
import { largeLayout } from './large-layout'

/** The large layout as one pour, so that one pour holds all its anchors. */
export function onePour(anchors: number): LayoutFile {
  const file = largeLayout(anchors)
  const [first] = file.pours
  const widthMm = Math.max(...file.pours.flatMap(({ outline }) => outline.map(({ xMm }) => xMm)))
  if (!first) throw new Error('The large layout has no pour.')
  const outline = first.outline.map((corner) => ({ ...corner, xMm: corner.xMm > 0 ? widthMm : 0 }))
  const edges = file.edges.filter(({ pourId }) => pourId === first.id)
  const edgeIdOf = (edgeId: string | null) =>
    edges.find(({ id }) => id.split('-')[1] === edgeId?.split('-')[1])?.id ?? null
  const pours = { castWithPourId: first.id, stressedWithPourId: first.id }
  return {
    ...file,
    pours: [{ ...first, outline }],
    edges: edges.map((edge) => ({ ...edge, lengths: edge.lengths.map((one) => ({ ...one, toMm: widthMm })) })),
    tendons: file.tendons.map((tendon) => ({ ...tendon, pourId: first.id })),
    anchors: file.anchors.map((anchor, at) => ({
      ...anchor,
      ...pours,
      edgeId: edgeIdOf(anchor.edgeId),
      number: at + 1,
    })),
    steel: file.steel
      .filter(({ zone, pourId }) => zone.kind !== 'edge' || pourId === first.id)
      .map((row) => ({
        ...row,
        pourId: first.id,
        shape: 'toMm' in row.shape ? { ...row.shape, toMm: widthMm - 50 } : row.shape,
      })),
  }
}
