import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { format, resolveConfig } from 'prettier'
import { sweepLayouts } from '../../tests/engine/sweep-layouts'
import { formulasOf, type Formula } from './collect'
import { methodOf, pageText, tableText } from './page'
import { seenSteps } from './seen-steps'

export const PAGE = at('docs/methods.md')
export const TABLE = at('features/methods/method-table.ts')

export interface Written {
  readonly formulas: readonly Formula[]
  /** What the two files hold when they are up to date. */
  readonly files: readonly { readonly path: string; readonly text: string }[]
}

/** Runs the engine over the sweep's layouts and sets down what it used. */
export async function listMethods(): Promise<Written> {
  const formulas = formulasOf(seenSteps(sweepLayouts()))
  const methods = formulas.map(methodOf)
  const files = await Promise.all([formatted(PAGE, pageText(methods)), formatted(TABLE, tableText(methods))])
  return { formulas, files }
}

async function formatted(path: string, text: string): Promise<Written['files'][number]> {
  return { path, text: await format(text, { ...(await resolveConfig(path)), filepath: path }) }
}

export const isCurrent = ({ path, text }: Written['files'][number]): boolean => readFileSync(path, 'utf8') === text

function at(path: string): string {
  return fileURLToPath(new URL(`../../${path}`, import.meta.url))
}
