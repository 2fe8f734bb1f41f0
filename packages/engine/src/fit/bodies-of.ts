/** The bodies that bars must keep clear of: plates, pockets, ducts, recesses, walls, sleeves, column bars. */

import { plateBox, pocketBox, type Box } from '../bodies'
import { leanOf } from '../frame'
import { isInside, signedArea } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import { perIndex } from '../memo'
import type { Anchor, Edge, Hardware, Obstruction, Opening, Pan, Point } from '../model'
import { fromFaceOf, type FromFace } from '../placed/behind-face'
import type { Vec } from '../placed/centre-line'
import { panFrame, type PlanFrame } from '../placed/pan-frame'
import { anchorMark } from '../zones'
import { columnBars } from './column-bars'
import { flatBody, roundBody, spaceOf, type FitBody } from './items'

/** A plate's thickness is not entered: its outer side counts this far outside the bearing face at least, mm. */
const PLATE_LEAST = 10

/** Walls and sleeves reach through the slab whatever its level, mm. */
const THROUGH = 100_000

/** Pocket or plate, and the duct or the strands of the splay, of each anchor at an edge. */
export function bodiesOfEdge(index: LayoutIndex, edge: Edge): FitBody[] {
  const frame = found(index.frames, edge.id, 'edge')
  return (index.anchorsOfEdge.get(edge.id) ?? []).flatMap((anchor) => {
    const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
    const fromFace = fromFaceOf({ ...anchor, lean: leanOf(frame, anchor.skew) })
    return [...atFace(index, { anchor, hardware, frame }), ...behindFace(index, { anchor, hardware, frame, fromFace })]
  })
}

/** The recess of a pan and the duct behind its plate. */
export function bodiesOfPan(index: LayoutIndex, pan: Pan): FitBody[] {
  const frame = panFrame(pan)
  const ducts = (index.anchorsOfPan.get(pan.id) ?? []).flatMap((anchor) => {
    const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
    const fromFace = fromFaceOf({ ...anchor, lean: anchor.skew })
    return behindFace(index, { anchor, hardware, frame, fromFace })
  })
  return [recess(pan, frame, found(index.pours, pan.pourId, 'pour').thickness), ...ducts]
}

/** Walls, sleeves and the upright bars of columns of a level. */
export const bodiesOfLevel = perIndex((index: LayoutIndex, levelId: string): readonly FitBody[] =>
  index.layout.obstructions
    .filter((obstruction) => obstruction.levelId === levelId)
    .flatMap((obstruction): FitBody[] => {
      switch (obstruction.kind) {
        case 'wall':
        case 'sleeve':
          return [throughSlab(obstruction, obstruction.kind)]
        case 'column':
          return columnBars(obstruction)
        case 'opening':
        case 'upstand':
          return []
      }
    }),
)

interface AtAnchor {
  readonly anchor: Anchor
  readonly hardware: Hardware
  readonly frame: PlanFrame
}

function atFace(index: LayoutIndex, { anchor, hardware, frame }: AtAnchor): FitBody[] {
  if (hardware.kind === 'bonded-splay') return []
  const pocket = pocketBox(anchor, hardware)
  const plate = plateBox(anchor, hardware)
  const what = pocket ? 'pocket' : 'plate'
  const box = pocket ?? { ...plate, fromDepth: plate.fromDepth - PLATE_LEAST }
  const ends = { near: corners(frame, box, box.fromDepth), far: corners(frame, box, box.toDepth) }
  return [flatBody(ends, { what, ...nameOf(index, anchor, what) })]
}

const nameOf = (index: LayoutIndex, anchor: Anchor, what: string) => ({
  name: `${what} of ${anchorMark(index, anchor)}`,
  zoneId: `anchor:${anchor.id}`,
})

function corners(frame: PlanFrame, box: Box, depth: number): Vec[] {
  const at = spaceOf(frame)
  return [
    at(box.fromChainage, depth, box.fromHeight),
    at(box.toChainage, depth, box.fromHeight),
    at(box.toChainage, depth, box.toHeight),
    at(box.fromChainage, depth, box.toHeight),
  ]
}

/**
 * The duct over its straight length, from the hole in the plate to its own size; behind a bonded dead end its strands,
 * which come together from the width of the splay to that of the duct at the middle of its height.
 */
function behindFace(index: LayoutIndex, of: AtAnchor & { readonly fromFace: FromFace }): FitBody[] {
  const { anchor, hardware, frame, fromFace } = of
  const at = spaceOf(frame)
  const place: FromSeat = (across, behind, up) => {
    const { chainage, depth, height } = fromFace(across, behind, up)
    return at(chainage, depth, height)
  }
  if (hardware.kind === 'bonded-splay') return splay(index, { anchor, hardware, place })
  const length = anchor.straightBehind ?? hardware.straightBehindMin
  const start = hardware.hole ?? { ...hardware.plate, isRound: false }
  const named = { what: 'duct' as const, ...nameOf(index, anchor, 'duct') }
  return length > 0 ? [duct(place, { start, end: hardware.duct, length }, named)] : []
}

type FromSeat = (across: number, behind: number, up: number) => Vec

function duct(
  place: FromSeat,
  { start, end, length }: { start: Opening; end: Opening; length: number },
  named: Pick<FitBody, 'what' | 'name' | 'zoneId'>,
): FitBody {
  if (start.isRound && end.isRound) {
    return roundBody({ a: place(0, 0, 0), b: place(0, length, 0), from: start.width / 2, to: end.width / 2 }, named)
  }
  const rim = ({ width, height }: Opening, behind: number) => [
    place(-width / 2, behind, -height / 2),
    place(width / 2, behind, -height / 2),
    place(width / 2, behind, height / 2),
    place(-width / 2, behind, height / 2),
  ]
  return flatBody({ near: rim(start, 0), far: rim(end, length) }, named)
}

function splay(
  index: LayoutIndex,
  { anchor, hardware, place }: { anchor: Anchor; hardware: Hardware; place: FromSeat },
): FitBody[] {
  const tendon = found(index.tendons, anchor.tendonId, 'tendon')
  const { diameter } = found(index.strandTypes, tendon.strandTypeId, 'strand type')
  const length = hardware.splayLength ?? hardware.straightBehindMin
  const last = Math.max(1, tendon.strands - 1)
  const named = { what: 'duct' as const, ...nameOf(index, anchor, 'strand') }
  return Array.from({ length: tendon.strands }, (_, i) => {
    const share = tendon.strands > 1 ? i / last - 0.5 : 0
    const across = (width: number) => share * (width - diameter)
    const [a, b] = [place(across(hardware.plate.width), 0, 0), place(across(hardware.duct.width), length, 0)]
    return roundBody({ a, b, from: diameter / 2, to: diameter / 2 }, named)
  })
}

/** Full depth at the plate, rising to nothing at the far end (from memory, unsure). */
function recess(pan: Pan, frame: PlanFrame, thickness: number): FitBody {
  const at = spaceOf(frame)
  const half = pan.across / 2
  const side = (chainage: number) => [
    at(chainage, 0, thickness),
    at(chainage, 0, thickness - pan.depth),
    at(chainage, -pan.along, thickness),
  ]
  return flatBody(
    { near: side(-half), far: side(half) },
    { what: 'recess', name: `recess of ${pan.mark}`, zoneId: `pan:${pan.id}` },
  )
}

/** A wall or sleeve in plan, through the whole depth; in one that is not convex a bar's centre line is looked for. */
function throughSlab({ outline, mark, kind }: Obstruction, what: 'wall' | 'sleeve'): FitBody {
  const named = { what, name: `${kind} ${mark}`, zoneId: null }
  const at = (z: number) => outline.map(({ x, y }) => ({ x, y, z }))
  const whole = flatBody({ near: at(-THROUGH), far: at(THROUGH) }, named)
  if (isConvex(outline)) return whole
  return {
    ...whole,
    clearOf: (piece) => (isInsideSomewhere(outline, [piece.a, piece.b]) ? -piece.radius * 2 : Infinity),
  }
}

function isConvex(outline: readonly Point[]): boolean {
  const area = Math.sign(signedArea(outline))
  return outline.every((corner, i) => {
    const [next, after] = [outline[(i + 1) % outline.length], outline[(i + 2) % outline.length]]
    return !next || !after || Math.sign(signedArea([corner, next, after])) * area >= 0
  })
}

/** Along a piece every so many mm, so that none is missed that stands in a part of the outline. */
const ALONG = 50

function isInsideSomewhere(outline: readonly Point[], [a, b]: readonly [Vec, Vec]): boolean {
  const steps = Math.ceil(Math.hypot(b.x - a.x, b.y - a.y) / ALONG) + 1
  return Array.from({ length: steps + 1 }, (_, i) => i / steps).some((share) =>
    isInside({ x: a.x + share * (b.x - a.x), y: a.y + share * (b.y - a.y) }, outline),
  )
}
