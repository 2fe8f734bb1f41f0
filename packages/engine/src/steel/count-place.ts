import type { AnchorSite } from '../anchor-site'
import { sectionBehind } from '../section'
import type { CountPlace } from './crossings'

/** The place behind one anchor at which its bars are counted. */
export function countPlaceOf({ anchor, frame, hardware, pour, top, soffit }: AnchorSite): CountPlace {
  const { coverTop, coverSoffit } = sectionBehind(pour, { frame, chainage: anchor.chainage, depth: anchor.setBack })
  return {
    chainage: anchor.chainage,
    edgeFrom: frame.from,
    edgeTo: frame.to,
    breaks: frame.steps,
    cover: pour.coverEdge,
    setBack: anchor.setBack,
    plateWidth: hardware.plate.width,
    depth: top - soffit,
    coverTop,
    coverSoffit,
    azimuth: frame.outwardAzimuth,
    mats: pour.mats,
  }
}
