import type { Command, SteelData } from '@wedgeline/contract'
import type { ProposedZone } from '@wedgeline/engine'
import { shapeData } from '../quick-edge/proposed-steel'

/** Takes out and puts in what is proposed for some zones; together they are one edit, and one undo. */
export function proposalCommands(zones: readonly ProposedZone[], newId: () => string): Command[] {
  return zones.flatMap(({ removes, adds, place, pourId }) => [
    ...removes.map((id): Command => ({ type: 'remove', table: 'steel', id })),
    ...adds.map((shape): Command => {
      const row: SteelData = {
        id: newId(),
        pourId,
        zone: place,
        shape: shapeData(shape),
        source: 'proposed',
        isLocked: false,
      }
      return { type: 'insert', table: 'steel', row }
    }),
  ])
}
