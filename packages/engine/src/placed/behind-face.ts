/** Local steel behind a bearing face: spirals, closed links, hairpins. */

import type { LocalPoint } from '../frame'
import type { HairpinShape, LinksShape, SpiralShape } from '../model'
import { about, evenly, type Drawn, type SpiralTurn } from './bar'

/** A place from a bearing face: along the edge, behind the face along the tendon, and up, mm. */
export type FromFace = (across: number, behind: number, up: number) => LocalPoint

/** Centre of a bearing face and the turn of its tendon, rad: `lean` in plan towards growing chainage going inward. */
interface FaceSeat {
  readonly chainage: number
  readonly setBack: number
  readonly height: number
  readonly lean: number
  readonly elevation: number
}

/** Straight pieces that draw one turn of a spiral. */
const PIECES_PER_TURN = 24

/** Behind runs in along the tendon: it leans in plan with the skew and falls with the outward elevation. */
export function fromFaceOf({ chainage, setBack, height, lean, elevation }: FaceSeat): FromFace {
  const [sinLean, cosLean] = [Math.sin(lean), Math.cos(lean)]
  const [sinUp, cosUp] = [Math.sin(elevation), Math.cos(elevation)]
  return (across, behind, up) => ({
    chainage: chainage + across * cosLean + behind * sinLean * cosUp + up * sinLean * sinUp,
    depth: setBack - across * sinLean + behind * cosLean * cosUp + up * cosLean * sinUp,
    height: height - behind * sinUp + up * cosUp,
  })
}

/** Flat turns first and last, in equal number with the odd one last; between them the turns at the pitch. */
export function turnsOf({ turns, flatTurns, first, pitch }: SpiralShape): SpiralTurn[] {
  const active = Math.max(0, turns - flatTurns)
  const flatFirst = Math.floor(flatTurns / 2)
  const flat = (behind: number, count: number) => Array.from({ length: count }, () => ({ behind, isFlat: true }))
  return [
    ...flat(first, flatFirst),
    ...Array.from({ length: active }, (_, i) => ({ behind: first + (i + 0.5) * pitch, isFlat: false })),
    ...flat(first + active * pitch, flatTurns - flatFirst),
  ]
}

/** A helix that rises by its pitch in each turn between flat ends. */
export function spiral(shape: SpiralShape, at: FromFace): Drawn {
  const radius = (shape.outside - shape.diameter) / 2
  const turns = turnsOf(shape)
  const points = turns.flatMap((turn) =>
    Array.from({ length: PIECES_PER_TURN }, (_, i) => {
      const share = i / PIECES_PER_TURN
      const behind = turn.isFlat ? turn.behind : turn.behind + (share - 0.5) * shape.pitch
      const angle = share * 2 * Math.PI
      return at(radius * Math.cos(angle), behind, radius * Math.sin(angle))
    }),
  )
  const last = turns.at(-1)
  const end = last ? [at(radius, last.isFlat ? last.behind : last.behind + shape.pitch / 2, 0)] : []
  return { path: [...points, ...end], turns }
}

/** The centre line without its hooks: at the closing corner, which the fixer chooses, they lie beside it. */
export function links({ count, first, pitch, width, height, diameter }: LinksShape, at: FromFace): Drawn[] {
  const [across, up] = [(width - diameter) / 2, (height - diameter) / 2]
  return evenly(count, first, pitch).map((behind) => ({
    path: [at(-across, behind, -up), at(across, behind, -up), at(across, behind, up), at(-across, behind, up)],
    isClosed: true,
  }))
}

/** `first` reaches the outside of the bend; legs are measured from there. Several stand centred on the anchor. */
export function hairpins({ count, first, pitch, leg, bend, diameter, lies }: HairpinShape, at: FromFace): Drawn[] {
  const half = (bend - diameter) / 2
  const [atBend, atEnd] = [first + diameter / 2, first + leg]
  return about(0, count, pitch).map((offset) => {
    const side = (sign: 1 | -1, behind: number) =>
      lies === 'upright' ? at(offset, behind, sign * half) : at(sign * half, behind, offset)
    return { path: [side(1, atEnd), side(1, atBend), side(-1, atBend), side(-1, atEnd)] }
  })
}
