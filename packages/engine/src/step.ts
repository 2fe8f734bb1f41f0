/** How sure we are of a rule: read in a source, in a digest, from memory, derived, computed, or a rule of the trade. */
export type Tag = 'read' | 'digest' | 'secondary' | 'memory' | 'memory-unsure' | 'derived' | 'computed' | 'practice'

/** Where a number comes from. */
export interface Clause {
  readonly source: string
  readonly section: string
  readonly tag: Tag
}

/** One line of a calculation, as it is printed: symbol = formula = value unit. */
export interface Step {
  readonly symbol: string
  /** What the symbol is, in trade words. */
  readonly meaning: string
  readonly formula: string
  readonly values: Readonly<Record<string, number>>
  readonly value: number
  readonly unit: string
  readonly clause: Clause
}

/**
 * Computes a step and keeps the text that it was computed from; a test evaluates the text and compares.
 *
 * The text may use + - * / ( ), numbers, the names in `values` and min, max, sqrt, tan, sin, cos, abs, atan, exp, log
 * (natural).
 */
export function step<V extends Record<string, number>>(
  line: Pick<Step, 'symbol' | 'meaning' | 'formula' | 'unit' | 'clause'>,
  values: V,
  compute: (v: V) => number,
): Step {
  const { symbol, meaning, formula, unit, clause } = line
  return { symbol, meaning, formula, values, value: compute(values), unit, clause }
}
