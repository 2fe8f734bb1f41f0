import type { AnchorSite } from '../anchor-site'
import type { CountPlace } from './crossings'

/** The place behind one anchor at which its bars are counted. */
export function countPlaceOf({ anchor, frame, hardware, pour, top, soffit }: AnchorSite): CountPlace {
  return {
    chainage: anchor.chainage,
    edgeFrom: frame.from,
    edgeTo: frame.to,
    breaks: frame.steps,
    cover: pour.coverEdge,
    setBack: anchor.setBack,
    plateWidth: hardware.plate.width,
    depth: top - soffit,
    azimuth: frame.outwardAzimuth,
    mats: pour.mats,
  }
}
