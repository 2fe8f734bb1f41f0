import type { SteelShape } from '@wedgeline/engine'

const perPosition = (layers: 'top' | 'bottom' | 'both'): number => (layers === 'both' ? 2 : 1)

/** A set of bars in a few words: 4 links 10, 8 of 12 × 1400. Sizes in mm, without a type letter: the grade is the job's. */
export function steelWords(shape: SteelShape): string {
  switch (shape.kind) {
    case 'spiral':
      return `spiral ⌀${shape.outside}, ${shape.turns} turns`
    case 'links':
      return `${shape.count} links ⌀${shape.diameter}`
    case 'hairpins':
      return `${shape.count} hairpins ⌀${shape.diameter}`
    case 'edge-bars':
      return `${shape.countTop} + ${shape.countBottom} ⌀${shape.diameter}`
    case 'transverse-bars':
    case 'wedge-bars':
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return `${shape.count * perPosition(shape.layers)} ⌀${shape.diameter} × ${shape.length}`
  }
}
