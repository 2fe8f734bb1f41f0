/** Bearing behind the plate of an anchor, at every stage of stressing. */

import { isBonded, nearerFace, whyNoRule, type AnchorSite } from '../anchor-site'
import type { BearingRule } from '../bases/basis'
import { stageForce } from '../force'
import { ROUNDING } from '../geometry'
import { approvalLine, distancesByStage, hardwareClause, largerOf } from '../hardware-distances'
import type { Approval, ApprovalStrength, Hardware, Stage, SteelShape } from '../model'
import type { Check } from '../result'
import type { Clause, Step } from '../step'
import { handSteelOf } from '../steel/steel-of-anchor'
import { atLeast, byRatio, refusal, type CheckContext, type Head } from './outcome'

/** One check a stage; none where strands bond in the concrete and no plate bears. Hardware with an approval answers to the approval alone; a plate without one to the basis. */
export function checkBearing(site: AnchorSite, context: CheckContext): Check[] {
  if (isBonded(site)) return []
  const outside = whyNoRule(site)
  return site.pour.stages.map((stage) => {
    const { approval } = site.hardware
    if (outside)
      return refusal(headOf(site, stage, context.basis.clauses.bearing), { code: 'OUTSIDE_METHOD', ...outside })
    return approval === null
      ? bearingByFormula(site, stage, context)
      : bearingByApproval({ site, stage, context, approval })
  })
}

function headOf(site: AnchorSite, stage: Stage, clause: Clause): Head {
  return {
    zoneId: `anchor:${site.anchor.id}`,
    family: 'bearing',
    name: 'Bearing behind the plate',
    plane: null,
    stage: stage.name,
    limitKind: 'C',
    clause,
    notes: [],
  }
}

// By the basis ------------------------------------------------------------------------------------------------------

function bearingByFormula(site: AnchorSite, stage: Stage, context: CheckContext): Check {
  const head = headOf(site, stage, context.basis.clauses.bearing)
  const { plate } = site.hardware
  if (holeArea(site.hardware) >= plate.width * plate.height) {
    const message = 'The hole takes up the whole plate: no area bears. Enter a plate larger than its hole.'
    return refusal(head, { code: 'OUTSIDE_METHOD', field: 'hardware.hole', message })
  }
  const { rule, steps } = formula(site, stage, context)
  const notes = [
    'The net area gives the pressure, the gross area the ratio of areas.',
    ...rule.notes,
    ...site.force.notes,
    ...recessNotes(site),
  ]
  return byRatio(
    context,
    { ...head, clause: rule.clause, notes },
    { demand: rule.demand, limit: rule.limit, unit: 'MPa', steps, readings: [] },
  )
}

function formula(
  site: AnchorSite,
  stage: Stage,
  { basis }: CheckContext,
): { rule: BearingRule; steps: readonly Step[] } {
  const force = stageForce(site.force.value, stage)
  const { width, height } = freeSpread(site)
  const rule = basis.bearing({
    P: force.value,
    plateWidth: site.hardware.plate.width,
    plateHeight: site.hardware.plate.height,
    holeArea: holeArea(site.hardware),
    widthFree: width,
    heightFree: height,
    strength: stage.strength,
  })
  return { rule, steps: [...site.force.steps, force, ...rule.steps] }
}

/** The wall of a recess ends at its floor, and with it the face that the plate bears on. */
function recessNotes({ pan, toFloor }: AnchorSite): readonly string[] {
  if (pan === null || toFloor === null) return []
  return [`The supporting area ends at the floor of the recess, ${mm(toFloor)} below the anchor's centre.`]
}

function holeArea({ hole }: Hardware): number {
  if (hole === null) return 0
  return hole.isRound ? (Math.PI * hole.width ** 2) / 4 : hole.width * hole.height
}

/**
 * Width and height that the supporting area may take up round the plate's centre: the section, which in a pan's bearing
 * face begins at the floor of the recess, other faces,
 * and a fair share of the distance to each neighbour, beside or above, whichever of the two leaves more.
 */
function freeSpread(site: AnchorSite): { readonly width: number; readonly height: number } {
  const { plate } = site.hardware
  const side = site.sideFace
  let width = side ? 2 * side.distance : 3 * plate.width
  let height = 2 * Math.min(nearerFace(site), site.toFloor ?? Infinity)
  for (const { hardware, along, inHeight } of site.neighbours) {
    const beside = along / ((plate.width + hardware.plate.width) / 2)
    const above = inHeight / ((plate.height + hardware.plate.height) / 2)
    if (beside >= above) width = Math.min(width, beside * plate.width)
    else height = Math.min(height, above * plate.height)
  }
  return { width, height }
}

// By the approval ---------------------------------------------------------------------------------------------------

interface Approved {
  readonly site: AnchorSite
  readonly stage: Stage
  readonly context: CheckContext
  readonly approval: Approval
}

function bearingByApproval({ site, stage, context, approval }: Approved): Check {
  const clause = hardwareClause(site.hardware, 'smallest concrete strength')
  const head: Head = { ...headOf(site, stage, clause), limitKind: 'H', notes: [forInformation(site, stage, context)] }
  const outside = (field: string, condition: string) =>
    refusal(head, { code: 'OUTSIDE_APPROVAL', field, message: `not covered: outside its approval (${condition})` })
  if (site.tendon.strands > site.hardware.strandsMax) {
    return outside('tendon.strands', `${site.tendon.strands} strands, ${site.hardware.strandsMax} at most`)
  }
  const line = approvalLine(approval, stage)
  if (!line) return outside('stage.share', `no strength is given for ${percent(stage.share)} of the force`)
  const [broken] = line.strengthMin <= stage.strength ? brokenConditions({ site, stage, context, approval }, line) : []
  if (broken) return outside(broken.field, broken.condition)
  return atLeast(head, { demand: stage.strength, limit: line.strengthMin, unit: 'MPa', steps: [] })
}

const percent = (share: number): string => `${Math.round(share * 100)} %`
const mm = (length: number): string => String(Math.round(length * 10) / 10)

interface Broken {
  readonly field: string
  readonly condition: string
}

/** The approval's own distances and its local steel, all of which must be met. */
function brokenConditions({ site, stage, context }: Approved, line: ApprovalStrength): readonly Broken[] {
  const broken: Broken[] = []
  const own = { ...line, stage: stage.name }
  for (const { anchor, along, inHeight } of site.neighbours) {
    const { spacingAlongMin, spacingHeightMin } = largerOf(own, distancesByStage(context.index, anchor))
    if (along < spacingAlongMin - ROUNDING && inHeight < spacingHeightMin - ROUNDING) {
      const condition = `spacing ${mm(along)} along the edge, ${mm(spacingAlongMin)} or more`
      broken.push({ field: 'chainage', condition })
      break
    }
  }
  const side = site.sideFace
  if (side && side.distance < line.edgeAlongMin - ROUNDING) {
    const condition = `${mm(side.distance)} to ${side.name}, ${mm(line.edgeAlongMin)} or more`
    broken.push({ field: 'chainage', condition })
  }
  const face = nearerFace(site)
  if (face < line.edgeHeightMin - ROUNDING) {
    const which = site.toSoffit <= site.toTop ? 'soffit' : 'top'
    broken.push({ field: 'height', condition: `${mm(face)} to the ${which}, ${mm(line.edgeHeightMin)} or more` })
  }
  if (!hasTestedSteel(site, context)) {
    broken.push({ field: 'steel', condition: 'its local steel is not as tested' })
  }
  return broken
}

/** Steel of the tested kind entered by hand takes the place of the hardware's own, so it must be the same. */
function hasTestedSteel(site: AnchorSite, { index }: CheckContext): boolean {
  const { localSteel } = site.hardware
  if (localSteel === null || !localSteel.isTested) return true
  const sameKind = handSteelOf(index, site.anchor.id).filter(({ kind }) => kind === localSteel.kind)
  return sameKind.length === 0 || sameKind.some((shape) => isSameShape(shape, localSteel))
}

function isSameShape(shape: SteelShape, tested: NonNullable<Hardware['localSteel']>): boolean {
  const { isTested: _, ...asTested } = tested
  const entries: readonly [string, unknown][] = Object.entries(asTested)
  const given = new Map<string, unknown>(Object.entries(shape))
  return entries.every(([name, value]) => given.get(name) === value)
}

function forInformation(site: AnchorSite, stage: Stage, context: CheckContext): string {
  const { rule } = formula(site, stage, context)
  const [stress, limit] = [rule.demand.toFixed(1), rule.limit.toFixed(1)]
  return (
    `For information, by ${rule.clause.source} ${rule.clause.section}: ${stress} MPa of ${limit} MPa. ` +
    'The approval decides, for it rests on tests.'
  )
}
