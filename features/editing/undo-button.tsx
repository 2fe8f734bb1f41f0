import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { useWide } from '@/components/theme'
import { useJobDraft } from './job-draft'

/** Takes back the last change and says which it is, where there is room to say it. */
export function UndoButton() {
  const { canUndo, undo, undoLabel } = useJobDraft()
  const isWide = useWide()
  return (
    <Button
      label={isWide && undoLabel ? `Undo: ${undoLabel}` : 'Undo'}
      icon={<Icon name="undo" />}
      iconOnly={!isWide}
      disabled={!canUndo}
      onPress={undo}
    />
  )
}
