/** Candidates of bars along an edge: a few near top and soffit, behind the bearing faces. */

import { found } from '../layout-index'
import type { EdgeBarsShape } from '../model'
import type { Bench, Place } from './bench'
import { area, upTo, type Candidate } from './candidate'
import { needsOf, unmetOf } from './verdict'

/** Straight bars between two faces of concrete are this much shorter in all (common practice), half of it at each end. */
const DEDUCTION = 40
/** Behind the bearing face, so that the bars pass pocket and plate and lie between the first links, mm. */
const BEHIND_FACE = [30, 55, 80, 105] as const
const PITCHES = [50, 75, 100] as const
/** Bars near each face; more is a beam's cage. */
const EACH_FACE_MAX = 6
/** Edge bars are bars that a person walks on (common practice). */
const DIAMETER_MIN = 10

export function edgeSteel(bench: Bench, { zone }: Place): Candidate[] {
  const { index } = bench.context
  const frame = found(index.frames, zone.edgeId ?? '', 'edge')
  const { coverEdge } = found(index.pours, zone.pourId, 'pour')
  const setBacks = (index.anchorsOfEdge.get(frame.edgeId) ?? []).map(({ setBack }) => setBack)
  const shorts = unmetOf(needsOf(bench.context, zone)).map(({ demand, limit }) => demand - limit)
  const short = shorts.reduce((most, one) => Math.max(most, one), 0)
  if (setBacks.length === 0 || short <= 0) return []
  const ends = { from: frame.from + coverEdge + DEDUCTION / 2, to: frame.to - coverEdge - DEDUCTION / 2 }
  const places = [...new Set(setBacks)].sort((a, b) => a - b)
  return bench.sizes
    .filter(({ diameter }) => diameter >= DIAMETER_MIN)
    .flatMap(({ diameter }) => {
      const fewest = Math.ceil(short / (2 * area(diameter)) - 1e-9)
      return counts(fewest).flatMap((count) =>
        places.flatMap((setBack) =>
          BEHIND_FACE.flatMap((behind) =>
            (count === 1 ? PITCHES.slice(-1) : PITCHES).map((pitch): Candidate => {
              const bars = { diameter, countTop: count, countBottom: count, pitch, first: upTo(setBack + behind, 5) }
              return { shapes: [{ kind: 'edge-bars', ...bars, ...ends } satisfies EdgeBarsShape] }
            }),
          ),
        ),
      )
    })
}

/** Where some of the bars fall outside the reach of a face, more of them may do. */
const counts = (fewest: number): number[] => [fewest, fewest + 1, fewest + 2].filter((count) => count <= EACH_FACE_MAX)
