import type { ReactNode } from 'react'
import { createContext, Fragment, useContext, useEffect, useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import type { Path } from './follow'
import { Link } from './link'
import { Text } from './text'

/** A page above the one on the screen. */
export interface Parent {
  readonly label: string
  readonly href: Path
}

export interface TrailValue {
  readonly parents: readonly Parent[]
  readonly title: string
}

const NOWHERE: TrailValue = { parents: [], title: '' }

const TrailContext = createContext(NOWHERE)
const SetTrailContext = createContext<(trail: TrailValue) => void>(() => {})

/** Lets the screen that is open tell the header above it where it stands. */
export function TrailProvider({ children }: { children: ReactNode }) {
  const [trail, setTrail] = useState(NOWHERE)
  return (
    <SetTrailContext value={setTrail}>
      <TrailContext value={trail}>{children}</TrailContext>
    </SetTrailContext>
  )
}

/** Where the open screen stands. */
export function useTrail(): TrailValue {
  return useContext(TrailContext)
}

/** Tells the header where this screen stands; once it is left the header forgets. */
export function useTellTrail(title: string, parents: readonly Parent[]): void {
  const setTrail = useContext(SetTrailContext)
  const written = JSON.stringify({ title, parents })
  useEffect(() => {
    setTrail(JSON.parse(written) as TrailValue)
    return () => setTrail(NOWHERE)
  }, [setTrail, written])
}

/** The pages above this one, and this one, in one line. */
export function Trail() {
  const { parents, title } = useTrail()
  if (!title) return null
  return (
    <View role="navigation" aria-label="Where this page stands" style={styles.line}>
      {parents.map((parent) => (
        <Fragment key={parent.href}>
          <Link href={parent.href} tone="soft" style={styles.parent}>
            {parent.label}
          </Link>
          <Text tone="soft" aria-hidden>
            /
          </Text>
        </Fragment>
      ))}
      <Text kind="strong" numberOfLines={1} aria-current="page" style={styles.here}>
        {title}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', alignItems: 'center', gap: 6, flexShrink: 1, minWidth: 0 },
  parent: { textDecorationLine: 'none', paddingVertical: space.xs },
  here: { flexShrink: 1 },
})
