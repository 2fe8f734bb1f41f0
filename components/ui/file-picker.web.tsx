import { useRef } from 'react'
import { View } from 'react-native'
import { Button } from './button'
import type { FilePickerProps } from './file-picker'
import { Icon } from './icon'

export type { FilePickerProps } from './file-picker'

/** A button that asks for one file; the same file may be chosen again after it was mended. */
export function FilePicker({ label, accept, busy, onPick }: FilePickerProps) {
  const input = useRef<HTMLInputElement>(null)
  return (
    <View style={{ alignItems: 'flex-start' }}>
      <input
        ref={input}
        type="file"
        accept={accept}
        aria-label={label}
        tabIndex={-1}
        style={{ display: 'none' }}
        onChange={(event) => {
          const file = event.target.files?.[0]
          event.target.value = ''
          if (file) onPick(file)
        }}
      />
      <Button label={label} icon={<Icon name="upload" />} busy={busy} onPress={() => input.current?.click()} />
    </View>
  )
}
