import { useEffect } from 'react'

/** Names the browser's tab after the screen, most particular word first. */
export function usePageTitle(title: string): void {
  useEffect(() => {
    document.title = `${title} – Wedgeline`
  }, [title])
}
