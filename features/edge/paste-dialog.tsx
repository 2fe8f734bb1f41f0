import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { space } from '@/components/theme'
import { readPasted, type PasteContext, type Pasted } from './paste'

export interface PasteDialogProps {
  readonly isOpen: boolean
  readonly context: PasteContext
  readonly onClose: () => void
  readonly onPaste: (pasted: Pasted) => void
}

/** Anchors from a spreadsheet or typed line by line; what was read is shown before it goes on the edge. */
export function PasteDialog({ isOpen, context, onClose, onPaste }: PasteDialogProps) {
  const [text, setText] = useState('')
  const pasted = readPasted(text, context)
  const { anchors, problems } = pasted
  const chainages = anchors.map(({ chainageMm }) => chainageMm)
  const summary =
    anchors.length === 0
      ? 'Nothing read yet.'
      : `${anchors.length} anchors from ${Math.min(...chainages)} to ${Math.max(...chainages)} mm.`
  const put = () => {
    onPaste(pasted)
    setText('')
    onClose()
  }
  return (
    <Dialog
      title="Paste anchors"
      isOpen={isOpen}
      onClose={onClose}
      actions={
        <>
          <Button label="Cancel" onPress={onClose} />
          <Button
            kind="main"
            label={anchors.length === 0 ? 'Put on the edge' : `Put ${anchors.length} on the edge`}
            disabled={anchors.length === 0 || problems.length > 0}
            onPress={put}
          />
        </>
      }
    >
      <View style={styles.body}>
        <TextField
          label="Distance, height, strands, end, hardware, set-back"
          hint="A line an anchor, mm, parted by tabs, spaces or semicolons. Only the distance is needed; a first line of words names the columns."
          value={text}
          onChangeText={setText}
          multiline
          rows={10}
          autoFocus
        />
        <Text kind="strong">{summary}</Text>
        {problems.map(({ line, message }) => (
          <Text key={line} tone="over">{`Line ${line}. ${message}`}</Text>
        ))}
      </View>
    </Dialog>
  )
}

const styles = StyleSheet.create({ body: { gap: space.m } })
