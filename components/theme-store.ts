import type { ThemeChoice } from './theme'

/** Native follows the system. */
export function storedThemeChoice(): ThemeChoice {
  return 'system'
}

export function keepThemeChoice(_choice: ThemeChoice): void {}

export function paintTheme(_choice: ThemeChoice): void {}
