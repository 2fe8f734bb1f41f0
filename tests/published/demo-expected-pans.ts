/** Pans of the demonstration as it was drawn up: mm, and mm2 where it says so. */
export interface ExpectedPan {
  readonly pan: string
  readonly inPlan: number
  readonly alongJack: number
  readonly needed: number
  readonly access: 'within' | 'stop'
  /** Smallest clear height between jack and floor of the recess. */
  readonly underJack: number
  readonly slabBeyond: number
  readonly cutAcross: number
  readonly cutAlong: number
  readonly leftUnder: number
}

const WEST = { needed: 1200, access: 'within', underJack: 19.3, cutAcross: 6, cutAlong: 2, leftUnder: 70 } as const
const P1 = { ...WEST, inPlan: 3400, alongJack: 3476, slabBeyond: 3400 }
const P3 = { ...WEST, inPlan: 1850, alongJack: 1891, slabBeyond: 1600, underJack: 9.3, leftUnder: 60 }

export const EXPECTED_PANS: readonly ExpectedPan[] = [
  { pan: 'PN01', ...P1 },
  { pan: 'PN02', ...P1 },
  { pan: 'PN03', ...P1, inPlan: 700, alongJack: 716, slabBeyond: 700, access: 'stop' },
  { pan: 'PN04', ...P1 },
  { pan: 'PN05', ...P1 },
  { pan: 'PN06', ...P3 },
  { pan: 'PN07', ...P3 },
  { pan: 'PN08', ...P3 },
]

/** Tie behind each of them: 588.8 kN while jacking, at 300 MPa; other rules beside it in kN. */
export const EXPECTED_TIE_BACK = { area: 491, others: ['141.3', '247.3'] }
