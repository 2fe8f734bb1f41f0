/** A step in depth near an anchor: what lies there, and what an answer to it must look at. */

import { whyNoRule, type AnchorSite } from '../anchor-site'
import type { Check } from '../result'
import { sectionStepNear } from '../section-step'
import { changeWords, whole } from './bursting-notes'
import { refusal, type CheckContext, type Head } from './outcome'

/** Not covered within one prism length of a step, by any rule of a constant section; nothing to say further away. */
export function depthChangeChecks(site: AnchorSite, { basis }: CheckContext): Check[] {
  const depth = site.top - site.soffit
  const change = whyNoRule(site) === null ? sectionStepNear(site, depth) : null
  if (!change) return []
  const head: Head = {
    zoneId: `anchor:${site.anchor.id}`,
    family: 'depth-change',
    name: 'Step in depth near the anchor',
    plane: 'thickness',
    stage: null,
    limitKind: 'C',
    clause: basis.clauses.tie,
    notes: [
      'An elastic result at a step still needs judgement: 0.25 P behind the anchor can become 0.5 P there (computed).',
    ],
  }
  const beyond = change.topBeyond - change.soffitBeyond
  const corner = cornerOf(site, change)
  return [
    refusal(head, {
      code: 'DEPTH_CHANGE',
      field: site.pan === null ? 'chainage' : 'pan.x',
      message:
        `${changeWords(change, depth)}. The smaller section's prism is ${whole(Math.min(depth, beyond))}; ` +
        `${corner} needs a model of its own.`,
    }),
  ]
}

/** The re-entrant corner of a step lies at the level of the shallower section. */
function cornerOf(site: AnchorSite, of: { readonly topBeyond: number; readonly soffitBeyond: number }): string {
  const levels = [
    ...(of.topBeyond !== site.top ? [`${whole(Math.min(of.topBeyond, site.top))} at the top`] : []),
    ...(of.soffitBeyond !== site.soffit ? [`${whole(Math.max(of.soffitBeyond, site.soffit))} at the soffit`] : []),
  ]
  return `the re-entrant corner at height ${levels.join(' and ')}`
}
