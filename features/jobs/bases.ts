import type { JobData } from '@wedgeline/contract'

interface BasisOption {
  readonly value: JobData['basis']
  readonly label: string
}

/** The bases that a job can begin with. The first screens do without the engine, so the names stand here once more. */
export const BASIS_OPTIONS: readonly [BasisOption, ...BasisOption[]] = [
  { value: 'en-1992', label: 'EN 1992-1-1:2004' },
  { value: 'as-3600', label: 'AS 3600:2018' },
]
