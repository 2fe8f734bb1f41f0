import type { SteelShape } from '../model'
import { STEEL_NAMES } from '../steel-names'

/** Steel in a few words: 8 transverse bars H10, 800 long. */
export function inWords(shapes: readonly SteelShape[], letter: string): string {
  return shapes.length === 0 ? 'no steel of its own' : shapes.map((shape) => oneInWords(shape, letter)).join(' and ')
}

function oneInWords(shape: SteelShape, letter: string): string {
  const size = `${letter}${shape.diameter}`
  switch (shape.kind) {
    case 'spiral':
      return `spiral ${size}, ${shape.turns} turns of ${shape.outside} at ${shape.pitch}`
    case 'links':
      return `${shape.count} links ${size}, ${shape.width} by ${shape.height} at ${shape.pitch}`
    case 'hairpins':
      return `${shape.count} ${shape.lies} hairpins ${size}, bend ${shape.bend}, legs ${shape.leg}`
    case 'edge-bars':
      return `${shape.countTop} top and ${shape.countBottom} bottom edge bars ${size}`
    case 'transverse-bars':
    case 'wedge-bars':
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return `${barsOf(shape.count, shape.layers)} ${STEEL_NAMES[shape.kind]} ${size}, ${shape.length} long`
  }
}

const barsOf = (count: number, layers: 'top' | 'bottom' | 'both'): number => (layers === 'both' ? 2 * count : count)
