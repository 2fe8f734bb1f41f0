/** Strength classes of EN 1992-1-1 Table 3.1 as usual in slabs: cylinder over cube; fck is the cylinder's, MPa. */
export const CONCRETE_CLASSES: readonly { readonly name: string; readonly fckMPa: number }[] = [
  { name: 'C25/30', fckMPa: 25 },
  { name: 'C28/35', fckMPa: 28 },
  { name: 'C30/37', fckMPa: 30 },
  { name: 'C32/40', fckMPa: 32 },
  { name: 'C35/45', fckMPa: 35 },
  { name: 'C40/50', fckMPa: 40 },
  { name: 'C45/55', fckMPa: 45 },
  { name: 'C50/60', fckMPa: 50 },
]

export const OWN_CONCRETE = 'own'

/** Strength of a class by its name; null for concrete of one's own. */
export const fckOf = (name: string): number | null =>
  CONCRETE_CLASSES.find((candidate) => candidate.name === name)?.fckMPa ?? null

const PRACTICE = 'common practice'

/** What is usual for a slab of this kind, and where that comes from. */
export const USUAL = {
  thickness: { range: '180 to 350', source: PRACTICE },
  fck: { range: '25 to 50', source: 'EN 1992-1-1 Table 3.1' },
  cover: { range: '20 to 40', source: 'EN 1992-1-1 4.4.1 by exposure, from memory' },
  firstShare: { range: '25', source: PRACTICE },
  firstStrength: { range: '9 for the first 25 % of the force', source: PRACTICE },
  fullStrength: { range: '22 for the whole force', source: `${PRACTICE}; the hardware's approval decides` },
  aggregate: { range: '10 to 20', source: PRACTICE },
} as const

/** Stages of a new pour: 25 % at 9 MPa and the whole at 22 MPa, as is common practice. */
export const USUAL_STAGES = [
  { name: '25 %', share: 0.25, strengthMPa: 9 },
  { name: 'full', share: 1, strengthMPa: 22 },
] as const
