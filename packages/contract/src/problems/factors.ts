import { factorProblems } from '@wedgeline/engine/bases'
import type { LayoutFile } from '../layout'
import { refused, type Problem } from './problem'

/** Factors that the job's basis does not have, or that lie outside their range. */
export function jobFactorProblems({ job }: LayoutFile): Problem[] {
  return factorProblems(job).map(({ at, part, message }) => refused(['job', 'factors', at, part], message))
}
