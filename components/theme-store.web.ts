import { SCHEMES } from './palette'
import type { ThemeChoice } from './theme'

/** public/theme.js reads the same key before the first paint. */
const KEY = 'wedgeline.theme'

/** The choice kept on this device; `system` where there is none or storage is refused. */
export function storedThemeChoice(): ThemeChoice {
  try {
    const kept = localStorage.getItem(KEY)
    return SCHEMES.find((scheme) => scheme === kept) ?? 'system'
  } catch {
    return 'system'
  }
}

/** Keeps the choice for the next visit; a device that refuses storage forgets it. */
export function keepThemeChoice(choice: ThemeChoice): void {
  try {
    if (choice === 'system') localStorage.removeItem(KEY)
    else localStorage.setItem(KEY, choice)
  } catch {
    // Private windows may refuse storage; the choice then holds until the page is left.
  }
}

/** Sets the attribute that public/theme.css goes by. */
export function paintTheme(choice: ThemeChoice): void {
  const root = document.documentElement
  if (choice === 'system') delete root.dataset.theme
  else root.dataset.theme = choice
}
