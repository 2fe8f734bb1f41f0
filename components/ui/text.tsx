import type { TextProps as NativeTextProps } from 'react-native'
import { StyleSheet, Text as NativeText } from 'react-native'
import { colour, font } from '@/components/theme'

export type TextKind = 'title' | 'heading' | 'body' | 'strong' | 'small' | 'label' | 'figure' | 'figureStrong'
export type Tone = 'ink' | 'soft' | 'rust' | 'steel' | 'within' | 'near' | 'over' | 'onRust'

export interface TextProps extends NativeTextProps {
  kind?: TextKind
  tone?: Tone
  /** Makes it a heading of that level. */
  level?: 1 | 2 | 3 | 4 | undefined
}

/** Text in the product's type: Barlow for words, Barlow Semi Condensed for figures, figures of one width throughout. */
export function Text({ kind = 'body', tone = 'ink', level, style, ...rest }: TextProps) {
  const heading = level ? ({ role: 'heading', 'aria-level': level } as const) : {}
  return <NativeText {...heading} {...rest} style={[textStyle.base, textStyle[kind], { color: colour[tone] }, style]} />
}

export const textStyle = StyleSheet.create({
  base: { fontFamily: font.text, fontVariant: ['tabular-nums'], color: colour.ink },
  title: { fontSize: 20, lineHeight: 26, fontWeight: '600' },
  heading: { fontSize: 16, lineHeight: 22, fontWeight: '600' },
  body: { fontSize: 15, lineHeight: 21 },
  strong: { fontSize: 15, lineHeight: 21, fontWeight: '600' },
  small: { fontSize: 13, lineHeight: 18 },
  label: { fontSize: 13, lineHeight: 18, fontWeight: '500' },
  figure: { fontFamily: font.figures, fontSize: 15, lineHeight: 20 },
  figureStrong: { fontFamily: font.figures, fontSize: 15, lineHeight: 20, fontWeight: '600' },
})
