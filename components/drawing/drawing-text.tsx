import type { TextProps } from 'react-native-svg'
import { Text } from 'react-native-svg'
import { colour, font } from '@/components/theme'

export interface DrawingTextProps extends Omit<TextProps, 'fontSize' | 'fontFamily'> {
  /** In px; 12 where not given. */
  size?: number
  isStrong?: boolean
  children: string | number
}

/** Text on a drawing. Without a type face of its own, text in an svg falls back to the browser's serif. */
export function DrawingText({ size = 12, isStrong, fill = colour.ink, children, ...rest }: DrawingTextProps) {
  return (
    <Text {...rest} fill={fill} fontFamily={font.figures} fontSize={size} fontWeight={isStrong ? '600' : '400'}>
      {children}
    </Text>
  )
}
