/** What bursting checks of single anchors and of groups say alike: warnings beside a result, and refusals. */

import { isBonded, type AnchorSite } from '../anchor-site'
import type { Refused } from '../result'
import { sectionStepNear, type SectionStep } from '../section-step'
import type { Plane } from '../steel/crossings'
import { refusal, type CheckContext, type Head } from './outcome'
import type { Prism } from './prism'

/** Within this share of plate to prism the prism rule follows elastic theory within about 8 % (computed). */
const RATIO_MIN = 0.1
const RATIO_MAX = 0.8
/** Above it, and off centre, the prism rule is low: by 16 % at 0.70 and 40 % at 0.90 (computed). */
const ECCENTRIC_RATIO_MAX = 0.6

export const whole = (value: number): string => String(Math.round(value))
export const degrees = (angle: number): string => String(Math.round((angle * 1800) / Math.PI) / 10)

/** `what` bears over the width of the prism rule: the plate, the splay, the plates from out to out. */
export function ratioNotes({ a, b }: Prism, of: { what: string; isEccentric: boolean }): readonly string[] {
  const ratio = a / b.value
  const said = `The ${of.what} takes ${ratio.toFixed(2)} of its prism`
  if (of.isEccentric && ratio > ECCENTRIC_RATIO_MAX) {
    return [`${said} and stands off centre: the prism rule is low there, by 16 % at 0.70 and 40 % at 0.90 (computed).`]
  }
  if (ratio >= RATIO_MIN && ratio <= RATIO_MAX) return []
  return [`${said}, outside 0.1 to 0.8, where the rule follows elastic theory within about 8 % (computed).`]
}

/** In plan a step of depth does not refuse the rule, but the reader must know of it. */
export function stepNotes(site: AnchorSite): readonly string[] {
  const change = sectionStepNear(site, site.top - site.soffit)
  if (!change) return []
  return [
    `A step in depth stands ${whole(change.distance)} from the anchor; the rule in plan takes the section as constant.`,
  ]
}

export function inclinedNotes(angle: number, how: string): readonly string[] {
  if (angle === 0) return []
  return [`The tendon stands ${degrees(Math.abs(angle))} degrees out of square ${how}; the rule takes it as square.`]
}

/** The recess of a pan stands in front of the bearing face; behind it the slab is whole. */
export function panNotes({ pan, toFloor, toSoffit }: AnchorSite): readonly string[] {
  if (pan === null || toFloor === null) return []
  const left = whole(Math.max(0, toSoffit - toFloor))
  return [
    `Behind the bearing face of pan ${pan.mark} the slab has its whole thickness; ${left} of it goes on under the ` +
      'recess in front, which is tied back by bars of its own.',
  ]
}

export const whatBears = (site: AnchorSite): string => (isBonded(site) ? 'splay' : 'plate')

const INCLINED = {
  thickness: { field: 'elevation', angleOf: ({ anchor }: AnchorSite) => anchor.elevation },
  plan: { field: 'skew', angleOf: ({ anchor }: AnchorSite) => anchor.skew },
} as const

/** Refused where a tendon leans further than the rule is used for; null where it does not. */
export function whyTooInclined(
  head: Head,
  site: AnchorSite,
  of: { plane: Plane; context: CheckContext },
): Refused | null {
  const { field, angleOf } = INCLINED[of.plane]
  const angle = angleOf(site)
  if (Math.abs(angle) <= of.context.basis.inclinationMax.value) return null
  const message = `The tendon stands ${degrees(Math.abs(angle))} degrees out of square; the rule is used up to 20 degrees.`
  return refusal(head, { code: 'OUTSIDE_METHOD', field, message })
}

/** Refused where what bears is as large as one of its prisms; null where the rule has room. */
export function whyNoPrism(head: Head, prisms: readonly Prism[], of: { what: string; field: string }): Refused | null {
  const tooSmall = prisms.find(({ a, b }) => a >= b.value)
  if (!tooSmall) return null
  const sizes = `The ${of.what} (${whole(tooSmall.a)}) must be smaller than its prism (${whole(tooSmall.b.value)})`
  return refusal(head, {
    code: 'OUTSIDE_METHOD',
    field: of.field,
    message: `${sizes}. Move the anchor or choose a smaller plate.`,
  })
}

/** Where a step stands, as both refusals beside it say it. */
export function changeWords({ where, distance, topBeyond, soffitBeyond }: SectionStep, depth: number): string {
  const place = where === 'behind' ? 'behind the bearing face' : 'beside the plate along the edge'
  return (
    `The section changes from ${whole(depth)} to ${whole(topBeyond - soffitBeyond)} deep ${whole(distance)} ${place}, ` +
    `within one prism length (${whole(depth)})`
  )
}

/** Refused within one prism length of a step in depth; null where the section is constant so far. */
export function whyNotConstant(head: Head, site: AnchorSite): Refused | null {
  const depth = site.top - site.soffit
  const change = sectionStepNear(site, depth)
  if (!change) return null
  return refusal(head, {
    code: 'DEPTH_CHANGE',
    field: site.pan === null ? 'chainage' : 'pan.x',
    message: `${changeWords(change, depth)}: the rule for a constant section does not hold.`,
  })
}
