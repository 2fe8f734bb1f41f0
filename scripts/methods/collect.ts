import { FAMILIES, type Step } from '@wedgeline/engine'
import { JOB_HARDWARE, JOB_JACK } from '../../features/methods/method-words'
import { generalForm, methodId, type MethodFamily } from '../../features/methods/method'

/** One line of a calculation, as the engine made it somewhere. */
export interface SeenStep {
  readonly family: MethodFamily
  /** Null for the schedule, which hangs on no basis. */
  readonly basis: string | null
  readonly step: Step
}

type MutableClause = { source: string; section: string; tag: Step['clause']['tag']; bases: string[] }

/** A formula, with everything that differs between the places where it was seen. */
export interface Formula {
  readonly id: string
  readonly symbol: string
  readonly formula: string
  readonly unit: string
  readonly meanings: readonly string[]
  readonly families: readonly MethodFamily[]
  readonly clauses: readonly MutableClause[]
  /** The texts in the source that it was seen with, before they were made general. */
  readonly texts: readonly string[]
}

const ORDER: readonly MethodFamily[] = [...FAMILIES, 'schedule']

/** The formulas among the steps, each once, in the order of the families and then as they were first seen. */
export function formulasOf(seen: Iterable<SeenStep>): readonly Formula[] {
  const found = new Map<string, ReturnType<typeof started>>()
  for (const one of seen) {
    const id = methodId(one.step)
    const formula = found.get(id) ?? started(id, one.step)
    found.set(id, formula)
    formula.meanings.add(one.step.meaning)
    formula.families.add(one.family)
    formula.texts.add(one.step.formula)
    addClause(formula.clauses, one)
  }
  const formulas = [...found.values()].map((one) => ({
    ...one,
    meanings: [...one.meanings],
    families: ORDER.filter((family) => one.families.has(family)),
    texts: [...one.texts],
  }))
  const place = ({ families }: Formula) => Math.min(...families.map((family) => ORDER.indexOf(family)))
  return formulas.sort((a, b) => place(a) - place(b))
}

const started = (id: string, step: Step) => ({
  id,
  ...generalForm(step),
  unit: step.unit,
  meanings: new Set<string>(),
  families: new Set<MethodFamily>(),
  clauses: [] as MutableClause[],
  texts: new Set<string>(),
})

function addClause(clauses: MutableClause[], { basis, step: { clause } }: SeenStep): void {
  const source = generalSource(clause.source)
  const same = clauses.find((one) => one.source === source && one.section === clause.section)
  const entry = same ?? { ...clause, source, bases: [] }
  if (!same) clauses.push(entry)
  if (basis !== null && !entry.bases.includes(basis)) entry.bases.push(basis)
}

/** Hardware and jacks are a job's own: the list of methods says so in place of their names. */
function generalSource(source: string): string {
  if (source.startsWith('Jack ')) return JOB_JACK
  const isHardware = source.startsWith('Hardware ') || source.startsWith('INVENTED-')
  return isHardware ? JOB_HARDWARE : source
}
