import type { z } from 'zod'

/** What zod finds wrong, in the words of somebody who fills in the file. */

type Issue = z.core.$ZodRawIssue

const UNITS = [
  ['Mm2', 'mm2'],
  ['MPa', 'MPa'],
  ['Deg', 'degrees'],
  ['Mm', 'mm'],
  ['KN', 'kN'],
  ['Hours', 'hours'],
  ['Ms', 'milliseconds since 1970'],
] as const

/** Message for an issue whose schema brings none of its own. */
export function wording(issue: Issue): string | undefined {
  switch (issue.code) {
    case 'invalid_type':
      return wrongType(issue)
    case 'too_small':
      return `${shown(issue.input)}must be ${issue.inclusive ? '' : 'more than '}${issue.minimum}${issue.inclusive ? ' or more' : ''}${sizeOf(issue)}`
    case 'too_big':
      return `${shown(issue.input)}must be ${issue.inclusive ? 'at most' : 'less than'} ${issue.maximum}${sizeOf(issue)}`
    case 'invalid_value':
      return issue.input === undefined
        ? `is missing; ${oneOf(issue.values)}`
        : `${shown(issue.input)}${oneOf(issue.values)}`
    case 'invalid_union':
      return unionMessage(issue)
    case 'invalid_format':
    case 'unrecognized_keys':
    case 'not_multiple_of':
    case 'invalid_key':
    case 'invalid_element':
    case 'custom':
      return undefined
  }
}

function wrongType(issue: Extract<Issue, { code: 'invalid_type' }>): string {
  const right = `must be ${nounFor(issue.expected, lastName(issue.path ?? []))}`
  const { input } = issue
  if (input === undefined) return `is missing; ${right}`
  if (issue.expected === 'number' || issue.expected === 'int') return wrongNumber(input, right)
  return `${right}, not ${kindOf(input)}`
}

function wrongNumber(input: unknown, right: string): string {
  if (typeof input === 'number') {
    if (Number.isNaN(input)) return `${right}, not the result of a failed sum (NaN)`
    return Number.isFinite(input) ? 'must be a whole number' : `${right}, not infinite`
  }
  if (typeof input !== 'string') return `${right}, not ${kindOf(input)}`
  const isPlain = /^-?\d+(\.\d+)?$/.test(input)
  return isPlain ? `${right}, not text: write ${input} without quotation marks` : `${right} in digits 0 to 9, not text`
}

function nounFor(expected: string, name: string): string {
  const unit = UNITS.find(([suffix]) => name.endsWith(suffix))?.[1]
  switch (expected) {
    case 'number':
      return unit ? `a number of ${unit}` : 'a number'
    case 'int':
      return 'a whole number'
    case 'string':
      return 'text in quotation marks'
    case 'boolean':
      return 'true or false'
    case 'array':
      return 'a list in square brackets'
    case 'object':
      return 'a group of fields in curly brackets'
    default:
      return expected
  }
}

function kindOf(input: unknown): string {
  if (input === null) return 'null'
  if (Array.isArray(input)) return 'a list'
  if (typeof input === 'object') return 'a group of fields'
  if (typeof input === 'boolean') return input ? 'true' : 'false'
  return typeof input === 'string' ? 'text' : 'a number'
}

const lastName = (path: readonly PropertyKey[]): string =>
  String(path.findLast((part) => typeof part === 'string') ?? '')

function sizeOf({ origin }: { readonly origin: string }): string {
  if (origin === 'string') return ' characters long'
  return origin === 'array' ? ' in number' : ''
}

const shown = (input: unknown): string => {
  if (typeof input === 'number') return `${input} is out of range; `
  if (typeof input === 'string') return input.length <= 40 ? `"${input}" will not do; ` : 'this text will not do; '
  return Array.isArray(input) ? `there are ${input.length}; ` : ''
}

const oneOf = (values: readonly unknown[]): string => {
  const words = values.map((value) => JSON.stringify(value))
  return words.length === 1 ? `must be ${words[0]}` : `must be one of ${words.join(', ')}`
}

function unionMessage(issue: Extract<Issue, { code: 'invalid_union' }>): string | undefined {
  if (!('options' in issue) || !Array.isArray(issue.options)) return undefined
  return `must name what it is: ${oneOf(issue.options)}`
}
