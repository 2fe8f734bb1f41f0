import type { LayoutFile } from '@wedgeline/contract'

/** Gives the browser the job as a layout file, with what is on screen in it, sent or not. */
export function exportLayout(layout: LayoutFile): void {
  const address = URL.createObjectURL(new Blob([JSON.stringify(layout, null, 2)], { type: 'application/json' }))
  const link = document.createElement('a')
  link.href = address
  link.download = layoutFileName(layout.job.number)
  link.click()
  // The browser has to begin the download before the address ends.
  setTimeout(() => URL.revokeObjectURL(address), 10_000)
}

/** Signs that a file name may not have in one system or another become dashes. */
export const layoutFileName = (jobNumber: string): string =>
  `${jobNumber.replace(/[^\p{L}\p{N}._ -]+/gu, '-').replace(/^\.+/, '') || 'job'}.wedgeline.json`
