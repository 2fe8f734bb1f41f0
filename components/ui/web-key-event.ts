/** What the page's keyboard events carry; react-native's types know none on views. */
export interface WebKeyEvent {
  readonly key: string
  readonly shiftKey: boolean
  readonly preventDefault: () => void
  readonly stopPropagation: () => void
}
