import type { ReactNode } from 'react'
import { createContext, useCallback, useContext, useEffect, useMemo, useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from './button'
import { Icon } from './icon'
import { Text } from './text'

export interface Message {
  readonly words: string
  /** A message with an action stays until it is put away. */
  readonly action?: { readonly label: string; readonly onPress: () => void }
}

type Say = (message: Message | string) => void

interface Shown extends Message {
  readonly id: number
}

/** Long enough to read two lines. */
const STAYS_MS = 6000

const ToastContext = createContext<Say | null>(null)

/** Says what has happened, in one polite live region at the foot of the window; the last three messages stand. */
export function ToastProvider({ children }: { children: ReactNode }) {
  const [shown, setShown] = useState<readonly Shown[]>([])
  const say = useCallback<Say>((message) => {
    const said = typeof message === 'string' ? { words: message } : message
    setShown((before) => [...before, { ...said, id: (before.at(-1)?.id ?? 0) + 1 }].slice(-3))
  }, [])
  const drop = useCallback((id: number) => setShown((before) => before.filter((message) => message.id !== id)), [])
  const layer = useMemo(
    () => (
      <View role="status" aria-live="polite" dataSet={{ layer: 'messages' }} style={styles.layer}>
        {shown.map((message) => (
          <ToastLine key={message.id} message={message} onDrop={drop} />
        ))}
      </View>
    ),
    [shown, drop],
  )
  return (
    <ToastContext value={say}>
      {children}
      {layer}
    </ToastContext>
  )
}

/** Says something to the person: `const say = useToast()`, `say('Saved.')`. */
export function useToast(): Say {
  const say = useContext(ToastContext)
  if (!say) throw new Error('useToast needs a ToastProvider above it')
  return say
}

function ToastLine({ message, onDrop }: { message: Shown; onDrop: (id: number) => void }) {
  const { id, action, words } = message
  const stays = action !== undefined
  useEffect(() => {
    if (stays) return
    const timer = setTimeout(() => onDrop(id), STAYS_MS)
    return () => clearTimeout(timer)
  }, [id, stays, onDrop])
  return (
    <View style={styles.line}>
      <Text style={styles.words}>{words}</Text>
      {action ? (
        <Button
          label={action.label}
          onPress={() => {
            onDrop(id)
            action.onPress()
          }}
        />
      ) : null}
      <Button label="Put away" kind="quiet" iconOnly icon={<Icon name="close" />} onPress={() => onDrop(id)} />
    </View>
  )
}

const styles = StyleSheet.create({
  layer: { alignItems: 'center', gap: space.s },
  line: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.s,
    width: '100%',
    maxWidth: 520,
    paddingVertical: space.xs,
    paddingLeft: space.m,
    paddingRight: space.xs,
    backgroundColor: colour.sheet,
    borderWidth: 1,
    borderColor: colour.ink,
    borderLeftWidth: 4,
    pointerEvents: 'auto',
  },
  words: { flex: 1 },
})
