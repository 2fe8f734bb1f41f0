/** The smallest distances that hardware asks for, stage by stage where its approval gives several. */

import { found, type LayoutIndex } from './layout-index'
import type { Anchor, Approval, ApprovalStrength, Hardware, Stage } from './model'
import type { Clause } from './step'

type Distances = Pick<ApprovalStrength, 'spacingAlongMin' | 'spacingHeightMin' | 'edgeAlongMin' | 'edgeHeightMin'>

export interface StageDistances extends Distances {
  /** Null where every stage asks for the same. */
  readonly stage: string | null
  readonly clause: Clause
}

/**
 * The line of an approval that holds at a stage: of the lines for the stage's share of force or more, the highest
 * strength not above the stage's. Where the concrete is too weak for every line the lowest counts (that the strength is
 * short is said under bearing); null where no line reaches the share.
 */
export function approvalLine(approval: Approval, stage: Stage): ApprovalStrength | null {
  const lines = approval.strengths.filter((line) => line.share >= stage.share)
  const rising = lines.sort((a, b) => a.strengthMin - b.strengthMin)
  return rising.findLast((line) => line.strengthMin <= stage.strength) ?? rising[0] ?? null
}

/** Distances that an anchor's hardware asks for in the stages of the pour that it is cast with. */
export function distancesByStage(index: LayoutIndex, anchor: Anchor): StageDistances[] {
  const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
  const { stages } = found(index.pours, anchor.castWithPourId, 'pour')
  const perStage = stages.map((stage) => atStage(hardware, stage))
  const [first] = perStage
  if (!first) return []
  return perStage.every((other) => isSame(other, first)) ? [{ ...first, stage: null }] : perStage
}

/** Of two anchors the larger value counts: the other's at the same stage, or at all stages if it has no such stage. */
export function largerOf(own: Omit<StageDistances, 'clause'>, others: readonly StageDistances[]): Distances {
  const sameStage = others.filter((other) => other.stage === own.stage)
  const counted: readonly Distances[] = [own, ...(sameStage.length > 0 ? sameStage : others)]
  const most = (name: keyof Distances) => Math.max(...counted.map((distances) => distances[name]))
  return {
    spacingAlongMin: most('spacingAlongMin'),
    spacingHeightMin: most('spacingHeightMin'),
    edgeAlongMin: most('edgeAlongMin'),
    edgeHeightMin: most('edgeHeightMin'),
  }
}

/** Source of what an item of hardware asks for. */
export function hardwareClause(hardware: Hardware, section: string): Clause {
  return { source: hardware.approval?.reference ?? `Hardware ${hardware.name}`, section, tag: 'read' }
}

function atStage(hardware: Hardware, stage: Stage): StageDistances {
  const line: Distances = (hardware.approval && approvalLine(hardware.approval, stage)) ?? hardware
  const { spacingAlongMin, spacingHeightMin, edgeAlongMin, edgeHeightMin } = line
  const clause = hardwareClause(hardware, 'smallest distances')
  return { stage: stage.name, spacingAlongMin, spacingHeightMin, edgeAlongMin, edgeHeightMin, clause }
}

function isSame(a: Distances, b: Distances): boolean {
  return (
    a.spacingAlongMin === b.spacingAlongMin &&
    a.spacingHeightMin === b.spacingHeightMin &&
    a.edgeAlongMin === b.edgeAlongMin &&
    a.edgeHeightMin === b.edgeHeightMin
  )
}
