import type { HardwareData } from '../hardware-schema'
import type { LayoutFile } from '../layout'
import type { SteelShapeData } from '../steel-schema'
import { mm, refused, type Path, type Problem } from './problem'

/** Sizes of hardware that contradict one another, approvals that do not grow, and strands. */
export function hardwareProblems(layout: Pick<LayoutFile, 'hardware' | 'strandTypes'>): Problem[] {
  return [
    ...layout.hardware.flatMap((row, i) => problemsOf(row, ['hardware', i])),
    ...layout.strandTypes.flatMap(({ proofLoadKN, breakingLoadKN }, i) =>
      proofLoadKN < breakingLoadKN
        ? []
        : [refused(['strandTypes', i, 'proofLoadKN'], `must be less than the breaking load of ${breakingLoadKN} kN`)],
    ),
  ]
}

function problemsOf(row: HardwareData, path: Path): Problem[] {
  return [
    ...openingProblems(row, path),
    ...(row.kind === 'bonded-splay' ? splayProblems(row, path) : []),
    ...approvalProblems(row, [...path, 'approval', 'strengths']),
    ...(row.localSteel ? shapeProblems(row.localSteel, [...path, 'localSteel']) : []),
  ]
}

function openingProblems({ plate, hole, duct }: HardwareData, path: Path): Problem[] {
  const round = ([['hole', hole] as const, ['duct', duct] as const] as const).flatMap(([name, opening]) =>
    opening && opening.isRound && opening.widthMm !== opening.heightMm
      ? [
          refused(
            [...path, name, 'heightMm'],
            `a round ${name} has one size; must be ${mm(opening.widthMm)} like widthMm`,
          ),
        ]
      : [],
  )
  if (!hole) return round
  const inside = (['widthMm', 'heightMm'] as const).flatMap((side) =>
    hole[side] < plate[side]
      ? []
      : [
          refused(
            [...path, 'hole', side],
            `${mm(hole[side])} does not fit in the plate; must be less than ${mm(plate[side])}`,
          ),
        ],
  )
  return [...round, ...inside]
}

function splayProblems(row: HardwareData, path: Path): Problem[] {
  const problems: Problem[] = []
  if (row.splayLengthMm === null) {
    problems.push(refused([...path, 'splayLengthMm'], 'is missing; a bonded splay needs the length of its splay in mm'))
  }
  if (row.hole) problems.push(refused([...path, 'hole'], 'a bonded splay has no plate and no hole; must be null'))
  if (row.pocket) problems.push(refused([...path, 'pocket'], 'a bonded splay is cast in whole; must be null'))
  if (row.ends !== 'dead')
    problems.push(refused([...path, 'ends'], 'a bonded splay cannot be stressed; must be "dead"'))
  return problems
}

function approvalProblems({ approval }: HardwareData, path: Path): Problem[] {
  const strengths = approval?.strengths ?? []
  return strengths.flatMap((line, i) => {
    const before = strengths[i - 1]
    if (!before) return []
    const problems: Problem[] = []
    if (line.share <= before.share) {
      problems.push(refused([...path, i, 'share'], `${line.share} does not grow from ${before.share}; must be more`))
    }
    if (line.strengthMinMPa <= before.strengthMinMPa) {
      const message = `${line.strengthMinMPa} MPa does not grow from ${before.strengthMinMPa} MPa; more force needs more`
      problems.push(refused([...path, i, 'strengthMinMPa'], message))
    }
    return problems
  })
}

/** Bars that cannot be bent or that would stand in one another. */
export function shapeProblems(shape: SteelShapeData, path: Path): Problem[] {
  const thick = shape.diameterMm
  const more = (key: string, value: number, than: number): Problem[] =>
    value > than ? [] : [refused([...path, key], `${mm(value)} is too small; must be more than ${mm(than)}`)]
  const apart = (pitch: number, count: number): Problem[] =>
    count === 1 || pitch >= thick
      ? []
      : [
          refused(
            [...path, 'pitchMm'],
            `${mm(pitch)} puts bars into one another; must be ${thick} mm, the bar, or more`,
          ),
        ]
  switch (shape.kind) {
    case 'spiral':
      return [
        ...more('outsideMm', shape.outsideMm, 2 * thick),
        ...apart(shape.pitchMm, 2),
        ...(shape.flatTurns < shape.turns
          ? []
          : [refused([...path, 'flatTurns'], `must be fewer than the ${shape.turns} turns in all`)]),
      ]
    case 'links':
      return [
        ...more('widthMm', shape.widthMm, 2 * thick),
        ...more('heightMm', shape.heightMm, 2 * thick),
        ...apart(shape.pitchMm, shape.count),
      ]
    case 'hairpins':
      return [...more('bendMm', shape.bendMm, 2 * thick), ...apart(shape.pitchMm, shape.count)]
    case 'edge-bars':
      return [
        ...more('toMm', shape.toMm, shape.fromMm),
        ...apart(shape.pitchMm, Math.max(shape.countTop, shape.countBottom)),
        ...(shape.countTop + shape.countBottom > 0
          ? []
          : [refused([...path, 'countTop'], 'there is no bar at top or soffit; must be 1 or more in one of the two')]),
      ]
    case 'transverse-bars':
      return apart(shape.pitchMm, shape.count)
    case 'wedge-bars':
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return []
  }
}
