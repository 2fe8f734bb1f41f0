/** Opens the browser's own print dialog, which also writes a PDF. */
export function printPage(): void {
  if (typeof window !== 'undefined') window.print()
}
