/** Crack steel where there is no precompression: what the job's choice asks for, and what bars across it give. */

import type { AnchorageInput, Basis, CrackChoice, CrackInput, CrackRule } from '../bases/basis'
import type { EdgeFrame } from '../frame'
import { alongAzimuth, dot } from '../geometry'
import type { JobSettings, MatLayer, Pour } from '../model'
import { bondPlace, type Layers } from '../steel/bond'
import { step, type Clause, type Step } from '../step'
import type { CheckContext } from './outcome'

const GEOMETRY: Clause = { source: 'Geometry of bars', section: 'areas across the edge', tag: 'derived' }
const REACH: Clause = {
  source: 'Common practice',
  section: 'bars reach past the wedge by their anchorage',
  tag: 'practice',
}

/** Bar that a demand is worked out for where none is entered, mm. */
const USUAL_DIAMETER = 12

/** The concrete that may crack, mm. */
export interface CrackPlace {
  readonly pour: Pour
  readonly thickness: number
  /** Concrete face to the surface of the bars. */
  readonly cover: number
  /** Of the bars entered; null where there are none. */
  readonly diameter: number | null
}

export interface CrackDemand {
  readonly choice: CrackChoice
  /** Null where the choice asks for no steel of its own. */
  readonly rule: CrackRule | null
  /** Of the bar that the demand holds for, mm. */
  readonly diameter: number
  readonly notes: readonly string[]
}

/** By the choice that the job accepted, the strongest of several; otherwise by the proposed one, with all side by side. */
export function crackDemand({ index, basis }: CheckContext, place: CrackPlace): CrackDemand {
  const input = inputOf(index.layout.job.settings, place)
  const made = demandsOf.get(basis) ?? new Map<string, CrackDemand>()
  demandsOf.set(basis, made)
  const key = Object.values(input).join()
  const demand = made.get(key) ?? demandFor(basis, input)
  made.set(key, demand)
  return demand
}

/** Most gaps of a job ask for the same: made once for each basis and input. */
const demandsOf = new WeakMap<Basis, Map<string, CrackDemand>>()

function demandFor(basis: Basis, input: CrackInput): CrackDemand {
  const chosen = basis.crackChoices.findLast(({ readingId }) => basis.isAccepted(readingId))
  const choice = chosen ?? proposedChoice(basis)
  const rule = choice.steel(input)
  const { diameter } = input
  if (chosen) return { choice, rule, diameter, notes: [`By the job’s choice: ${lower(choice.title)}.`] }
  const sideBySide = basis.crackChoices.map(({ title, steel }) => {
    const asked = steel(input)
    return `${lower(title)}: ${asked ? `${whole(asked.areaPerMetre)} mm2/m` : 'none'}`
  })
  return {
    choice,
    rule,
    diameter,
    notes: [
      'The job has not chosen how far edge wedges are kept from cracking. Steel of each choice, both faces together, ' +
        `for ${diameter} mm bars. ${sideBySide.join('; ')}. Compared here: ${lower(choice.title)}.`,
    ],
  }
}

function inputOf(settings: JobSettings, { pour, thickness, cover, diameter }: CrackPlace): CrackInput {
  return {
    thickness,
    cover,
    diameter: diameter ?? usualDiameter(settings),
    fck: pour.fck,
    tensile: settings.crackTensile,
    crackWidth: settings.crackWidth,
    compression: settings.crackCompression,
  }
}

/** The job's size nearest to the usual one. */
function usualDiameter({ barSizes }: JobSettings): number {
  const away = (size: number) => Math.abs(size - USUAL_DIAMETER)
  return barSizes.reduce(
    (nearest, size) => (away(size) < away(nearest) ? size : nearest),
    barSizes[0] ?? USUAL_DIAMETER,
  )
}

function proposedChoice({ crackChoices, readings }: Basis): CrackChoice {
  const isProposed = (id: string) => readings.some((reading) => reading.id === id && reading.proposed)
  const choice = crackChoices.find(({ readingId }) => isProposed(readingId)) ?? crackChoices.at(-1)
  if (!choice) throw new Error('A basis offers at least one choice of crack steel.')
  return choice
}

// Bars across ------------------------------------------------------------------------------------------------------

/** A set of like bars that cross a length of an edge, mm. */
export interface BarsAcross {
  readonly diameter: number
  readonly bars: number
  /** How far each reaches beyond the strip without precompression; negative where it ends before. */
  readonly past: number
  /** By which it must reach beyond to count in full. */
  readonly pastNeeded: number
}

export interface SteelAcross {
  /** mm2/m, both faces together. */
  readonly perMetre: number
  readonly steps: readonly Step[]
  readonly notes: readonly string[]
}

/** Area of the bars across and of the mats' spare share, for each metre of the edge. */
export function steelAcross(sets: readonly BarsAcross[], width: number, mats: Step | null): SteelAcross {
  const shares = sets.map(shareOf)
  const areas = sets.map((set, i) => barsStep(set, { width, share: shares[i]?.value ?? 0, at: i + 1 }))
  const parts = [...areas, ...(mats ? [mats] : [])]
  const names = parts.map(({ symbol }) => symbol)
  const sum = step(
    {
      symbol: 'AsAcross',
      meaning: 'Steel across, both faces together',
      formula: names.join(' + ') || '0',
      unit: 'mm2/m',
      clause: GEOMETRY,
    },
    Object.fromEntries(parts.map(({ symbol, value }) => [symbol, value])),
    () => parts.reduce((total, { value }) => total + value, 0),
  )
  return {
    perMetre: sum.value,
    steps: [...shares, ...parts, sum],
    notes: sets.flatMap((set, i) => shortNote(set, shares[i]?.value ?? 0)),
  }
}

function shareOf({ past, pastNeeded }: BarsAcross): Step {
  return step(
    {
      symbol: 'share',
      meaning: 'Share that counts: length past the strip without precompression over the length needed',
      formula: 'max(0, min(1, lPast / lNeed))',
      unit: '-',
      clause: REACH,
    },
    { lPast: past, lNeed: pastNeeded },
    (v) => Math.max(0, Math.min(1, v.lPast / v.lNeed)),
  )
}

function barsStep(
  { bars, diameter }: BarsAcross,
  { width, share, at }: { readonly width: number; readonly share: number; readonly at: number },
): Step {
  return step(
    {
      symbol: `As${at}`,
      meaning: `${bars} bars of ${diameter} mm, for each metre of the edge`,
      formula: 'share * n * Abar * 1000 / w',
      unit: 'mm2/m',
      clause: GEOMETRY,
    },
    { share, n: bars, Abar: (Math.PI * diameter ** 2) / 4, w: width },
    (v) => (v.share * v.n * v.Abar * 1000) / v.w,
  )
}

function shortNote({ diameter, past, pastNeeded }: BarsAcross, share: number): string[] {
  if (share >= 1) return []
  const short = Math.ceil(pastNeeded - past)
  const counted = share > 0 ? `count for ${share.toFixed(2)} of their area` : 'are not counted'
  const where = past >= 0 ? `${whole(past)} past the strip without precompression` : `${whole(-past)} before it ends`
  return [`Bars of ${diameter} mm ${counted}: they end ${where}, ${short} short of the ${whole(pastNeeded)} needed.`]
}

/** The spare share of mat bars that run across an edge; by the square of the cosine where they run at an angle. */
export function spareMats({ mats }: Pour, frame: EdgeFrame): Step | null {
  const across = mats.map((mat) => acrossOf(mat, frame)).filter((area) => area > 0)
  if (across.length === 0) return null
  return step(
    {
      symbol: 'AsMat',
      meaning: 'Spare share of the mats across the edge, both faces together',
      formula: across.map((_, i) => `m${i + 1}`).join(' + '),
      unit: 'mm2/m',
      clause: GEOMETRY,
    },
    Object.fromEntries(across.map((area, i) => [`m${i + 1}`, area])),
    () => across.reduce((sum, area) => sum + area, 0),
  )
}

function acrossOf({ azimuth, diameter, spacing, spareShare }: MatLayer, frame: EdgeFrame): number {
  const cosine = dot(alongAzimuth(azimuth), frame.inward)
  if (cosine ** 2 < 0.5) return 0
  return (spareShare * cosine ** 2 * Math.PI * diameter ** 2 * 1000) / (4 * spacing)
}

interface BarAcross {
  readonly diameter: number
  readonly layers: Layers
}

/** Anchorage past a crack of a straight bar at full stress, in the pour's 28-day concrete, mm. */
export function anchorageOf(basis: Basis, place: CrackPlace, bar: BarAcross): number {
  return basis.anchorage(straightBar(basis, place, bar)).length
}

/** Lap of such a bar where all bars are lapped at one section, mm. */
export function lapOf(basis: Basis, place: CrackPlace, bar: BarAcross): number {
  return basis.lap(straightBar(basis, place, bar), 1)
}

/** The cover of a place is that of its worse face; for the height of a bar at the top the pour's own may be less. */
function straightBar(basis: Basis, { pour, thickness, cover }: CrackPlace, bar: BarAcross): AnchorageInput {
  const covered = { depth: thickness, coverTop: Math.min(cover, pour.coverTop), coverSoffit: cover }
  return {
    diameter: bar.diameter,
    strength: pour.fck,
    stress: basis.barStress,
    cd: null,
    isGoodBond: basis.isGoodBond(bondPlace(covered, bar)),
    isBent: false,
  }
}

const whole = (value: number): string => String(Math.round(value))
const lower = (title: string): string => title.charAt(0).toLowerCase() + title.slice(1)
