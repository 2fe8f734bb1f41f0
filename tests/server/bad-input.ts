import fc from 'fast-check'

/** Values that people, spreadsheets and attackers put where something else belongs. */
const ODD: readonly unknown[] = [
  ...[null, undefined, true, false, 0, -0, -1, 1.5, NaN, Infinity, -Infinity, 1e308, -1e308, 5e-324, 2 ** 53],
  ...[
    '',
    ' ',
    '0',
    '1,5',
    '1.2 m',
    '١٢٣',
    'NaN',
    '=1+1',
    '@SUM(A1)',
    '+cmd',
    "' or 1=1 --",
    '"; drop table person; --',
  ],
  ...[
    '<script>',
    '../../etc/passwd',
    '\u0000',
    '\ud800',
    '\u202e',
    'é',
    'e\u0301',
    '\ufeff',
    '😀',
    'x'.repeat(100_000),
  ],
  ...[[], {}, [[]], [null], { length: 1 }, { toString: 'x' }, JSON.parse('{"__proto__": {"admin": true}}')],
  ...[{ constructor: { prototype: {} } }, new Date(0), /x/, new Map([['a', 1]]), () => 'x', Symbol('x')],
]
const oddValue = fc.oneof(
  fc.constantFrom(...ODD),
  fc.anything({ maxDepth: 2 }),
  fc.string({ unit: 'binary', maxLength: 80 }),
)

type Path = readonly (string | number)[]

/** Every place in a value, the whole of it first. */
function pathsOf(value: unknown, at: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [at]
  return [at, ...Object.entries(value).flatMap(([key, inner]) => pathsOf(inner, [...at, key]))]
}

function replaced(value: unknown, path: Path, odd: unknown): unknown {
  const [key, ...rest] = path
  if (key === undefined) return odd
  const inner = value as Record<string, unknown>
  const after = replaced(inner[key], rest, odd)
  return Array.isArray(value)
    ? (value as unknown[]).map((item, at) => (String(at) === key ? after : item))
    : { ...inner, [key]: after }
}

function without(value: unknown, path: Path): unknown {
  const [key, ...rest] = path
  if (key === undefined) return undefined
  const inner = value as Record<string, unknown>
  if (rest.length > 0) return replaced(value, [key], without(inner[key], rest))
  if (Array.isArray(value)) return value.filter((_, at) => String(at) !== key)
  return Object.fromEntries(Object.entries(inner).filter(([name]) => name !== key))
}

/** Inputs near a valid one: a value or two of it odd, missing, or beside a key that does not belong; or anything at all. */
export function badInputs(valid: unknown): fc.Arbitrary<unknown> {
  const paths = fc.constantFrom(...pathsOf(valid))
  const oneOdd = fc.tuple(paths, oddValue).map(([path, odd]) => replaced(valid, path, odd))
  const oneMissing = paths.map((path) => without(valid, path))
  const oneMore = fc
    .tuple(fc.constantFrom('companyId', 'personId', 'admin', '__proto__', 'constructor', 'surprise'), oddValue)
    .map(([key, odd]) => Object.defineProperty({ ...(valid as object) }, key, { value: odd, enumerable: true }))
  return fc.oneof({ weight: 5, arbitrary: oneOdd }, { weight: 2, arbitrary: oneMissing }, oneMore, oddValue)
}
