import { BASIS_SOURCES } from '@wedgeline/engine'
import type { Method } from '../../features/methods/method'
import { capital, familyTitle, methodsByFamily, surenessCounts } from '../../features/methods/method-words'
import { clauseText } from '../../features/checks/words'
import type { Formula } from './collect'
import { MEANINGS, PROOFS } from './proofs-table'

/** A formula with the words and proofs that are kept by hand. */
export function methodOf({ id, symbol, formula, unit, meanings, families, clauses }: Formula): Method {
  const name = `${symbol} = ${formula}`
  const proofs = PROOFS.filter(({ of }) => of.includes(name)).map(({ value, test, name: title }) => ({
    value,
    test,
    name: title,
  }))
  return { id, symbol, meaning: MEANINGS[name] ?? capital(meanings[0] ?? ''), formula, unit, families, clauses, proofs }
}

/** The data of the page in the app. */
export const tableText = (methods: readonly Method[]): string =>
  `import type { Method } from './method'

/** Written by \`npm run methods\` from the steps that the engine makes; never by hand. */
export const METHODS: readonly Method[] = ${JSON.stringify(methods, null, 2)}
`

/** docs/methods.md: the formulas by the family in which each is used first, then factors and readings. */
export function pageText(methods: readonly Method[]): string {
  return [
    '# How it is checked',
    'Written by `npm run methods` from the steps that the engine makes; do not edit it.',
    countText(methods),
    'A clause without words in brackets was read in its source. No code of practice was read in the original print: an ' +
      'engineer compares the clause with the standard before relying on it. Lengths in mm, forces in N, stresses in MPa, ' +
      'angles in rad.',
    ...methodsByFamily(methods).flatMap(({ family, list }) => [`## ${familyTitle(family)}`, formulaTable(list)]),
    '## Factors',
    factorTable(),
    '## Readings',
    'Where a clause is silent or is stretched. An engineer accepts each once for a job.',
    readingTable(),
  ]
    .join('\n\n')
    .concat('\n')
}

function countText(methods: readonly Method[]): string {
  const clauses = methods.flatMap((method) => method.clauses)
  const parts = surenessCounts(clauses).map(({ words, count }) => `${count} ${words}`)
  const bare = methods.filter(({ proofs }) => proofs.length === 0).length
  return `${methods.length} formulas on ${clauses.length} clauses: ${parts.join(', ')}. Without a check value: ${bare}.`
}

const formulaTable = (methods: readonly Method[]): string =>
  table(
    ['what', 'formula', 'source and clause', 'check value', 'test'],
    methods.map(({ symbol, meaning, formula, unit, clauses, proofs }) => [
      meaning,
      `\`${symbol} = ${formula}\`${unit === '' || unit === '-' ? '' : `, ${unit}`}`,
      clauses.map(clauseText).join('<br>'),
      proofs.map(({ value }) => value).join('<br>') || 'none',
      proofs.map(({ test, name }) => `${test.replace(/^tests\//, '')}: ${name}`).join('<br>'),
    ]),
  )

const factorTable = (): string =>
  table(
    ['basis', 'factor', 'recommended', 'may be set', 'source and clause'],
    BASIS_SOURCES.flatMap(({ title, factors }) =>
      factors.map((one) => [
        title,
        one.title,
        `${one.recommended}`,
        `${one.least} to ${one.most}`,
        clauseText(one.clause),
      ]),
    ),
  )

const readingTable = (): string =>
  table(
    ['basis', 'reading', 'what it says', 'where it holds', 'source and clause'],
    BASIS_SOURCES.flatMap((basis) =>
      basis.readings.map(({ title, text, range, clause }) => [basis.title, title, text, range, clauseText(clause)]),
    ),
  )

function table(heads: readonly string[], rows: readonly (readonly string[])[]): string {
  const line = (cells: readonly string[]) => `| ${cells.map((cell) => cell.replaceAll('|', '\\|')).join(' | ')} |`
  return [line(heads), line(heads.map(() => '---')), ...rows.map(line)].join('\n')
}
