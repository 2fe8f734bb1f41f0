import type { ReactNode } from 'react'
import { StyleSheet, useWindowDimensions, View } from 'react-native'
import { colour, space, useWide } from '@/components/theme'
import { usePageTitle } from './page-title'
import { Text } from './text'
import type { Parent } from './trail'
import { useTellTrail } from './trail'

export interface ScreenProps {
  /** The one level-1 heading. */
  title: string
  /** The pages above, from the top; the header shows them. */
  parents?: readonly Parent[]
  /** Beside the title: counts by status, state, who saved when. */
  summary?: ReactNode
  /** The main action and its neighbours. */
  actions?: ReactNode
  /** A NavBar of the pages that belong together. */
  nav?: ReactNode
  /** Text and forms are held to a readable width; drawings and tables take the whole. */
  isNarrow?: boolean
  /** Takes the height of the window, for a screen whose parts scroll by themselves. */
  fills?: boolean
  children: ReactNode
}

const NO_PARENTS: readonly Parent[] = []

/** The line above every screen with its rule, px. */
const HEADER_PX = 49
/** Below this the page scrolls rather than squeeze its parts. */
const HELD_MIN_PX = 680

/** One page of the product under the header: what it is, what can be done, and the thing itself. */
export function Screen(props: ScreenProps) {
  const { title, parents = NO_PARENTS, summary, actions, nav, isNarrow, fills, children } = props
  const isWide = useWide()
  const window = useWindowDimensions()
  const held = fills
    ? ({ flexGrow: 0, flexBasis: 'auto', height: Math.max(window.height - HEADER_PX, HELD_MIN_PX) } as const)
    : null
  usePageTitle(title)
  useTellTrail(title, parents)
  const gutter = { paddingHorizontal: isWide ? space.xl : space.l }
  return (
    <View role="main" id="main" tabIndex={-1} style={[styles.screen, held]}>
      <View style={[styles.head, gutter]}>
        <View style={styles.named}>
          <Text kind="title" level={1}>
            {title}
          </Text>
          {summary ? <View style={styles.summary}>{summary}</View> : null}
        </View>
        {actions ? <View style={styles.actions}>{actions}</View> : null}
      </View>
      {nav ? <View style={[styles.nav, gutter]}>{nav}</View> : null}
      <View style={[styles.body, fills ? styles.filled : [styles.padded, gutter], isNarrow && styles.narrow]}>
        {children}
      </View>
    </View>
  )
}

/** A part of a screen under a heading of its own. */
export function Section({ title, actions, children }: { title: string; actions?: ReactNode; children: ReactNode }) {
  return (
    <View style={styles.section}>
      <View style={styles.sectionHead}>
        <Text kind="heading" level={2}>
          {title}
        </Text>
        {actions ? <View style={styles.actions}>{actions}</View> : null}
      </View>
      {children}
    </View>
  )
}

const styles = StyleSheet.create({
  screen: { flex: 1, minWidth: 0, outlineWidth: 0 },
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    columnGap: space.xl,
    rowGap: space.s,
    paddingVertical: space.s,
    minHeight: 48,
    borderBottomWidth: 1,
    borderColor: colour.rule,
  },
  named: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    columnGap: space.xl,
    rowGap: 2,
    flexShrink: 1,
  },
  summary: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    flexShrink: 1,
    alignItems: 'center',
    columnGap: space.l,
    rowGap: space.xs,
  },
  actions: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.s, flexShrink: 1 },
  nav: { borderBottomWidth: 1, borderColor: colour.rule, backgroundColor: colour.sheet },
  body: { flex: 1, minWidth: 0 },
  padded: { paddingVertical: space.l, gap: space.xl },
  filled: { minHeight: 0 },
  narrow: { width: '100%', maxWidth: 720 },
  section: { gap: space.s, minWidth: 0 },
  sectionHead: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: space.s,
    borderBottomWidth: 1,
    borderColor: colour.ink,
    paddingBottom: space.xs,
  },
})
