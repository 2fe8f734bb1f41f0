import type { ReactNode } from 'react'
import { createContext, useCallback, useContext, useEffect, useMemo, useState } from 'react'
import { useColorScheme, useWindowDimensions } from 'react-native'
import { keepThemeChoice, paintTheme, storedThemeChoice } from './theme-store'
import type { Scheme } from './palette'

export { colour } from './colour'

/** Steps of 4 px. */
export const space = { xs: 4, s: 8, m: 12, l: 16, xl: 24, xxl: 32 } as const

export const font = { text: 'Barlow', figures: 'Barlow Semi Condensed' } as const

/** A control is at least this high: 32 with a mouse on a wide screen, 48 under a thumb, 56 for a walk's answers. */
export const TARGET = { wide: 32, phone: 48, walk: 56 } as const

/** Width in px from which the wide layout holds. */
export const WIDE_MIN = 900

/** Whether the window is wide enough for a table and a sheet side by side. */
export function useWide(): boolean {
  return useWindowDimensions().width >= WIDE_MIN
}

/** Height in px of buttons, fields and other things to press, for the width of this window. */
export function useTargetHeight(): number {
  return useWide() ? TARGET.wide : TARGET.phone
}

export type ThemeChoice = Scheme | 'system'

interface Theme {
  /** What is on the screen. */
  readonly scheme: Scheme
  /** What the person asked for. */
  readonly choice: ThemeChoice
  readonly choose: (choice: ThemeChoice) => void
}

const ThemeContext = createContext<Theme | null>(null)

/** Follows the system unless the person has chosen; the choice is kept on the device. */
export function ThemeProvider({ children }: { children: ReactNode }) {
  const system: Scheme = useColorScheme() === 'dark' ? 'dark' : 'light'
  const [choice, setChoice] = useState<ThemeChoice>(storedThemeChoice)
  const choose = useCallback((next: ThemeChoice) => {
    keepThemeChoice(next)
    setChoice(next)
  }, [])
  useEffect(() => paintTheme(choice), [choice])
  const scheme = choice === 'system' ? system : choice
  const theme = useMemo(() => ({ scheme, choice, choose }), [scheme, choice, choose])
  return <ThemeContext value={theme}>{children}</ThemeContext>
}

/** The theme on the screen and the person's choice. Colours themselves are constants: see `colour`. */
export function useTheme(): Theme {
  const theme = useContext(ThemeContext)
  if (!theme) throw new Error('useTheme needs a ThemeProvider above it')
  return theme
}
