/** Average compression behind the wedges of an edge, after losses and before restraint; advice. */

import { found, type LayoutIndex } from '../layout-index'
import type { Advice, Check, Refused, Zone } from '../result'
import type { Clause } from '../step'
import { isNoForce, type NoForce } from '../tendon/friction'
import { stripOfEdge, type Strip, type StripShare } from '../tendon/strip'
import { anchorMark } from '../zones'
import { refusal, type CheckContext } from './outcome'

const USUAL: Clause = { source: 'Common practice', section: 'average precompression of slabs', tag: 'practice' }

/** MPa: from little to much crack control. */
const LEAST = 0.7
const MOST = 3
const USUAL_TEXT = `${LEAST} to ${MOST}: low 0.7, moderate 1.4, high 2.5 to 3 by the crack control wanted`

/** Never what reduces crack steel: that compression is typed by the engineer. */
const BEFORE =
  'After friction and draw-in; before creep, shrinkage and relaxation, and before walls and columns hold the slab.'

/** The strip behind an edge, or what one tendon brings to its own width at each of its ends. */
export function precompressionChecks({ index }: CheckContext, zone: Zone): readonly Check[] {
  return zone.kind === 'strip' ? ofStrip(index, zone) : ofTendon(index, zone)
}

function ofStrip(index: LayoutIndex, zone: Zone): readonly Check[] {
  const strip = stripOfEdge(index, zone.edgeId ?? '')
  if (strip === null) return []
  if (isNoForce(strip)) return [unknown(zone, strip)]
  const sum = (of: (share: StripShare) => number) => strip.shares.reduce((total, share) => total + of(share), 0)
  const least = strip.shares.reduce((one, other) => (other.nominal / other.area < one.nominal / one.area ? other : one))
  return [
    advice(index, zone, {
      name: 'Precompression, average over the edge',
      strip,
      nominal: sum(({ nominal }) => nominal) / strip.area,
      high: sum(({ high }) => high) / strip.area,
    }),
    advice(index, zone, {
      name: `Precompression, least over one tendon's width, at ${markOf(index, least)}`,
      strip,
      nominal: least.nominal / least.area,
      high: least.high / least.area,
    }),
  ]
}

const markOf = (index: LayoutIndex, { ends }: StripShare): string =>
  ends.map(({ anchor }) => anchorMark(index, anchor)).join(' and ')

function ofTendon(index: LayoutIndex, zone: Zone): readonly Check[] {
  const tendon = found(index.tendons, zone.id.slice('tendon:'.length), 'tendon')
  const made = (index.edgesOfPour.get(tendon.pourId) ?? []).flatMap((edge): Check[] => {
    const strip = stripOfEdge(index, edge.id)
    if (strip === null || isNoForce(strip)) return []
    const share = strip.shares.find(({ ends }) => ends.some(({ anchor }) => anchor.tendonId === tendon.id))
    if (!share) return []
    const name = `Precompression over its width behind ${edge.mark}`
    const [nominal, high] = [share.nominal / share.area, share.high / share.area]
    return [advice(index, zone, { name, strip, nominal, high })]
  })
  if (made.length > 0) return made
  return [unknown(zone, whyNone(index, tendon.id, tendon.mark))]
}

/** The first edge at which the tendon ends says what is missing there. */
function whyNone(index: LayoutIndex, tendonId: string, mark: string): NoForce {
  const edgeIds = (index.anchorsOfTendon.get(tendonId) ?? []).flatMap(({ edgeId }) => (edgeId === null ? [] : [edgeId]))
  const strips = edgeIds.map((edgeId) => stripOfEdge(index, edgeId))
  const why = strips.find((strip) => strip !== null && isNoForce(strip))
  if (why && isNoForce(why)) return why
  const message = `Tendon ${mark} has no end that points at an edge. Enter its anchors at the edges that it compresses.`
  return { code: 'MISSING_INPUT', field: 'anchors', message }
}

const HEAD = { family: 'precompression', plane: null, stage: null, limitKind: 'P', clause: USUAL } as const

const unknown = (zone: Zone, why: NoForce): Refused =>
  refusal({ ...HEAD, zoneId: zone.id, name: 'Precompression', notes: [] }, why)

function advice(
  index: LayoutIndex,
  zone: Zone,
  of: { readonly name: string; readonly strip: Strip; readonly nominal: number; readonly high: number },
): Advice {
  const { mark } = found(index.edges, of.strip.edgeId, 'edge')
  return {
    ...HEAD,
    kind: 'advice',
    zoneId: zone.id,
    name: of.name,
    notes: [
      `${of.high.toFixed(2)} MPa with the high friction pair.`,
      `At ${Math.round(of.strip.depth)} behind ${mark}, beyond its wedges between tendons. ${BEFORE}`,
    ],
    measured: of.nominal,
    usual: USUAL_TEXT,
    unit: 'MPa',
    isUsual: of.nominal >= LEAST && of.nominal <= MOST,
  }
}
