import type { Colour } from './palette'
import { COLOURS } from './palette'

/** Names of the variables in public/theme.css, so that a change of theme or printing repaints without rendering. */
export const colour = Object.fromEntries(COLOURS.map((name) => [name, `var(--${name})`])) as Readonly<
  Record<Colour, string>
>
