/** Cover to the anchor: its centre, plate and pocket against soffit, top, the next face and the next pocket. */

import { faceClearance, plateBox, pocketBox, type Box } from '../bodies'
import { nearestFace } from '../faces'
import { distancesByStage, hardwareClause } from '../hardware-distances'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, Hardware } from '../model'
import { neighboursOf } from '../neighbours'
import { panFrame } from '../pan-frame'
import type { Advice, Check, Compared } from '../result'
import { sectionBehind, type Section } from '../section'
import { step, type Clause } from '../step'
import { anchorMark } from '../zones'
import { distanceCheck } from './distance-check'

/** The cover is data of the pour or region, set to the basis by whoever entered it. */
const COVER: Clause = { source: 'Nominal cover of the pour or region', section: 'as entered', tag: 'practice' }

/** A distance of the job's own, accepted together with its basis. */
const SETTING: Clause = { source: 'Job setting', section: 'accepted with the basis', tag: 'practice' }

const CENTRING: Clause = { source: 'Common practice', section: 'position in the thickness', tag: 'practice' }

/** From this thickness on an anchor may stand off centre, if it keeps away from the surfaces, mm. */
const THICK_FROM = 250
const USUAL_TO_SURFACE = 100
const USUAL_OFF_CENTRE = 10

interface Site {
  readonly index: LayoutIndex
  readonly anchor: Anchor
  readonly hardware: Hardware
  /** Of a pan's bearing face, above the soffit datum; null at an edge. */
  readonly floor: number | null
  readonly top: number
  readonly soffit: number
  /** Covers at the anchor. */
  readonly section: Section
}

/** Distances of one anchor to the concrete round it. In a pan the recess takes the place of a pocket. */
export function coverChecks(index: LayoutIndex, anchor: Anchor): Check[] {
  const site = siteOf(index, anchor)
  if (!site) return []
  const plate = plateBox(anchor, site.hardware)
  const pocket = site.floor === null ? pocketBox(anchor, site.hardware) : null
  return [
    ...centreChecks(site),
    ...bodyChecks(site, { body: plate, name: 'Plate', ...coversOf(site.section) }),
    ...plateOnWall(site, plate),
    ...(pocket ? bodyChecks(site, { body: pocket, name: 'Pocket', ...pocketLimits(site) }) : []),
    ...(pocket ? pocketToPocket(site, pocket) : []),
    positionAdvice(site),
  ]
}

function siteOf(index: LayoutIndex, anchor: Anchor): Site | null {
  const pan = index.pans.get(anchor.panId ?? '')
  const edge = index.edges.get(anchor.edgeId ?? '')
  const frame = pan ? panFrame(index, pan.id) : index.frames.get(anchor.edgeId ?? '')
  const pour = index.pours.get(pan?.pourId ?? edge?.pourId ?? '')
  if (!frame || !pour) return null
  const { chainage, setBack: depth } = anchor
  const top = frame.topAt(chainage)
  return {
    index,
    anchor,
    hardware: found(index.hardware, anchor.hardwareId, 'hardware'),
    floor: pan ? top - pan.depth : null,
    top,
    soffit: frame.soffitAt(chainage),
    section: sectionBehind(pour, { frame, chainage, depth }),
  }
}

/** In a pan the plate stands on the wall of the recess, above its floor. */
function plateOnWall(site: Site, plate: Box): Compared[] {
  const { floor } = site
  if (floor === null) return []
  const clause = hardwareClause(site.hardware, 'plate')
  const above = step(
    { symbol: 'c', meaning: 'plate above the floor of the recess', formula: 'z - h / 2 - zf', unit: 'mm', clause },
    { z: site.anchor.height, h: plate.toHeight - plate.fromHeight, zf: floor },
    (v) => v.z - v.h / 2 - v.zf,
  )
  return [
    distanceCheck({
      ...headOf(site, 'Plate above the floor of the recess'),
      stage: null,
      limitKind: 'H',
      clause,
      demand: above.value,
      limit: 0,
      // A plate that stands on the floor is on the wall; one that reaches below it is not.
      isClearance: above.value < 0,
      steps: [above],
      mend: { field: 'height', value: floor + (plate.toHeight - plate.fromHeight) / 2 },
    }),
  ]
}

/** The nearer of soffit and top, at each stage whose approval asks for another distance. */
function centreChecks(site: Site): Compared[] {
  const { index, anchor, top, soffit } = site
  const isSoffit = anchor.height - soffit <= top - anchor.height
  return distancesByStage(index, anchor).map(({ stage, edgeHeightMin, clause }) => {
    const measured = isSoffit
      ? step(
          { symbol: 'cs', meaning: 'centre above soffit', formula: 'z - zs', unit: 'mm', clause },
          { z: anchor.height, zs: soffit },
          (v) => v.z - v.zs,
        )
      : step(
          { symbol: 'ct', meaning: 'centre below top', formula: 'zt - z', unit: 'mm', clause },
          { z: anchor.height, zt: top },
          (v) => v.zt - v.z,
        )
    const fits = top - soffit >= 2 * edgeHeightMin
    const value = isSoffit ? soffit + edgeHeightMin : top - edgeHeightMin
    return distanceCheck({
      ...headOf(site, isSoffit ? 'Centre above soffit' : 'Centre below top'),
      stage,
      limitKind: 'H',
      clause,
      demand: measured.value,
      limit: edgeHeightMin,
      isClearance: false,
      steps: [measured],
      mend: fits ? { field: 'height', value } : null,
    })
  })
}

interface BodyLimits {
  readonly toTop: number
  readonly toSoffit: number
  readonly toFace: number
  readonly clause: Clause
}

const coversOf = ({ coverTop, coverSoffit, coverEdge }: Section): BodyLimits => ({
  toTop: coverTop,
  toSoffit: coverSoffit,
  toFace: coverEdge,
  clause: COVER,
})

function pocketLimits({ index }: Site): BodyLimits {
  const limit = index.layout.job.settings.pocketToFaceMin
  return { toTop: limit, toSoffit: limit, toFace: limit, clause: SETTING }
}

/** A body to whichever of soffit and top leaves less to spare, and to the nearest other face. */
function bodyChecks(site: Site, of: BodyLimits & { readonly body: Box; readonly name: string }): Compared[] {
  const { body, name, clause, toTop, toSoffit, toFace } = of
  const [above, below] = [site.top - body.toHeight, body.fromHeight - site.soffit]
  const isSoffit = below - toSoffit <= above - toTop
  const measured = isSoffit
    ? step(
        { symbol: 'c', meaning: `${name} above soffit`, formula: 'z - h / 2 - zs', unit: 'mm', clause },
        { z: site.anchor.height, h: body.toHeight - body.fromHeight, zs: site.soffit },
        (v) => v.z - v.h / 2 - v.zs,
      )
    : step(
        { symbol: 'c', meaning: `${name} below top`, formula: 'zt - z - h / 2', unit: 'mm', clause },
        { z: site.anchor.height, h: body.toHeight - body.fromHeight, zt: site.top },
        (v) => v.zt - v.z - v.h / 2,
      )
  const shared = { limitKind: 'C', clause, stage: null, isClearance: true } as const
  const half = (body.toHeight - body.fromHeight) / 2
  const fits = site.top - site.soffit >= 2 * half + toTop + toSoffit
  const height = isSoffit ? site.soffit + toSoffit + half : site.top - toTop - half
  const inHeight = distanceCheck({
    ...headOf(site, `${name} to ${isSoffit ? 'soffit' : 'top'}`),
    ...shared,
    demand: measured.value,
    limit: isSoffit ? toSoffit : toTop,
    steps: [measured],
    mend: fits ? { field: 'height', value: height } : null,
  })
  const face = nearestFace(site.index, site.anchor, body)
  if (!face) return [inHeight]
  const inPlan = {
    ...headOf(site, `${name} to ${face.name}`),
    ...shared,
    demand: face.distance,
    limit: toFace,
    steps: [],
    mend: null,
  }
  return [inHeight, distanceCheck(inPlan)]
}

/** To the pocket beside it, as seen on the face; further ones only where they are short. */
function pocketToPocket(site: Site, pocket: Box): Compared[] {
  const { index, anchor } = site
  const limit = index.layout.job.settings.pocketToPocketMin
  const width = pocket.toChainage - pocket.fromChainage
  const widest = Math.max(width, ...index.layout.hardware.map((hardware) => hardware.pocket?.width ?? 0))
  const { nearest, within } = neighboursOf(index, anchor, (width + widest) / 2 + limit)
  const others = [...new Set([...nearest, ...within])].flatMap((other) => {
    const box = pocketBox(other, found(index.hardware, other.hardwareId, 'hardware'))
    return box ? [{ other, clear: faceClearance(pocket, box) }] : []
  })
  const byDistance = others.sort((a, b) => a.clear - b.clear)
  return byDistance
    .filter(({ clear }, i) => i === 0 || clear < limit)
    .map(({ other, clear }) =>
      distanceCheck({
        ...headOf(site, `Pocket to pocket of ${anchorMark(index, other)}`),
        stage: null,
        limitKind: 'C',
        clause: SETTING,
        demand: clear,
        limit,
        isClearance: true,
        steps: [],
        mend: null,
      }),
    )
}

/** Centred wins where the slab is thin; in a thick section it is the distance to the surface that matters. */
function positionAdvice(site: Site): Advice {
  const { anchor, top, soffit } = site
  const isThick = top - soffit >= THICK_FROM
  const toSurface = Math.min(top - anchor.height, anchor.height - soffit)
  const offCentre = Math.abs(anchor.height - (top + soffit) / 2)
  return {
    ...headOf(site, isThick ? 'Centre to the nearer surface' : 'Off the middle of the thickness'),
    kind: 'advice',
    plane: null,
    stage: null,
    limitKind: 'P',
    clause: CENTRING,
    measured: isThick ? toSurface : offCentre,
    usual: isThick ? `${USUAL_TO_SURFACE} or more` : `${USUAL_OFF_CENTRE} or less`,
    unit: 'mm',
    isUsual: isThick ? toSurface >= USUAL_TO_SURFACE : offCentre <= USUAL_OFF_CENTRE,
  }
}

function headOf({ anchor }: Site, name: string) {
  const turned = anchor.skew !== 0 || anchor.elevation !== 0
  const squareOnly = 'Plate and pocket are measured square to the edge; the turn of the tendon is not applied.'
  const isBody = name.startsWith('Plate') || name.startsWith('Pocket')
  return { zoneId: `anchor:${anchor.id}`, family: 'cover', name, notes: turned && isBody ? [squareOnly] : [] } as const
}
