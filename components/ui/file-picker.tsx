import { Text } from './text'

export interface FilePickerProps {
  label: string
  /** Endings and types as a browser's file input takes them. */
  accept: string
  busy?: boolean
  onPick: (file: File) => void
}

/** Files are chosen in the browser alone. */
export function FilePicker({ label }: FilePickerProps) {
  return <Text tone="soft">{`${label}: in the browser`}</Text>
}
