import { alongAzimuth, cross } from '../geometry'
import type { MatLayer, Point } from '../model'
import type { Section } from '../section'
import type { Face } from './bar'

/** Two bars that turn by less than this lie in one layer of a mat; more, and they lie one over the other. */
const SAME_LAYER_SINE = Math.SQRT1_2

/** A height, and the face that it belongs to. */
export interface Layer {
  readonly face: Face
  readonly height: number
}

interface InLayers {
  readonly layers: 'top' | 'bottom' | 'both'
  readonly diameter: number
  /** Along the bars, in plan. */
  readonly way: Point
  readonly mats: readonly MatLayer[]
}

/**
 * Heights of bars that lie against the cover (common practice).
 *
 * In a region with links they lie inside these. In the slab they lie in the layer of the mat that runs their way: in
 * the outer layer where that is theirs, otherwise inside its bars. Without a mat they lie against the cover.
 */
export function layersOf(section: Section, bars: InLayers): Layer[] {
  const { top, soffit, coverTop, coverSoffit } = section
  const inside = (face: Face) => outsideOf(section, bars, face) + bars.diameter / 2
  return [
    ...(bars.layers === 'bottom' ? [] : [{ face: 'top' as const, height: top - coverTop - inside('top') }]),
    ...(bars.layers === 'top' ? [] : [{ face: 'bottom' as const, height: soffit + coverSoffit + inside('bottom') }]),
  ]
}

/** What lies between the cover and the bar: the region's links, or the mat's outer bars where they run across. */
function outsideOf({ linkDiameter }: Section, { mats, way }: InLayers, face: Face): number {
  if (linkDiameter > 0) return linkDiameter
  const outer = mats.find((mat) => mat.face === face && mat.isOuter)
  if (!outer) return 0
  return Math.abs(cross(alongAzimuth(outer.azimuth), way)) > SAME_LAYER_SINE ? outer.diameter : 0
}
