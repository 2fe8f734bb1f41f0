import 'react-native'
import type { WebKeyEvent } from './ui/web-key-event'

/** What react-native-web passes on to the page and react-native's own types leave out. */
declare module 'react-native' {
  interface WebProps {
    id?: string | undefined
    href?: string | undefined
    hrefAttrs?: { download?: boolean; target?: string; rel?: string } | undefined
    tabIndex?: 0 | -1 | undefined
    'aria-controls'?: string | undefined
    'aria-current'?: 'page' | 'step' | 'true' | undefined
    'aria-describedby'?: string | undefined
    'aria-haspopup'?: 'menu' | 'dialog' | 'listbox' | undefined
    'aria-invalid'?: boolean | undefined
    'aria-level'?: number | undefined
    'aria-orientation'?: 'horizontal' | 'vertical' | undefined
    'aria-pressed'?: boolean | undefined
    'aria-required'?: boolean | undefined
    dataSet?: Record<string, string> | undefined
    onClick?: ((event: WebKeyEvent) => void) | undefined
    onKeyDown?: ((event: WebKeyEvent) => void) | undefined
    onKeyUp?: ((event: WebKeyEvent) => void) | undefined
  }
  interface TextStyle {
    overflowWrap?: 'anywhere' | 'break-word' | undefined
  }
  interface ViewProps extends WebProps {}
  interface TextProps extends WebProps {}
  interface PressableProps extends WebProps {}
  interface TextInputProps extends WebProps {}
  interface PressableStateCallbackType {
    readonly hovered?: boolean
    readonly focused?: boolean
  }
}
