/** Candidates of bars across a construction joint: one set over its whole length, lapped on both sides. */

import { lapOf } from '../checks/crack-steel'
import { found } from '../layout-index'
import type { PlacedBarsShape } from '../model'
import { jointStrips } from '../wedge/joint-strip'
import { contextWith, type Bench, type Place } from './bench'
import { area, downTo, upTo, type Candidate, type Candidates } from './candidate'
import { needsOf, unmetOf } from './verdict'

const LENGTH_STEP = 25
const PITCH_STEP = 5

/** Both pours see the joint; its bars are proposed once, with the pour that is cast first. */
export function jointSteel(bench: Bench, place: Place): Candidates {
  if (place.pourId === place.zone.pourId) return { candidates: setsOf(bench, place), blocked: [] }
  const { mark } = found(bench.context.index.pours, place.pourId, 'pour')
  const by = `proposed with pour ${mark}, which is cast first`
  const unmet = unmetOf(needsOf(bench.context, place.zone))
  return { candidates: [], blocked: unmet.map(({ name }) => ({ candidate: 'bars across the joint', check: name, by })) }
}

function setsOf(bench: Bench, place: Place): Candidate[] {
  const { index, basis } = bench.context
  const jointId = place.zone.id.slice('joint:'.length)
  const pour = found(index.pours, place.pourId, 'pour')
  const strips = jointStrips(index, jointId)
  const widest = strips.flatMap(({ lengths }) =>
    lengths.map(({ governing }) => Math.max(governing.first, governing.second)),
  )
  const deepest = widest.reduce((most, depth) => Math.max(most, depth), 0)
  const [from, to] = [place.zone.from ?? 0, place.zone.to ?? 0]
  if (deepest === 0) return []
  const room = to - from - 2 * pour.coverEdge
  return bench.sizes.flatMap(({ diameter }) => {
    const at = { pour, thickness: pour.thickness, cover: pour.coverTop, diameter }
    const lap = lapOf(basis, at, { diameter, layers: 'both' })
    const bars = { diameter, length: upTo(2 * (deepest + lap), LENGTH_STEP), layers: 'both', runs: 'along' } as const
    const across = (pitch: number): PlacedBarsShape => {
      const count = Math.max(1, 1 + Math.floor(room / pitch))
      return { kind: 'lap-bars', ...bars, pitch, count }
    }
    return pitchesFor(bench, place, across).map((pitch) => ({ shapes: [across(pitch)] }))
  })
}

/** What the crack rule asks for hangs on the bar: the check is asked with a sparse set in place. */
function pitchesFor(bench: Bench, place: Place, across: (pitch: number) => PlacedBarsShape): number[] {
  const probe = across(SPARSE)
  const needs = needsOf(contextWith(bench, place, [probe]), place.zone)
  const perMetre = needs.filter(({ unit }) => unit === 'mm2/m').map(({ demand }) => demand)
  const demand = perMetre.reduce((most, one) => Math.max(most, one), 0)
  if (demand === 0) return [SPARSE]
  const pitch = downTo((2 * area(probe.diameter) * 1000) / demand, PITCH_STEP)
  // Within a short length of the joint one bar fewer than on average may stand: closer pitches are tried as well.
  return CLOSER.map((share) => downTo(pitch * share, PITCH_STEP)).filter((one) => one > probe.diameter + bench.clearGap)
}

const SPARSE = 500
const CLOSER = [1, 0.9, 0.8, 0.7, 0.6] as const
