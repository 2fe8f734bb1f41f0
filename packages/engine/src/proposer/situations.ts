/** Zones that ask for the same steel: looked at once, and given the same bars. */

import type { Zone } from '../result'
import { siteOf } from './anchor-steel'
import { faultsAt, type Bench, type Place } from './bench'
import { needsOf, unmetOf } from './verdict'

export interface Situation {
  readonly example: Place
  /** In the order of the pour's zones. */
  readonly places: readonly Place[]
}

/** Zones of which all needs are met already are in no situation: they need no steel. */
export function situationsOf(bench: Bench, places: readonly Place[]): Situation[] {
  const alike = new Map<string, Place[]>()
  for (const place of places) {
    const key = keyOf(bench, place)
    if (key === null) continue
    const others = alike.get(key)
    if (others) others.push(place)
    else alike.set(key, [place])
  }
  return [...alike.values()].flatMap((all) => (all[0] ? [{ example: all[0], places: all }] : []))
}

/** What a zone's steel hangs on: its needs, what is wrong already, and the concrete round it; null where it needs none. */
function keyOf(bench: Bench, place: Place): string | null {
  const needs = needsOf(bench.context, place.zone)
  if (unmetOf(needs).length === 0) return null
  const asked = needs.map(({ family, name, plane, stage, demand, limit }) => [
    family,
    name,
    plane,
    stage,
    rounded(demand),
    rounded(limit),
  ])
  const faults = [...faultsAt(bench, place)].sort()
  const steel = (bench.context.index.steelOfZone.get(place.zone.id) ?? []).map(({ shape }) => shape)
  return JSON.stringify([place.zone.kind, asked, faults, steel, surroundings(bench, place.zone)])
}

/** To a tenth: what differs by less has the same steel, and each zone is checked by itself in the end. */
const rounded = (value: number): number => Math.round(value * 10) / 10

/** Beyond this a face or another anchor is out of reach of any bar at the anchor, mm. */
const REACH = 2000

function surroundings(bench: Bench, zone: Zone): unknown {
  const site = siteOf(bench, zone)
  if (!site) return [rounded((zone.to ?? 0) - (zone.from ?? 0))]
  const near = (distance: number | null) => Math.min(distance ?? REACH, REACH)
  // Both sides in order of size: a place and its mirror image ask for the same bars.
  const sides = [
    [near(site.halfGapBefore), near(site.toStart)],
    [near(site.halfGapAfter), near(site.toEnd)],
  ].sort((a, b) => (a[0] ?? 0) - (b[0] ?? 0) || (a[1] ?? 0) - (b[1] ?? 0))
  const { anchor, hardware, toTop, toSoffit } = site
  return [hardware.id, anchor.end, anchor.setBack, anchor.elevation, toTop, toSoffit, sides]
}
