const NAMES = ['north', 'north-east', 'east', 'south-east', 'south', 'south-west', 'west', 'north-west'] as const

/** A direction in plan in words: x east, y north. */
export function compass({ x, y }: { readonly x: number; readonly y: number }): string {
  const eighths = Math.round(Math.atan2(x, y) / (Math.PI / 4))
  return NAMES[(eighths + 8) % 8] ?? 'north'
}
