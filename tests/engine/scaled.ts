import type { Layout } from '@wedgeline/engine'

const LENGTHS =
  'x y thickness coverTop coverSoffit coverEdge from to top soffit chainage height setBack straightBehind width ' +
  'depth diameter linkDiameter hook first pitch outside length leg bend spacing along across spacingAlongMin ' +
  'spacingHeightMin edgeAlongMin edgeHeightMin straightBehindMin cover pocketToFaceMin pocketToPocketMin clearGapMin ' +
  'drawIn closedLength stroke strandTail handRoom bodyDiameter noseDiameter noseLength sideRoom roomAbove headroom ' +
  'jackClear'

/** The same layout with its lengths times k and its forces times k^2: every stress stays as it was. */
export const scaled = (of: Layout, k: number): Layout =>
  grown(of, {
    ...Object.fromEntries(LENGTHS.split(' ').map((name) => [name, k])),
    breakingLoad: k ** 2,
    proofLoad: k ** 2,
    area: k ** 2,
    frictionWobble: 1 / k,
    frictionWobbleLow: 1 / k,
    frictionWobbleHigh: 1 / k,
  }) as Layout

function grown(value: unknown, by: Readonly<Record<string, number>>, name = ''): unknown {
  if (typeof value === 'number') return value * (by[name] ?? 1)
  if (Array.isArray(value)) return value.map((item) => grown(item, by, name))
  if (value === null || typeof value !== 'object') return value
  return Object.fromEntries(Object.entries(value).map(([key, item]) => [key, grown(item, by, key)]))
}
