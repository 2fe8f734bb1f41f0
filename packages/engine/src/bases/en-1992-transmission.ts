import { step, type Clause } from '../step'
import type { Transmission, TransmissionInput } from './basis'
import { meanTensile } from './en-1992-anchorage'

/** EN 1992-1-1:2004, 8.10.2.2: from memory. */
const BOND: Clause = { source: 'EN 1992-1-1:2004', section: '8.10.2.2(1) Eq. 8.15', tag: 'memory' }
const LENGTH: Clause = { source: 'EN 1992-1-1:2004', section: '8.10.2.2(2) Eq. 8.16', tag: 'memory' }
const TENSILE: Clause = { source: 'EN 1992-1-1:2004', section: 'Table 3.1, 3.1.6(2)', tag: 'memory' }

/** Strand of 3 or 7 wires, released gradually by the jack, in good bond. */
const STRAND = { etaP1: 3.2, eta1: 1, alpha1: 1, alpha2: 0.19 } as const
const LOWER = 0.8
const UPPER = 1.2

/** Transmission length lpt with lpt1 = 0.8 lpt and lpt2 = 1.2 lpt (8.10.2.2(3)). */
export function transmission(
  { diameter, stress, strength }: TransmissionInput,
  { gammaC, alphaCt }: { readonly gammaC: number; readonly alphaCt: number },
): Transmission {
  const { etaP1, eta1, alpha1, alpha2 } = STRAND
  const fctd = step(
    {
      symbol: 'fctd',
      meaning: 'Design tensile strength at stressing',
      formula: 'alphaCt * 0.7 * fctm / gammaC',
      unit: 'MPa',
      clause: TENSILE,
    },
    { alphaCt, fctm: meanTensile(strength), gammaC },
    (v) => (v.alphaCt * 0.7 * v.fctm) / v.gammaC,
  )
  const fbpt = step(
    { symbol: 'fbpt', meaning: 'Bond stress of the strand', formula: 'etaP1 * eta1 * fctd', unit: 'MPa', clause: BOND },
    { etaP1, eta1, fctd: fctd.value },
    (v) => v.etaP1 * v.eta1 * v.fctd,
  )
  const length = step(
    {
      symbol: 'lpt',
      meaning: 'Transmission length, strand released gradually',
      formula: 'alpha1 * alpha2 * d * sigmaPm0 / fbpt',
      unit: 'mm',
      clause: LENGTH,
    },
    { alpha1, alpha2, d: diameter, sigmaPm0: stress, fbpt: fbpt.value },
    (v) => (v.alpha1 * v.alpha2 * v.d * v.sigmaPm0) / v.fbpt,
  )
  const lower = step(
    { symbol: 'lpt1', meaning: 'Lower value', formula: '0.8 * lpt', unit: 'mm', clause: LENGTH },
    { lpt: length.value },
    (v) => LOWER * v.lpt,
  )
  const upper = step(
    { symbol: 'lpt2', meaning: 'Upper value', formula: '1.2 * lpt', unit: 'mm', clause: LENGTH },
    { lpt: length.value },
    (v) => UPPER * v.lpt,
  )
  return {
    lower: lower.value,
    length: length.value,
    upper: upper.value,
    clause: LENGTH,
    steps: [fctd, fbpt, length, lower, upper],
  }
}
