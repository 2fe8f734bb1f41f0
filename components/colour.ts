import { Appearance } from 'react-native'
import type { Colour } from './palette'
import { PALETTES } from './palette'

/** Native has no CSS variables: colours are fixed when the app starts. */
export const colour: Readonly<Record<Colour, string>> =
  PALETTES[Appearance.getColorScheme() === 'dark' ? 'dark' : 'light']
