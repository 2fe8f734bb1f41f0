/** Spacing of anchors and their distance to other faces, against what their hardware asks for. */

import { faceClearance, plateBox } from '../bodies'
import { facesFromCentre } from '../faces'
import { ROUNDING } from '../geometry'
import { distancesByStage, hardwareClause, largerOf, type StageDistances } from '../hardware-distances'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, Hardware } from '../model'
import { neighboursOf } from '../neighbours'
import type { Check, Compared } from '../result'
import { step } from '../step'
import { anchorMark } from '../zones'
import { distanceCheck } from './distance-check'

/** Pairs with their neighbours, in the row or beside a pan, and distances to other faces. */
export function spacingChecks(index: LayoutIndex, anchor: Anchor): Check[] {
  const stages = distancesByStage(index, anchor)
  return [...pairChecks(index, anchor, stages), ...edgeDistances(index, anchor, stages)]
}

// Pairs -------------------------------------------------------------------------------------------------------------

interface Pair {
  readonly index: LayoutIndex
  readonly anchor: Anchor
  readonly other: Anchor
}

/** The neighbours to either side always, further ones where they are short. */
function pairChecks(index: LayoutIndex, anchor: Anchor, stages: readonly StageDistances[]): Compared[] {
  const { nearest, within } = neighboursOf(index, anchor, largestSpacing(index))
  return [...new Set([...nearest, ...within])].flatMap((other) => {
    const pair = { index, anchor, other }
    const others = distancesByStage(index, other)
    const checks = stages.map((own) => pairCheck(pair, own, others))
    const isBeside = nearest.includes(other)
    return [...checks.filter((check) => isBeside || check.status !== 'within'), ...platesApart(pair)]
  })
}

function largestSpacing(index: LayoutIndex): number {
  const asked = index.layout.hardware.flatMap(({ spacingAlongMin, approval }) => [
    spacingAlongMin,
    ...(approval?.strengths ?? []).map((line) => line.spacingAlongMin),
  ])
  return asked.reduce((most, spacing) => Math.max(most, spacing), 0)
}

/**
 * A pair conforms when it is far enough apart along the edge or in height. Where it is neither, the comparison shown
 * is along the edge if the plates overlap in height, otherwise the one that is less short.
 */
function pairCheck(pair: Pair, own: StageDistances, others: readonly StageDistances[]): Compared {
  const { index, anchor, other } = pair
  const { spacingAlongMin, spacingHeightMin } = largerOf(own, others)
  const along = Math.abs(other.chainage - anchor.chainage)
  const inHeight = Math.abs(other.height - anchor.height)
  const shortAlong = spacingAlongMin - along
  const shortInHeight = spacingHeightMin - inHeight
  const isAlong =
    shortAlong <= ROUNDING || (shortInHeight > ROUNDING && (overlaps(pair) || shortAlong <= shortInHeight))
  const mark = anchorMark(index, other)
  const away = other.chainage + Math.sign(anchor.chainage - other.chainage) * spacingAlongMin
  const measured = step(
    isAlong
      ? { symbol: 's', meaning: 'distance along the edge', formula: 'abs(x2 - x1)', unit: 'mm', clause: own.clause }
      : { symbol: 's', meaning: 'distance in height', formula: 'abs(x2 - x1)', unit: 'mm', clause: own.clause },
    isAlong ? { x1: anchor.chainage, x2: other.chainage } : { x1: anchor.height, x2: other.height },
    (v) => Math.abs(v.x2 - v.x1),
  )
  return distanceCheck({
    ...headOf(anchor, isAlong ? `Spacing to ${mark}` : `Spacing in height to ${mark}`),
    notes: notesOn(pair),
    stage: own.stage,
    limitKind: 'H',
    clause: own.clause,
    demand: measured.value,
    limit: isAlong ? spacingAlongMin : spacingHeightMin,
    isClearance: false,
    steps: [measured],
    mend: isAlong && shortAlong > ROUNDING ? movedTo(index, anchor, [away]) : null,
  })
}

function overlaps({ index, anchor, other }: Pair): boolean {
  const heights = [anchor, other].map((one) => hardwareOf(index, one).plate.height / 2)
  return Math.abs(anchor.height - other.height) < heights.reduce((sum, half) => sum + half, 0)
}

function notesOn({ index, anchor, other }: Pair): string[] {
  const [own, its] = [anchor, other].map(({ edgeId }) => index.edges.get(edgeId ?? '')?.pourId)
  const pour = its !== undefined && its !== own ? index.pours.get(its) : undefined
  const hardware = [...new Set([anchor, other].map((one) => hardwareOf(index, one).name))]
  return [
    ...(hardware.length > 1 ? [`Two kinds of hardware, ${hardware.join(' and ')}: the larger spacing counts.`] : []),
    ...(pour ? [`${anchorMark(index, other)} is in pour ${pour.mark}: this counts once both pours are cast.`] : []),
  ]
}

/** Only where they are not: two plates in one place. */
function platesApart({ index, anchor, other }: Pair): Compared[] {
  const clear = faceClearance(plateBox(anchor, hardwareOf(index, anchor)), plateBox(other, hardwareOf(index, other)))
  if (clear > ROUNDING) return []
  return [
    distanceCheck({
      ...headOf(anchor, `Plate to plate of ${anchorMark(index, other)}`),
      notes: ['Seen on the face of the edge the two plates stand in one place.'],
      stage: null,
      limitKind: 'H',
      clause: hardwareClause(hardwareOf(index, anchor), 'plate'),
      demand: clear,
      limit: 0,
      isClearance: true,
      steps: [],
      mend: null,
    }),
  ]
}

// Faces -------------------------------------------------------------------------------------------------------------

/** To the nearest other face always, to further ones where they are short. */
function edgeDistances(index: LayoutIndex, anchor: Anchor, stages: readonly StageDistances[]): Compared[] {
  const faces = facesFromCentre(index, anchor)
  return stages.flatMap(({ stage, edgeAlongMin, clause }) =>
    faces
      .filter(({ distance }, i) => i === 0 || distance < edgeAlongMin - ROUNDING)
      .map(({ name, distance }) =>
        distanceCheck({
          ...headOf(anchor, `Edge distance to ${name}`),
          notes: ['Measured in plan from the centre of the bearing face.'],
          stage,
          limitKind: 'H',
          clause,
          demand: distance,
          limit: edgeAlongMin,
          isClearance: false,
          steps: [],
          mend: mendOfFace(index, anchor, edgeAlongMin - distance),
        }),
      ),
  )
}

// What mends it -----------------------------------------------------------------------------------------------------

/** Away from a face means along the edge to one side or the other: whichever conforms. */
function mendOfFace(index: LayoutIndex, anchor: Anchor, short: number): Compared['mend'] {
  if (short <= ROUNDING) return null
  return movedTo(index, anchor, [anchor.chainage + short, anchor.chainage - short])
}

/** The first of some chainages at which the anchor has its spacing and edge distances to all sides; null where none has. */
function movedTo(index: LayoutIndex, anchor: Anchor, chainages: readonly number[]): Compared['mend'] {
  const value = chainages.find((chainage) => conforms(index, anchor, chainage))
  return value === undefined ? null : { field: 'chainage', value }
}

function conforms(index: LayoutIndex, anchor: Anchor, chainage: number): boolean {
  // An anchor in a pan moves with its pan, in plan.
  if (anchor.edgeId === null) return false
  const { from, to } = found(index.frames, anchor.edgeId, 'edge')
  const half = hardwareOf(index, anchor).plate.width / 2
  if (chainage - half < from || chainage + half > to) return false
  const moved = { ...anchor, chainage }
  const stages = distancesByStage(index, anchor)
  const nearest = facesFromCentre(index, moved)[0]?.distance ?? Infinity
  if (stages.some(({ edgeAlongMin }) => nearest < edgeAlongMin - ROUNDING)) return false
  const reach = largestSpacing(index) + Math.abs(chainage - anchor.chainage)
  return neighboursOf(index, anchor, reach).within.every((other) =>
    stages.every((own) => isApart(moved, other, largerOf(own, distancesByStage(index, other)))),
  )
}

function isApart(
  one: Anchor,
  other: Anchor,
  asked: Pick<StageDistances, 'spacingAlongMin' | 'spacingHeightMin'>,
): boolean {
  return (
    Math.abs(one.chainage - other.chainage) >= asked.spacingAlongMin - ROUNDING ||
    Math.abs(one.height - other.height) >= asked.spacingHeightMin - ROUNDING
  )
}

const hardwareOf = (index: LayoutIndex, anchor: Anchor): Hardware =>
  found(index.hardware, anchor.hardwareId, 'hardware')

const headOf = (anchor: Anchor, name: string) => ({ zoneId: `anchor:${anchor.id}`, family: 'spacing', name }) as const
