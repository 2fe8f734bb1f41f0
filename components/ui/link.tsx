import type { TextProps } from './text'
import { Text } from './text'
import type { Path } from './follow'
import { follow } from './follow'
import { StyleSheet } from 'react-native'

export interface LinkProps extends TextProps {
  href: Path
}

/** A link in running text or a list. */
export function Link({ href, style, ...rest }: LinkProps) {
  return (
    <Text {...rest} role="link" href={href} onPress={(event) => follow(event, href)} style={[styles.link, style]} />
  )
}

const styles = StyleSheet.create({ link: { textDecorationLine: 'underline' } })
