import type { Clause, Family, Step } from '@wedgeline/engine'

/** A formula as the list of methods holds it; made from the steps of the engine by `npm run methods`. */
export interface Method {
  readonly id: string
  readonly symbol: string
  readonly meaning: string
  readonly formula: string
  readonly unit: string
  /** Where it is used, in the order of the families; bar lengths are in the schedule. */
  readonly families: readonly MethodFamily[]
  readonly clauses: readonly MethodClause[]
  readonly proofs: readonly Proof[]
}

export type MethodFamily = Family | 'schedule'

export interface MethodClause extends Clause {
  /** Bases in which the formula rests on this clause; empty for the schedule, which hangs on no basis. */
  readonly bases: readonly string[]
}

/** What shows that a formula is right: a value from a source, or one worked by hand, and the test that holds it. */
export interface Proof {
  /** Inputs and answer in words, with where they come from. */
  readonly value: string
  readonly test: string
  readonly name: string
}

/** The nth set of bars or the nth mat: another place, not another formula. */
const NUMBERED = /^(As|N|Ncut|Acut)\d+$/
const COUNTED = /\b(N|Acut)\d+\b/g
/** Sums of as many terms as there are sets, mats, bends or anchors, also of one or none. */
const SUMS: Readonly<Record<string, { readonly of: RegExp; readonly formula: string }>> = {
  AsCounted: { of: /^(?:0|As\d+)(?: \+ As\d+)*$/, formula: 'As1 + … + Asn' },
  AsAcross: { of: /^(?:0|As\d+|AsMat)(?: \+ (?:As\d+|AsMat))*$/, formula: 'As1 + … + Asn + AsMat' },
  AsMat: { of: /^m\d+(?: \+ m\d+)*$/, formula: 'm1 + … + mn' },
  Acut: { of: /^Acut\d+(?: \+ Acut\d+)*$/, formula: 'Acut1 + … + Acutn' },
  plan: { of: /^(?:0|bend\d+)(?: \+ bend\d+)*$/, formula: 'θ1 + … + θn' },
  fmin: { of: /^min\(f\d+(?:, f\d+)*\)$/, formula: 'min(f1, …, fn)' },
  fmean: { of: /^\(f\d+(?: \+ f\d+)*\) \/ \d+$/, formula: '(f1 + … + fn) / n' },
  Pjack: { of: /^P\d+(?: \+ P\d+)*$/, formula: 'P1 + … + Pn' },
}

/** A step's formula without what is particular to one place: `As1 + As2` and `As1` are the same sum of sets. */
export function generalForm({ symbol, formula }: Pick<Step, 'symbol' | 'formula'>): {
  readonly symbol: string
  readonly formula: string
} {
  const sum = SUMS[symbol]
  if (sum?.of.test(formula)) return { symbol, formula: sum.formula }
  const head = NUMBERED.exec(symbol)?.[1]
  return head === undefined ? { symbol, formula } : { symbol: `${head}i`, formula: formula.replace(COUNTED, '$1i') }
}

/** A short name of a formula that stays the same as long as its symbol and text do; part of the page's addresses. */
export function methodId(step: Pick<Step, 'symbol' | 'formula'>): string {
  const { symbol, formula } = generalForm(step)
  // FNV-1a, 32 bit: a few hundred texts, and a test sees that no two share a name.
  let hash = 0x811c9dc5
  for (const letter of `${symbol} = ${formula}`) {
    hash = Math.imul(hash ^ (letter.codePointAt(0) ?? 0), 0x01000193) >>> 0
  }
  return hash.toString(36)
}
