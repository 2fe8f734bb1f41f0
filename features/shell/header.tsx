import { Pressable, StyleSheet, View } from 'react-native'
import type { ThemeChoice } from '@/components/theme'
import { colour, space, useTheme, useWide } from '@/components/theme'
import { follow } from '@/components/ui/follow'
import { Icon } from '@/components/ui/icon'
import { Mark } from '@/components/ui/mark'
import type { MenuItem } from '@/components/ui/menu'
import { Menu } from '@/components/ui/menu'
import { Text } from '@/components/ui/text'
import { Trail, useTrail } from '@/components/ui/trail'

/** Who is signed in, and for which company. */
export interface Account {
  readonly person: string
  readonly company: string
  /** Pages of the company and the person: hardware, people. */
  readonly items: readonly MenuItem[]
  readonly onSignOut: () => void
}

const THEMES: readonly { choice: ThemeChoice; label: string }[] = [
  { choice: 'system', label: 'Theme as the device' },
  { choice: 'light', label: 'Light theme' },
  { choice: 'dark', label: 'Dark theme' },
  { choice: 'outdoor', label: 'Outdoor theme' },
]

/** The line above every screen: where one is, and the person's menu. */
export function Header({ account }: { account: Account | null }) {
  const isWide = useWide()
  const parent = useTrail().parents.at(-1)
  return (
    <View role="banner" style={[styles.header, { paddingLeft: isWide ? space.xl : space.s }]} dataSet={{ print: 'no' }}>
      {!isWide && parent ? (
        <Pressable href={parent.href} role="link" onPress={(event) => follow(event, parent.href)} style={styles.home}>
          <Icon name="back" size={18} />
          <Text kind="strong" numberOfLines={1}>
            {parent.label}
          </Text>
        </Pressable>
      ) : (
        <Pressable href="/" role="link" onPress={(event) => follow(event, '/')} style={styles.home}>
          <Mark />
          <Text kind="title">Wedgeline</Text>
        </Pressable>
      )}
      <View style={styles.trail}>{isWide ? <Trail /> : null}</View>
      <PersonMenu account={account} />
    </View>
  )
}

function PersonMenu({ account }: { account: Account | null }) {
  const { choice, choose } = useTheme()
  const isWide = useWide()
  const themes = THEMES.map((theme, index) => ({
    key: theme.choice,
    label: theme.label,
    isChosen: theme.choice === choice,
    startsGroup: index === 0 && account !== null && account.items.length > 0,
    onPress: () => choose(theme.choice),
  }))
  const out: MenuItem[] = account
    ? [{ key: 'sign-out', label: 'Sign out', startsGroup: true, onPress: account.onSignOut }]
    : []
  return (
    <Menu
      kind="quiet"
      label={account ? `${account.person}, ${account.company}` : 'Theme'}
      icon={<Icon name={account ? 'person' : 'menu'} size={18} />}
      iconOnly={!isWide}
      items={[...(account?.items ?? []), ...themes, ...out]}
    />
  )
}

const styles = StyleSheet.create({
  header: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 48,
    paddingRight: space.s,
    backgroundColor: colour.sheet,
    borderBottomWidth: 1,
    borderColor: colour.ink,
  },
  home: { flexDirection: 'row', alignItems: 'center', gap: space.s, minHeight: 48, paddingHorizontal: space.xs },
  trail: { flex: 1, minWidth: 0 },
})
