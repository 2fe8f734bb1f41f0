/** How a step of a calculation is printed: symbols with their lower letters, and the formula with its numbers put in. */

/** A piece of a formula: words and signs, or a symbol with what stands below the line. */
export interface FormulaPart {
  readonly text: string
  readonly below?: string
}

const FUNCTIONS = new Set(['min', 'max', 'sqrt', 'tan', 'sin', 'cos', 'abs', 'atan', 'exp', 'log'])
const NAME = /[A-Za-z_][A-Za-z0-9_]*/g

const GREEK: Readonly<Record<string, string>> = {
  alpha: 'α',
  beta: 'β',
  gamma: 'γ',
  eta: 'η',
  theta: 'θ',
  lambda: 'λ',
  mu: 'μ',
  pi: 'π',
  rho: 'ρ',
  sigma: 'σ',
  phi: 'φ',
}
const GREEK_NAME = /^(alpha|beta|gamma|eta|theta|lambda|mu|pi|rho|sigma|phi)(?![a-z])/

/** `gammaP` is γ with a P below, `AsCounted` A with s,counted; a whole word stays a word. */
export function symbolPart(name: string): FormulaPart {
  const greek = GREEK_NAME.exec(name)?.[1]
  const base = greek === undefined ? name.slice(0, 1) : (GREEK[greek] ?? greek)
  const rest = name.slice(greek?.length ?? 1)
  if (greek === undefined && /^[a-z]{3,}$/.test(name)) return { text: name }
  if (rest === '') return { text: base }
  const below = greek === undefined ? rest.replace(/(?<=.)([A-Z])/g, ',$1').toLowerCase() : rest
  return { text: base, below: below.replaceAll('_', '') }
}

/** The pieces of a formula as it is printed. */
export function formulaParts(formula: string): readonly FormulaPart[] {
  const parts: FormulaPart[] = []
  let at = 0
  for (const match of formula.matchAll(NAME)) {
    if (match.index > at) parts.push({ text: signs(formula.slice(at, match.index)) })
    parts.push(FUNCTIONS.has(match[0]) ? { text: match[0] } : symbolPart(match[0]))
    at = match.index + match[0].length
  }
  if (at < formula.length) parts.push({ text: signs(formula.slice(at)) })
  return parts
}

/**
 * The formula with its numbers in place of the names; a negative one in brackets, so that signs never meet.
 * @throws where a name has no value: the step would not be the one that was computed.
 */
export function putIn(formula: string, values: Readonly<Record<string, number>>): string {
  const text = formula.replace(NAME, (name) => {
    if (FUNCTIONS.has(name)) return name
    const value = values[name]
    if (value === undefined) throw new Error(`The formula "${formula}" names ${name}, which has no value.`)
    return value < 0 ? `(${figureText(value)})` : figureText(value)
  })
  return signs(text)
}

/**
 * A number to five figures, so that a calculator comes to the same four; whole numbers whole. Thousands stand apart
 * from five figures on.
 */
export function figureText(value: number): string {
  if (Number.isInteger(value) || Math.abs(value) >= 1e5) return signed(grouped(String(Math.round(value))))
  return signed(grouped(String(Number(value.toPrecision(5)))))
}

/** No line breaks within a number. */
const THIN_SPACE = '\u202f'

function grouped(text: string): string {
  const [whole = '', decimals] = text.split('.')
  if (whole.replace('-', '').length < 5) return text
  const apart = whole.replace(/(?<=\d)(?=(\d{3})+$)/g, THIN_SPACE)
  return decimals === undefined ? apart : `${apart}.${decimals}`
}

const signed = (text: string): string => text.replace('-', '−')

const signs = (text: string): string => text.replace(/\s*\*\s*/g, ' × ').replace(/ - /g, ' − ')
