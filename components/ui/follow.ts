import type { Href } from 'expo-router'
import { router } from 'expo-router'
import type { GestureResponderEvent } from 'react-native'

/** A page of the product, spelt out as its path. */
export type Path = Extract<Href, string>

/** Opens a page without loading it anew; leaves a press meant for a new tab or window to the browser. */
export function follow(event: GestureResponderEvent, path: Path): void {
  const press: Partial<Pick<MouseEvent, 'metaKey' | 'ctrlKey' | 'shiftKey' | 'altKey' | 'button'>> =
    event as unknown as MouseEvent
  if (press.metaKey || press.ctrlKey || press.shiftKey || press.altKey || press.button) return
  event.preventDefault()
  router.push(path)
}
