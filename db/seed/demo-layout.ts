import { readLayout, type LayoutFile } from '@wedgeline/contract'
import file from './demo-layout.json'

/**
 * The layout of the demo job, Quillmarsh Yard Podium: two levels, three pours, 104 anchors. Everything in it is
 * invented, and several faults are planted in it for the checks to find.
 * @throws where the file that comes with the program is damaged.
 */
export function demoLayout(): LayoutFile {
  const read = readLayout(file)
  if (read.ok) return read.layout
  const first = read.problems[0]
  throw new Error(`The demo's layout file is damaged: ${first?.field} ${first?.message}`)
}
