/** Anchorage and laps: how far each bar runs on past the line that it crosses, against the basis. */

import { siteOfAnchor, type AnchorSite } from '../anchor-site'
import type { AnchorageInput, BondPlace } from '../bases/basis'
import { found } from '../layout-index'
import type { Anchor, HairpinShape, LinksShape, Pour, SteelShape } from '../model'
import type { Advice, Check, Compared, Zone } from '../result'
import { sizeOf } from '../schedule/bar-standards'
import { barStandardById, BS_8666_2020 } from '../schedule/bs-8666'
import { bondPlaceOf } from '../steel/bond'
import { countPlaceOf } from '../steel/count-place'
import { crossingsOf } from '../steel/crossings'
import { steelOfAnchor } from '../steel/steel-of-anchor'
import { pastCheck, pastLine, worstOfEach, type PastLine } from './anchorage-length'
import { jointLapChecks, panAnchorageChecks, wedgeBarChecks } from './anchorage-places'
import { distanceCheck } from './distance-check'
import { edgeLapChecks } from './edge-laps'
import type { CheckContext } from './outcome'

/**
 * Anchorage of the bars of a zone: one check for each kind of bar, that of its worst set.
 *
 * Where another check already counts a short bar with a share of its area, the limit here is the least length, below
 * which it does not count at all; elsewhere the whole length is asked for.
 */
export function anchorageChecks(context: CheckContext, zone: Zone): readonly Check[] {
  switch (zone.kind) {
    case 'anchor':
      return [...anchorChecks(context, zone), ...edgeBarAdvice(context, zone)]
    case 'gap':
      return wedgeBarChecks(context, zone)
    case 'edge':
      return edgeLapChecks(context, zone)
    case 'pan':
      return panAnchorageChecks(context, zone)
    case 'joint':
      return jointLapChecks(context, zone)
    case 'group':
    case 'corner':
    case 'tendon':
    case 'strip':
    case 'pour':
      return []
  }
}

// At an anchor -------------------------------------------------------------------------------------------------------

function anchorChecks(context: CheckContext, zone: Zone): readonly Compared[] {
  const { index } = context
  const site = siteOfAnchor(index, anchorOf(context, zone))
  const { shapes } = steelOfAnchor(index, site)
  return worstOfEach(
    shapes.flatMap((shape): readonly Compared[] => {
      switch (shape.kind) {
        case 'transverse-bars':
          return crossingChecks(context, zone, { shape, site })
        case 'hairpins':
          return [legCheck(context, zone, { shape, site })]
        case 'links':
          return [hookCheck(context, zone, shape)]
        case 'spiral':
        case 'edge-bars':
        case 'wedge-bars':
        case 'trimmers':
        case 'diagonals':
        case 'tie-back-bars':
        case 'lap-bars':
          return []
      }
    }),
  )
}

const anchorOf = ({ index }: CheckContext, { id }: Zone): Anchor =>
  found(index.anchors, id.slice('anchor:'.length), 'anchor')

/** For the last stage, when the whole force acts, with the stress that the basis gives to bursting steel. */
function inputAt({ basis }: CheckContext, site: AnchorSite, shape: SteelShape): AnchorageInput {
  const { pour, force, hardware } = site
  const a = hardware.plate.width
  return {
    diameter: shape.diameter,
    strength: lastStrength(pour),
    stress: basis.tie({ P: force.value, a, b: 2 * a }).stress,
    cd: null,
    isGoodBond: basis.isGoodBond(bondPlaceAt(site, shape)),
    isBent: false,
  }
}

/** The upper leg of an upright hairpin lies half its bend above the anchor. */
function bondPlaceAt(site: AnchorSite, shape: SteelShape): BondPlace {
  const place = bondPlaceOf(countPlaceOf(site), shape)
  if (shape.kind !== 'hairpins') return place
  return { ...place, fromSoffit: site.toSoffit + (shape.lies === 'upright' ? shape.bend / 2 : 0) }
}

const lastStrength = (pour: Pour): number => pour.stages.at(-1)?.strength ?? pour.fck

interface AtAnchor<Shape extends SteelShape> {
  readonly shape: Shape
  readonly site: AnchorSite
}

function crossingChecks(context: CheckContext, zone: Zone, { shape, site }: AtAnchor<SteelShape>): readonly Compared[] {
  const set = crossingsOf(shape, 'plan', countPlaceOf(site))
  if ('reason' in set || set.pastLine === null) return []
  const noun = set.noun[1].charAt(0).toUpperCase() + set.noun[1].slice(1)
  const past: PastLine = {
    meaning: `Shorter end of the ${set.noun[1]} past the anchor's line`,
    formula: 'l',
    values: { l: set.pastLine },
  }
  return [
    pastCheck(context, zone, {
      name: `${noun} past the anchor's line`,
      past: pastLine(past, set.pastLine),
      input: inputAt(context, site, shape),
      countedBy: 'against bursting in plan',
    }),
  ]
}

/** Edge bars are there for the edge: where they end too near an anchor's line to count with it, that is said. */
function edgeBarAdvice(context: CheckContext, zone: Zone): readonly Advice[] {
  const { index, basis } = context
  const site = siteOfAnchor(index, anchorOf(context, zone))
  const place = countPlaceOf(site)
  const short = steelOfAnchor(index, site).shapes.flatMap((shape): readonly Advice[] => {
    if (shape.kind !== 'edge-bars') return []
    const set = crossingsOf(shape, 'plan', place)
    if ('reason' in set || set.pastLine === null) return []
    const { length, clause } = basis.anchorage(inputAt(context, site, shape))
    if (set.pastLine >= length) return []
    return [
      {
        kind: 'advice',
        zoneId: zone.id,
        family: 'anchorage',
        name: "Edge bars past the anchor's line",
        plane: 'plan',
        stage: null,
        limitKind: 'P',
        clause,
        notes: ['What bursting counts of them is lessened by as much.'],
        measured: set.pastLine,
        usual: `${Math.ceil(length)} or more`,
        unit: 'mm',
        isUsual: false,
      },
    ]
  })
  return short.sort((one, other) => one.measured - other.measured).slice(0, 1)
}

/** From the end of the bend: the legs must develop what the bend carries across the plane. */
function legCheck(context: CheckContext, zone: Zone, { shape, site }: AtAnchor<HairpinShape>): Compared {
  const { leg, diameter } = shape
  const r = bendRadius(context, diameter)
  const past: PastLine = {
    meaning: 'Straight leg past the bend',
    formula: 'leg - r - d',
    values: { leg, r, d: diameter },
  }
  return pastCheck(context, zone, {
    name: 'Legs of the hairpins past the bend',
    past: pastLine(past, leg - r - diameter),
    input: { ...inputAt(context, site, shape), isBent: true },
    countedBy: null,
  })
}

function hookCheck(context: CheckContext, zone: Zone, { hook, diameter }: LinksShape): Compared {
  const r = bendRadius(context, diameter)
  const past: PastLine = {
    meaning: 'Straight end of the hook past its bend',
    formula: 'hook - r - d',
    values: { hook, r, d: diameter },
  }
  const { length, clause } = context.basis.linkHook(diameter)
  const available = pastLine(past, hook - r - diameter)
  return distanceCheck({
    zoneId: zone.id,
    family: 'anchorage',
    name: 'Hooks of the links',
    stage: null,
    limitKind: 'C',
    clause,
    notes: [],
    demand: available.value,
    limit: length,
    isClearance: false,
    steps: [available],
    mend: null,
  })
}

function bendRadius({ index }: CheckContext, diameter: number): number {
  const standard = barStandardById(index.layout.job.settings.barStandard) ?? BS_8666_2020
  return sizeOf(standard, diameter)?.bendRadius ?? 2 * diameter
}
