/**
 * The boundary between what crosses the wire or a file, where every name ends in its unit, and the engine, which
 * works in N, mm, MPa and rad and needs no unit in a name.
 */

const TO_RADIANS = Math.PI / 180

/** Longest first, so that `Mm2` is not read as `Mm`. */
const UNITS = [
  ['Mm2', 1],
  ['MPa', 1],
  ['Deg', TO_RADIANS],
  ['Mm', 1],
  ['KN', 1000],
  ['PerM', 1e-3],
  ['Kg', 1],
] as const

type Bare<K> = K extends `${infer Name}Mm2`
  ? Name
  : K extends `${infer Name}MPa`
    ? Name
    : K extends `${infer Name}Deg`
      ? Name
      : K extends `${infer Name}Mm`
        ? Name
        : K extends `${infer Name}KN`
          ? Name
          : K extends `${infer Name}PerM`
            ? Name
            : K extends `${infer Name}Kg`
              ? Name
              : K

/** `T` with the unit taken off every name, all the way down. */
type Si<T> = T extends readonly (infer Item)[]
  ? readonly Si<Item>[]
  : T extends object
    ? { readonly [K in keyof T as Bare<K>]: Si<T[K]> }
    : T

/** Converts data whose names end in Mm, Mm2, MPa, KN, PerM, Kg or Deg into mm, mm2, MPa, N, 1/mm, kg and rad, with bare names. */
export function toSi<T>(data: T): Si<T> {
  return convert(data) as Si<T>
}

/** Rows stay the same objects until they are changed: each is converted once, and a table whose rows all are, once. */
const converted = new WeakMap<object, unknown>()

function convert(data: unknown): unknown {
  if (data === null || typeof data !== 'object') return data
  const known = converted.get(data)
  if (known !== undefined) return known
  const made = Array.isArray(data)
    ? data.map(convert)
    : Object.fromEntries(Object.entries(data).map(([key, value]) => renamed(key, value)))
  converted.set(data, made)
  return made
}

function renamed(key: string, value: unknown): [string, unknown] {
  const unit = UNITS.find(([suffix]) => key.endsWith(suffix))
  if (!unit) return [key, convert(value)]
  const [suffix, factor] = unit
  return [key.slice(0, -suffix.length), typeof value === 'number' ? value * factor : convert(value)]
}
