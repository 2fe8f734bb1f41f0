import type { Step } from '@wedgeline/engine'

const FUNCTIONS = ['min', 'max', 'sqrt', 'tan', 'sin', 'cos', 'abs'] as const

/** Evaluates the printed text of a step with the values printed beside it. */
export function evaluated({ formula, values }: Step): number {
  const names = [...FUNCTIONS, ...Object.keys(values)]
  const given = [...FUNCTIONS.map((name) => Math[name]), ...Object.values(values)]
  return new Function(...names, `return ${formula}`)(...given) as number
}
