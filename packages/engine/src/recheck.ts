/** Checks a pour again after an edit: only zones that the edit can reach are made again. */

import { groupsOfEdge } from './anchor-groups'
import { checkPour, checkZone, contextOf, zonesAsked, type PourAsk } from './check-pour'
import { longestReach, membersBeside } from './fit/members'
import { found, indexAfter, layoutIndex, type LayoutIndex } from './layout-index'
import { carryOver } from './memo'
import type { Layout, Steel } from './model'
import { carryForward, isRowOther } from './recheck/carried'
import { edgeFitIndex, pairsAlong } from './recheck/edge-fit'
import { editOf, isSame, type Changed } from './recheck/edit'
import { keptIndex, type Line } from './recheck/kept'
import { reachesOf } from './recheck/reach'
import { otherTendons } from './recheck/tendons'
import { changedEnds, touchedEdges, type ChangedEnds, type Editing, type TouchedEdge } from './recheck/touched'
import type { Family, PourResult, Zone, ZoneResult } from './result'
import { countStatuses } from './severity'

export interface Checked {
  readonly layout: Layout
  /** Made with the same ask as the new one. */
  readonly result: PourResult
}

/**
 * The same as `checkPour` of the layout after an edit; zones that the edit cannot reach keep their results.
 *
 * Anchors at edges, tendons, and the steel of anchors and gaps are followed. Where anything else differs all zones are
 * made again.
 * @throws as `checkPour` does.
 */
export function recheck(before: Checked, after: Layout, ask: PourAsk): PourResult {
  const isSameAsk = before.result.pourId === ask.pourId
  const edit = isSameAsk ? editOf(before.layout, after) : null
  if (edit === null || edit.steel.some(isFeltElsewhere)) return checkPour(after, ask)
  const isInPan = edit.anchors.some((change) => [change.before, change.after].some((row) => row && row.panId !== null))
  if (isInPan) return checkPour(after, ask)
  const was = layoutIndex(before.layout)
  const index = indexAfter(was, after)
  if (isOtherBeside(was, index)) return checkPour(after, ask)
  const editing = { was, index, edit, reaches: reachesOf(before.layout, after) }
  return remade({ editing, ends: changedEnds(editing), before, ask }) ?? checkPour(after, ask)
}

/** Bars along a whole edge, round a pan and across a joint. */
const isFeltElsewhere = ({ before, after }: Changed<Steel>): boolean =>
  [before, after].some((row) => row !== null && row.zone.kind !== 'anchor' && row.zone.kind !== 'gap')

/** Whether other members than before lie beside one another, since something now reaches further or less far. */
function isOtherBeside(was: LayoutIndex, index: LayoutIndex): boolean {
  if (longestReach(was) === longestReach(index)) return false
  const { edges, pans, joints } = index.layout
  const keys = [
    ...edges.map(({ id }) => `edge:${id}`),
    ...pans.map(({ id }) => `pan:${id}`),
    ...joints.map(({ id }) => `joint:${id}`),
  ]
  return keys.some((key) => !isSame(membersBeside(was, key), membersBeside(index, key)))
}

interface Remaking {
  readonly editing: Editing
  readonly ends: ChangedEnds
  readonly before: Checked
  readonly ask: PourAsk
}

/** Null where a zone that should stand as it stood does not. */
function remade({ editing, ends, before, ask }: Remaking): PourResult | null {
  const { pourId, edgeId, withSteps = false } = ask
  const { was, index, reaches } = editing
  const touched = touchedEdges(editing, ends).map((one) => (isRowOther(editing, one.edge.id) ? whole(index, one) : one))
  const joints = touchedJoints(editing, touched)
  const lines = linesOf(index, { pourId, joints })
  const kept = keptIndex(index, { touched, reaches, lines: [], isForFit: false })
  const fit = keptIndex(index, { touched, reaches, lines, isForFit: true })
  carryForward({ was, index, kept, touched, tendonIds: ends.tendonIds })
  const tendonIds = new Set([...ends.tendonIds, ...otherTendons(editing, { touched, pourId })])
  const isTouched = touchedBy({ touched, joints, tendonIds })
  const known = new Map(before.result.zones.map((result) => [result.zone.id, result]))
  const fittedEdges = new Set(touched.flatMap((one) => (one.fitted.size > 0 ? [`edge:${one.edge.id}`] : [])))
  carryOver(pairsAlong, { from: was, to: index, isAsBefore: (key) => !fittedEdges.has(key) })
  const check = checker({ was, index, kept: fit }, { withSteps, touched, areLapsFelt: areLapsFelt(editing) })
  const zones: ZoneResult[] = []
  for (const zone of zonesAsked(index, { pourId, edgeId })) {
    const result = known.get(zone.id)
    const isAsItWas = result !== undefined && isSame(result.zone, zone)
    if (isTouched(index, zone)) zones.push(check(zone, isAsItWas ? result : undefined))
    else if (isAsItWas) zones.push(result)
    else return null
  }
  const counts = countStatuses(zones.flatMap(({ checks }) => checks))
  return { pourId, basis: before.result.basis, zones, counts }
}

function whole(index: LayoutIndex, one: TouchedEdge): TouchedEdge {
  const { edge, gaps } = one
  const { from, to } = found(index.frames, edge.id, 'edge')
  const anchors = index.anchorsOfEdge.get(edge.id) ?? []
  const ends = anchors.map(({ chainage }) => chainage)
  return {
    ...one,
    spreadAlone: new Set(),
    anchorIds: new Set(anchors.map(({ id }) => id)),
    gapIds: new Set(gaps.map(({ id }) => id)),
    ranges: [{ from: Math.min(from, ...ends), to: Math.max(to, ...ends) }],
  }
}

/** Joints on the line of a touched edge; all of them where tendons began, ended or changed. */
function touchedJoints({ index, edit }: Editing, touched: readonly TouchedEdge[]): ReadonlySet<string> {
  const isOther =
    edit.tendons.length > 0 ||
    edit.anchors.some(({ before, after }) => before?.tendonId !== after?.tendonId || before?.edgeId !== after?.edgeId)
  const lines = new Set(touched.map(({ edge }) => edge.edgeLineId))
  const joints = index.layout.joints.filter(({ edgeLineId }) => isOther || lines.has(edgeLineId))
  return new Set(joints.map(({ id }) => id))
}

/** Where what stands in a pan or across a joint is fitted again, everything round it is kept. */
function linesOf(
  index: LayoutIndex,
  { pourId, joints }: { readonly pourId: string; readonly joints: ReadonlySet<string> },
): Line[] {
  const pans = (index.pansOfPour.get(pourId) ?? []).map((pan): Line => [pan, pan])
  const across = index.layout.joints
    .filter(({ id }) => joints.has(id))
    .flatMap(({ edgeLineId }) => index.edgesOfLine.get(edgeLineId) ?? [])
    .map(({ id }): Line => {
      const { from, to, pointAt } = found(index.frames, id, 'edge')
      return [pointAt(from, 0), pointAt(to, 0)]
    })
  return [...pans, ...across]
}

interface Touches {
  readonly touched: readonly TouchedEdge[]
  readonly joints: ReadonlySet<string>
  readonly tendonIds: ReadonlySet<string>
}

const idOf = (zone: Zone): string => zone.id.slice(zone.id.indexOf(':') + 1)

function touchedBy({ touched, joints, tendonIds }: Touches): (index: LayoutIndex, zone: Zone) => boolean {
  const anchorIds = new Set(touched.flatMap((one) => [...one.anchorIds]))
  const gapIds = new Set(touched.flatMap((one) => [...one.gapIds]))
  const edgeIds = new Set(touched.map(({ edge }) => edge.id))
  const changedIds = new Set(
    touched.flatMap(({ edge, fitted, anchorIds: own }) => (fitted.size + own.size > 0 ? [edge.id] : [])),
  )
  return (index, zone) => {
    switch (zone.kind) {
      case 'anchor':
        return zone.panId !== null || anchorIds.has(idOf(zone))
      case 'gap':
        return gapIds.has(zone.id)
      case 'group':
        return groupsOfEdge(index, zone.edgeId ?? '').some(
          ({ id, members }) => id === zone.id && members.some(({ anchor }) => anchorIds.has(anchor.id)),
        )
      case 'edge':
        return changedIds.has(zone.edgeId ?? '')
      case 'strip':
        return edgeIds.has(zone.edgeId ?? '')
      case 'tendon':
        return tendonIds.has(idOf(zone))
      case 'joint':
        return joints.has(idOf(zone))
      case 'corner':
        return (index.edgesOfPour.get(zone.pourId) ?? []).some(({ id }) => edgeIds.has(id))
      case 'pan':
      case 'pour':
        return true
    }
  }
}

interface Indexes {
  readonly was: LayoutIndex
  readonly index: LayoutIndex
  readonly kept: LayoutIndex
}

/** Laps of bars along an edge keep clear of plates and local steel: only where these stand, and how wide they are, counts. */
const areLapsFelt = ({ edit }: Editing): boolean =>
  edit.steel.length > 0 ||
  edit.anchors.some(({ before, after }) => {
    const [one, other] = [before, after].map((row) => row && [row.edgeId, row.chainage, row.hardwareId].join(' '))
    return one !== other
  })

/**
 * Fit is worked out from what is kept round the touched places, everything else from the whole with what is carried over.
 * Away from a change a zone keeps its fit, and a gap that only the spread of tendons comes to all but its wedge.
 */
function checker(
  indexes: Indexes,
  of: { readonly withSteps: boolean; readonly touched: readonly TouchedEdge[]; readonly areLapsFelt: boolean },
): (zone: Zone, before: ZoneResult | undefined) => ZoneResult {
  const { withSteps, touched, areLapsFelt: withLaps } = of
  const [context, near] = [contextOf(indexes.index), contextOf(indexes.kept)]
  const fitted = new Set(touched.flatMap((one) => [...one.fitted]))
  const fittedEdges = new Set(touched.flatMap((one) => (one.fitted.size > 0 ? [one.edge.id] : [])))
  const spreadAlone = new Set(touched.flatMap((one) => [...one.spreadAlone]))
  const isFitted = ({ id, kind, edgeId, panId }: Zone): boolean => {
    if (kind === 'edge') return fittedEdges.has(edgeId ?? '')
    return panId !== null || (kind !== 'anchor' && kind !== 'gap') || fitted.has(id)
  }
  return (zone, before) => {
    const along = zone.kind === 'edge' && isFitted(zone) ? { ...near, index: edgeFitIndex(indexes, zone.id) } : near
    const isMadeAgain = (family: Family): boolean => {
      if (family === 'fit') return isFitted(zone)
      if (zone.kind === 'edge' && family === 'anchorage') return withLaps
      return !spreadAlone.has(zone.id) || family === 'edge-wedge' || family === 'anchorage'
    }
    const standing = before && { result: before, isMadeAgain }
    return checkZone((family) => (family === 'fit' ? along : context), { zone, withSteps, standing })
  }
}
