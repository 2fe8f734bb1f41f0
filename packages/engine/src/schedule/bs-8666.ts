import type { Clause } from '../step'
import type { BarSize, BarStandard } from './bar-standards'
import { shapes2005, shapes2020 } from './shapes'

/** BS 8666, by edition. No table was read in the original print; each edition says so in its provenance. */

/** d, r, M, P in general, P for links, smallest overall between two bends. Agreeing copies of Table 2 of 2005. */
const BENDS_2005 = [
  [6, 12, 24, 110, 110, 60],
  [8, 16, 32, 115, 115, 80],
  [10, 20, 40, 120, 130, 100],
  [12, 24, 48, 125, 160, 120],
  [16, 32, 64, 130, 210, 160],
  [20, 70, 140, 190, 290, 260],
  [25, 87, 175, 240, 365, 325],
  [32, 112, 224, 305, 465, 416],
  [40, 140, 280, 380, 580, 520],
] as const

/** d, area mm2, kg/m. BS 4449; the table is used, not 0.00785 A (10 mm: 0.6165 computed, 0.616 printed). */
const MASSES = new Map<number, readonly [number, number]>([
  [6, [28.3, 0.222]],
  [8, [50.3, 0.395]],
  [10, [78.5, 0.616]],
  [12, [113.1, 0.888]],
  [16, [201.1, 1.579]],
  [20, [314.2, 2.466]],
  [25, [490.9, 3.854]],
  [32, [804.2, 6.313]],
  [40, [1256.6, 9.864]],
])

/** Rounding by one voice only: from memory, not read. */
const ROUNDING: Clause = { source: 'BS 8666', section: 'rounding of dimensions and lengths', tag: 'memory' }

const sizes2005: readonly BarSize[] = BENDS_2005.map(([diameter, r, former, endMin, linkEndMin, between]) => {
  const [area, massPerMetre] = MASSES.get(diameter) ?? [0, 0]
  return {
    diameter,
    isPreferred: diameter !== 6,
    area,
    massPerMetre,
    bendRadius: r,
    formerDiameter: former,
    endMin,
    linkEndMin,
    betweenBendsMin: between,
  }
})

/**
 * Two secondary sources give max(5 d, 90) for the straight past the bend in 2020, which raises P to 130 for 12 mm and
 * 140 for 16 mm bars against 125 and 130 printed in 2005. The larger stands: a bar that meets it meets both.
 */
const END_MIN_2020 = new Map([
  [12, 130],
  [16, 140],
])
const sizes2020: readonly BarSize[] = sizes2005.map((size) => ({
  ...size,
  endMin: END_MIN_2020.get(size.diameter) ?? size.endMin,
}))

const rounding = { dimensionStep: 5, lengthStep: 25, roundingClause: ROUNDING }

const FROM_MEMORY =
  'From memory: dimensions to the nearest 5 mm, lengths up to the next 25 mm, stock length 12 m, shorter side of a bent bar up to 2750 mm, type letters, order of columns.'
const MASSES_READ = 'Masses per metre and areas are those of BS 4449, from agreeing published copies.'

export const BS_8666_2005: BarStandard = {
  id: 'bs-8666-2005',
  name: 'BS 8666:2005',
  sizes: sizes2005,
  shapes: shapes2005,
  ...rounding,
  provenance: [
    'No table of BS 8666:2005 was read in the original print. Compare with the standard before relying on a shape.',
    'Bend data and lengths are those of BS 8666:2005, Tables 2 and 3, from agreeing published copies.',
    FROM_MEMORY,
    MASSES_READ,
  ],
}

export const BS_8666_2020: BarStandard = {
  id: 'bs-8666-2020',
  name: 'BS 8666:2020',
  sizes: sizes2020,
  shapes: shapes2020,
  ...rounding,
  provenance: [
    'No table of BS 8666:2020 was read in the original print. Compare with the standard before relying on a shape.',
    'Bend radii, smallest ends for links and smallest overall dimensions are those of BS 8666:2005, Table 2, from agreeing published copies.',
    'Smallest ends of 12 and 16 mm bars are 130 and 140 mm, the larger of the 2005 table and the 2020 rule as two secondary sources give it.',
    'Lengths of shapes 00, 11, 12, 13, 15, 21, 25, 26, 31, 33, 41, 44, 51, 63 and 77 are unchanged since 2005 by one secondary source.',
    'Lengths of shapes 22 and 75 differ between the editions and rest on that one source. Shape 47 uses the 2005 form: that of 2020 is not known here.',
    FROM_MEMORY,
    MASSES_READ,
  ],
}

/** The editions that a schedule can be made to, the usual one first; the 2005 table is kept to compare with. */
export const BAR_STANDARDS: readonly BarStandard[] = [BS_8666_2020, BS_8666_2005]

/** @returns the standard with this id, as a job's settings name it; undefined where there is none. */
export const barStandardById = (id: string): BarStandard | undefined =>
  BAR_STANDARDS.find((standard) => standard.id === id)
