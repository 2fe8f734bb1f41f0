import { runInNewContext } from 'node:vm'
import type { Step } from '@wedgeline/engine'

/** What the text of a step may use beside + - * / ( ), numbers and its own values. */
const FUNCTIONS = {
  min: (...values: number[]) => Math.min(...values),
  max: (...values: number[]) => Math.max(...values),
  sqrt: (value: number) => Math.sqrt(value),
  tan: (value: number) => Math.tan(value),
  sin: (value: number) => Math.sin(value),
  cos: (value: number) => Math.cos(value),
  abs: (value: number) => Math.abs(value),
  atan: (value: number) => Math.atan(value),
  exp: (value: number) => Math.exp(value),
  log: (value: number) => Math.log(value),
}

/** Evaluates the printed text of a step with the values printed beside it. */
export function evaluated({ formula, values }: Step): number {
  return Number(runInNewContext(formula, { ...FUNCTIONS, ...values }))
}
