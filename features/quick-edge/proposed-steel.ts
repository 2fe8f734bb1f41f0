import { steelShapeSchema, type LayoutFile, type SteelData, type SteelShapeData } from '@wedgeline/contract'
import type { Proposal, SteelShape } from '@wedgeline/engine'

/** Fields of a shape that count things; every other number is a length. */
const COUNTS: ReadonlySet<string> = new Set(['count', 'countTop', 'countBottom', 'turns', 'flatTurns'])

/** A shape of the engine as the layout file holds it. @throws where the engine names a shape that no file can hold. */
export function shapeData(shape: SteelShape): SteelShapeData {
  const named = Object.entries<unknown>({ ...shape }).map(([key, value]): [string, unknown] =>
    typeof value === 'number' && !COUNTS.has(key) ? [`${key}Mm`, value] : [key, value],
  )
  return steelShapeSchema.parse(Object.fromEntries(named))
}

/** The layout with what is proposed in place; where nothing passes, what was there stays. */
export function withProposal(layout: LayoutFile, { zones }: Proposal, newId: () => string): LayoutFile {
  const applied = zones.filter(({ blocked }) => blocked.length === 0)
  const gone = new Set(applied.flatMap(({ removes }) => removes))
  const added = applied.flatMap(({ adds, place, pourId }) =>
    adds.map((shape): SteelData => ({
      id: newId(),
      pourId,
      zone: place,
      shape: shapeData(shape),
      source: 'proposed',
      isLocked: false,
    })),
  )
  return { ...layout, steel: [...layout.steel.filter(({ id }) => !gone.has(id)), ...added] }
}
