/** How a person writes fractions; null where the person has not said. */
export type Separator = '.' | ',' | null

/** What a field's text says. */
export type NumberText =
  | { readonly kind: 'empty' }
  | {
      readonly kind: 'number'
      /** In the unit of the field. */
      readonly value: number
      /** Where the text was in another unit or script: the value as it was understood, to be shown. */
      readonly shownAs: string | null
    }
  /** The text can be read in more than one way, and the person is asked which. */
  | { readonly kind: 'ambiguous'; readonly message: string; readonly choices: readonly number[] }
  | { readonly kind: 'unreadable'; readonly message: string }

export interface NumberRules {
  /** Unit of the field; null for a count or a ratio. */
  readonly unit: string | null
  readonly separator: Separator
}

/** Far beyond any length, force or stress of a building; keeps products of several inputs finite. */
export const MAGNITUDE_MAX = 1e12

/** Units that a field may be typed in, by kind of quantity, each with its size in the first one. Exact by definition. */
const QUANTITIES: readonly Readonly<Record<string, number>>[] = [
  { mm: 1, cm: 10, m: 1000, in: 25.4, '"': 25.4, ft: 304.8, "'": 304.8 },
  { mm2: 1, 'mm²': 1, cm2: 100, 'cm²': 100, m2: 1e6, 'm²': 1e6, in2: 645.16, 'in²': 645.16 },
  // 1 lbf = 0.45359237 kg x 9.80665 m/s2; 1 kip = 1000 lbf.
  { N: 1, kN: 1000, MN: 1e6, lbf: 4.4482216152605, kip: 4448.2216152605 },
  // 1 psi = 1 lbf / (25.4 mm)2; 1 ksi = 1000 psi.
  {
    MPa: 1,
    'N/mm2': 1,
    'N/mm²': 1,
    kPa: 0.001,
    GPa: 1000,
    psi: 4.4482216152605 / 645.16,
    ksi: 4448.2216152605 / 645.16,
  },
  { deg: 1, '°': 1, rad: 180 / Math.PI },
  { kg: 1, t: 1000, lb: 0.45359237 },
  { '%': 1 },
]

/** Zeros of the scripts whose digits are read besides 0 to 9: Arabic-Indic, Persian, Devanagari, full width. */
const ZEROS = [0x0660, 0x06f0, 0x0966, 0xff10]

const NUMBER = /^([+-]?)([\d.,' ]*)(e[+-]?\d+)?$/i

/**
 * Reads what somebody typed into a number field. Never throws and never guesses: a text with two meanings is
 * `ambiguous`, and one without a meaning is `unreadable` with what would be right.
 */
export function parseNumber(text: string, rules: NumberRules): NumberText {
  const plain = plainDigits(text).trim()
  if (plain === '') return { kind: 'empty' }
  const [figures, unit] = splitUnit(plain)
  const factor = unit === '' ? 1 : factorBetween(unit, rules.unit)
  if (factor === null) return { kind: 'unreadable', message: wrongUnit(unit, rules.unit) }
  const parts = NUMBER.exec(figures)
  if (!parts || !/\d/.test(parts[2] ?? '')) return { kind: 'unreadable', message: notANumber(text, rules.unit) }
  const readings = readingsOf(parts[2] ?? '', rules.separator)
  if (readings.length === 0) return { kind: 'unreadable', message: notANumber(text, rules.unit) }
  const values = readings.map((reading) => Number(`${parts[1]}${reading}${parts[3] ?? ''}`) * factor)
  return settled(values, { text, rules, isConverted: factor !== 1 || plain !== text.trim() })
}

function settled(values: number[], from: { text: string; rules: NumberRules; isConverted: boolean }): NumberText {
  const { text, rules, isConverted } = from
  if (values.some((value) => !(Math.abs(value) <= MAGNITUDE_MAX))) {
    return {
      kind: 'unreadable',
      message: `“${text.trim()}” is too large for any quantity here. Type a smaller number.`,
    }
  }
  // Minus nought is nought; the last figures that a conversion makes up are cut off.
  const clean = values.map((value) => Number(value.toPrecision(12)) + 0)
  const [value] = clean
  if (value !== undefined && clean.length === 1) {
    return { kind: 'number', value, shownAs: isConverted ? withUnit(value, rules) : null }
  }
  const said = clean.map((each) => withUnit(each, rules)).join(' or ')
  return { kind: 'ambiguous', message: `“${text.trim()}” can be read as ${said}. Which is meant?`, choices: clean }
}

/** A number as a field shows it: plain figures, no grouping, no exponent. */
export function formatNumber(value: number, separator: Separator): string {
  const figures = Number(value.toPrecision(12)).toLocaleString('en-GB', {
    useGrouping: false,
    maximumFractionDigits: 10,
  })
  const plain = figures === '-0' ? '0' : figures
  return separator === ',' ? plain.replace('.', ',') : plain
}

function withUnit(value: number, { unit, separator }: NumberRules): string {
  const figures = formatNumber(value, separator)
  return unit ? `${figures} ${unit}` : figures
}

function plainDigits(text: string): string {
  return text
    .replace(/[\u0660-\u0669\u06f0-\u06f9\u0966-\u096f\uff10-\uff19]/g, (digit) => {
      const code = digit.charCodeAt(0)
      return String(code - (ZEROS.findLast((zero) => zero <= code) ?? code))
    })
    .replace(/\u066b/g, '.')
    .replace(/\u066c/g, "'")
    .replace(/[\u2212\u2010\u2013]/g, '-')
    .replace(/[\u00a0\u2009\u202f]/g, ' ')
    .replace(/\u2019/g, "'")
    .replace(/\u201d|\u2033/g, '"')
    .replace(/\u2032/g, "'")
}

/** The figures and the unit written behind them, if any. */
function splitUnit(plain: string): [string, string] {
  const behind = /^(.*[\d.,])\s*(['"°%]|[a-z].*)$/i.exec(plain)
  const [, figures = '', unit = ''] = behind ?? []
  return !behind || /^e[+-]?\d+$/i.test(unit) ? [plain, ''] : [figures, unit.trim()]
}

/** Size of one unit in the other; null where they do not measure the same thing or are not known. */
function factorBetween(typed: string, wanted: string | null): number | null {
  const quantity = QUANTITIES.find((units) => wanted !== null && wanted in units)
  const from = quantity && (quantity[typed] ?? quantity[typed.toLowerCase()])
  const to = wanted === null ? undefined : quantity?.[wanted]
  return from === undefined || to === undefined ? null : from / to
}

function wrongUnit(typed: string, wanted: string | null): string {
  return wanted
    ? `“${typed}” is not a unit that can be turned into ${wanted}. Type the number in ${wanted}.`
    : `This is a plain number, without a unit. Leave out “${typed}”.`
}

function notANumber(text: string, unit: string | null): string {
  return `“${text.trim()}” cannot be read as a number. Type figures${unit ? ` in ${unit}` : ''}, such as 110.`
}

/** Every plain decimal that the figures may stand for, likeliest first. */
function readingsOf(figures: string, separator: Separator): string[] {
  const bare = withoutGroups(figures, "[' ]")
  if (bare === null) return []
  const points = [...bare].filter((sign) => sign === '.').length
  const commas = [...bare].filter((sign) => sign === ',').length
  if (points + commas === 0) return [bare]
  if (points && commas) return mixed(bare)
  const sign = points ? '.' : ','
  const asGroups = withoutGroups(bare, `[${sign}]`)
  if (points + commas > 1) return asGroups === null ? [] : [asGroups]
  return lone({ bare, sign, asGroups, separator })
}

/** One sign alone: a decimal sign, or a group of three. */
function lone(text: { bare: string; sign: string; asGroups: string | null; separator: Separator }): string[] {
  const { bare, sign, asGroups, separator } = text
  const asDecimal = bare.replace(sign, '.')
  if (separator === sign) return [asDecimal]
  // 0,375 and ,5 cannot be groups; nor can a point that no setting speaks against.
  if (asGroups === null) {
    const isSafe = separator === null && (sign === '.' || /^0?,/.test(bare))
    return isSafe ? [asDecimal] : [asDecimal, bare.replace(sign, '')]
  }
  return separator === null ? [asDecimal, asGroups] : [asGroups]
}

/** Both signs: the last is the decimal sign, the other parts groups of three. */
function mixed(bare: string): string[] {
  const decimal = bare.lastIndexOf('.') > bare.lastIndexOf(',') ? '.' : ','
  const at = bare.lastIndexOf(decimal)
  const whole = withoutGroups(bare.slice(0, at), decimal === '.' ? '[,]' : '[.]')
  return whole === null || whole.includes(decimal) ? [] : [`${whole}.${bare.slice(at + 1)}`]
}

/** The figures with their group signs taken out; null where the signs do not part groups of three. */
function withoutGroups(figures: string, sign: string): string | null {
  const signs = new RegExp(sign, 'g')
  if (!signs.test(figures)) return figures
  const grouped = new RegExp(`^[1-9]\\d{0,2}(${sign}\\d{3})+([.,]\\d*)?$`)
  return grouped.test(figures) ? figures.replace(signs, '') : null
}
