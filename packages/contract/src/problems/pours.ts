import type { LayoutFile, PourData } from '../layout'
import { areaOf, crossingSides, repeatedPoint, type Spot } from './outline'
import { mm, refused, type Path, type Problem } from './problem'

/** Outlines, thicknesses, covers, stages and mats of pours; outlines of obstructions. */
export function pourProblems(layout: LayoutFile): Problem[] {
  return [
    ...layout.pours.flatMap((pour, i) => problemsOf(pour, ['pours', i])),
    ...layout.obstructions.flatMap(({ outline }, i) => outlineProblems(outline, ['obstructions', i, 'outline'])),
  ]
}

function problemsOf(pour: PourData, path: Path): Problem[] {
  return [
    ...outlineProblems(pour.outline, [...path, 'outline']),
    ...directionProblems(pour.outline, [...path, 'outline']),
    ...coverProblems(pour, path),
    ...stageProblems(pour, path),
    ...matProblems(pour, path),
    ...pour.regions.flatMap((region, i) => [
      ...outlineProblems(region.outline, [...path, 'regions', i, 'outline']),
      ...topProblems(region, [...path, 'regions', i]),
    ]),
  ]
}

/** A length or region whose top does not stand above its soffit. */
export function topProblems({ topMm, soffitMm }: { topMm: number; soffitMm: number }, path: Path): Problem[] {
  if (topMm > soffitMm) return []
  return [refused([...path, 'topMm'], `${mm(topMm)} is not above the soffit at ${mm(soffitMm)}; must be higher`)]
}

/** Smallest plan area that can be an outline, mm2. */
const AREA_MIN = 1

/** What is wrong with the shape itself, whichever way round it runs. */
function outlineProblems(points: readonly Spot[], path: Path): Problem[] {
  const repeated = repeatedPoint(points)
  if (repeated !== null) {
    return [
      refused([...path, repeated], 'stands on the next corner; leave one of the two out (the last needs no repeat)'),
    ]
  }
  if (points.every((_, i) => i < 2 || Math.abs(areaOfFirst(points, i)) < AREA_MIN)) {
    return [refused(path, 'encloses no area: its corners stand on one line; must enclose the concrete')]
  }
  const crossing = crossingSides(points)
  if (!crossing) return []
  return [
    refused(
      path,
      `crosses itself: the side from corner ${crossing.first + 1} meets the side from corner ${crossing.second + 1}; must not touch itself`,
    ),
  ]
}

const areaOfFirst = (points: readonly Spot[], i: number): number =>
  areaOf([...points.slice(0, 2), ...points.slice(i, i + 1)])

function directionProblems(points: readonly Spot[], path: Path): Problem[] {
  if (areaOf(points) >= 0) return []
  return [refused(path, 'runs clockwise; must run counter-clockwise: list the corners in the opposite order')]
}

function coverProblems(pour: PourData, path: Path): Problem[] {
  const room = pour.thicknessMm - pour.coverTopMm - pour.coverSoffitMm
  if (room > 0) return []
  const covers = `${mm(pour.coverTopMm)} at the top and ${mm(pour.coverSoffitMm)} at the soffit`
  return [
    refused(
      [...path, 'thicknessMm'],
      `${mm(pour.thicknessMm)} leaves no room between covers of ${covers}; must be more than their sum`,
    ),
  ]
}

function stageProblems({ stages }: PourData, path: Path): Problem[] {
  const grow = stages.flatMap((stage, i) => {
    const before = stages[i - 1]
    if (!before) return []
    const at = [...path, 'stages', i]
    const problems: Problem[] = []
    if (stage.share <= before.share) {
      problems.push(refused([...at, 'share'], `${stage.share} does not grow from ${before.share}; must be more`))
    }
    if (stage.strengthMPa < before.strengthMPa) {
      const message = `${stage.strengthMPa} MPa is below the ${before.strengthMPa} MPa of the stage before; must not fall`
      problems.push(refused([...at, 'strengthMPa'], message))
    }
    return problems
  })
  const last = stages.at(-1)
  if (!last || last.share === 1) return grow
  const at = [...path, 'stages', stages.length - 1, 'share']
  return [...grow, refused(at, `${last.share} leaves a part of the force out; the last stage must have share 1`)]
}

function matProblems({ mats }: PourData, path: Path): Problem[] {
  const outer = (['top', 'bottom'] as const).flatMap((face) => {
    const places = mats.flatMap((mat, i) => (mat.face === face && mat.isOuter ? [i] : []))
    const second = places[1]
    if (second === undefined) return []
    return [refused([...path, 'mats', second, 'isOuter'], `the ${face} has two outer layers; only one can be outer`)]
  })
  const spare = mats.flatMap((mat, i) =>
    mat.spareShare > 0 && !mat.spareBy
      ? [refused([...path, 'mats', i, 'spareBy'], 'must name who says that a share of these bars is spare')]
      : [],
  )
  return [...outer, ...spare]
}
