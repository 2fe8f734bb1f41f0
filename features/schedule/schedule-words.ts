import type { LayoutIndex, Schedule, ScheduleProblem, ScheduleRow } from '@wedgeline/engine'

/** kg and metres with the decimals that a schedule carries. */
export const massText = (kg: number | null): string => (kg === null ? '–' : kg.toFixed(kg < 10 ? 2 : 1))
export const metresText = (metres: number): string => metres.toFixed(1)

/** Mass of all bars of a row; null while its length is not known. */
export const massOf = ({ massEach, total }: ScheduleRow): number | null => (massEach === null ? null : massEach * total)

export interface ProblemLine {
  readonly severity: ScheduleProblem['severity']
  /** What it is about, as people say it. */
  readonly about: string
  readonly message: string
  /** Zone by which it is mended; null where the whole pour is meant. */
  readonly zoneId: string | null
}

/**
 * The problems of a schedule with the zone that each belongs to.
 *
 * @param zoneIds ids of the pour's zones by the names that the schedule gives them.
 */
export function problemLines(
  { problems }: Pick<Schedule, 'problems'>,
  index: LayoutIndex,
  zoneIds: ReadonlyMap<string, string>,
): readonly ProblemLine[] {
  return problems.map(({ severity, mark, where, message }) => {
    const names = where.split(', ')
    const zoneId = names.map((name) => zoneIds.get(name)).find((id) => id !== undefined) ?? null
    const steelId = /^steel (.+)$/.exec(where)?.[1]
    if (steelId !== undefined)
      return { severity, message, about: 'Bars without a place', zoneId: homeOf(index, steelId) }
    if (mark === null) return { severity, message, about: 'The whole pour', zoneId }
    const more = names.length > 3 ? ` and ${names.length - 3} more` : ''
    return { severity, message, about: `Mark ${mark}, ${names.slice(0, 3).join(', ')}${more}`, zoneId }
  })
}

/** The edge that bars without a place were given to, where it is still there. */
function homeOf({ layout, edges }: LayoutIndex, steelId: string): string | null {
  const zone = layout.steel.find(({ id }) => id === steelId)?.zone
  const edgeId = zone?.kind === 'gap' || zone?.kind === 'edge' ? zone.edgeId : null
  return edgeId !== null && edges.has(edgeId) ? `edge:${edgeId}` : null
}
