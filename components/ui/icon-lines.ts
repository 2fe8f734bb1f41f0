/** One stroke of an icon on a field of 16 by 16. */
export interface Line {
  readonly d: string
  /** Thickness; 1.5 where not given. */
  readonly width?: number
  readonly dash?: string
  /** Filled with its own colour, without a stroke. */
  readonly filled?: boolean
}

const RING = 'M8 1.75a6.25 6.25 0 1 0 0 12.5 6.25 6.25 0 0 0 0-12.5Z'
const QUERY = 'M6 6.3C6 5.1 6.9 4.5 8 4.5s2 .7 2 1.8c0 1.5-2 1.6-2 2.9'
const OCTAGON = 'M5.4 1.75h5.2l3.65 3.65v5.2l-3.65 3.65H5.4L1.75 10.6V5.4Z'

/** Own drawings, in the hand of the drawings: square ends, one thickness. */
export const ICON_LINES = {
  back: [{ d: 'M10 3 5 8l5 5', width: 1.75 }],
  forward: [{ d: 'M6 3l5 5-5 5', width: 1.75 }],
  up: [{ d: 'M3 10l5-5 5 5', width: 1.75 }],
  down: [{ d: 'M3 6l5 5 5-5', width: 1.75 }],
  close: [{ d: 'M3.5 3.5l9 9M12.5 3.5l-9 9', width: 1.75 }],
  menu: [{ d: 'M2 4h12M2 8h12M2 12h12', width: 1.75 }],
  more: [{ d: 'M2 7h2v2H2zM7 7h2v2H7zM12 7h2v2h-2z', filled: true }],
  plus: [{ d: 'M8 2.5v11M2.5 8h11', width: 1.75 }],
  minus: [{ d: 'M2.5 8h11', width: 1.75 }],
  whole: [{ d: 'M2 3.5v9M14 3.5v9M4.5 8h7M6.5 6l-2 2 2 2M9.5 6l2 2-2 2' }],
  turn: [{ d: 'M3 6.5A5.2 5.2 0 0 1 13 7M13 9.5A5.2 5.2 0 0 1 3 9M13 3.5V7H9.5M3 12.5V9h3.5' }],
  undo: [{ d: 'M6 3 2.5 6.5 6 10M2.5 6.5H10a3.5 3.5 0 0 1 0 7H7' }],
  redo: [{ d: 'M10 3l3.5 3.5L10 10M13.5 6.5H6a3.5 3.5 0 0 0 0 7h3' }],
  search: [{ d: 'M7 2.5a4.5 4.5 0 1 0 0 9 4.5 4.5 0 0 0 0-9ZM10.3 10.3 14 14' }],
  filter: [{ d: 'M2 3.5h12L9.5 8.7v4.8l-3-1.5V8.7Z' }],
  download: [{ d: 'M8 2v8M4.5 6.5 8 10l3.5-3.5M2.5 13.5h11' }],
  upload: [{ d: 'M8 10.5v-8M4.5 6 8 2.5 11.5 6M2.5 13.5h11' }],
  print: [{ d: 'M4.5 6V2.5h7V6M4.5 11.5h-2V6h11v5.5h-2M4.5 9.5h7v4h-7z' }],
  paste: [{ d: 'M5.5 3.5h-2v10.5h9V3.5h-2M5.5 2h5v3h-5zM5.5 8h5M5.5 11h5' }],
  edit: [{ d: 'M2.5 13.5 3.3 10 11 2.3 13.7 5 6 12.7Z' }],
  remove: [{ d: 'M2.5 4.5h11M6 4.5v-2h4v2M4 4.5l.7 9h6.6l.7-9' }],
  lock: [{ d: 'M3 7.5h10v6.5H3zM5 7.5V5a3 3 0 0 1 6 0v2.5' }],
  person: [{ d: 'M8 2.5a2.75 2.75 0 1 0 0 5.5 2.75 2.75 0 0 0 0-5.5ZM2.5 14c.3-3 2.4-4.5 5.5-4.5s5.2 1.5 5.5 4.5' }],
  photo: [{ d: 'M2 4.5h3L6 3h4l1 1.5h3v9H2zM8 6.2a2.5 2.5 0 1 0 0 5 2.5 2.5 0 0 0 0-5Z' }],
  info: [{ d: RING }, { d: 'M8 7v4.5', width: 1.75 }, { d: 'M7.1 4.1h1.8v1.8H7.1z', filled: true }],
  help: [{ d: RING }, { d: QUERY }, { d: 'M7.2 10.4h1.6V12H7.2z', filled: true }],
  unreadable: [{ d: 'M2 3.5h12v9H2z' }, { d: 'M5.5 5.5l5 5M10.5 5.5l-5 5' }],
  check: [{ d: 'M2.5 8.5 6.5 12.5 13.5 4', width: 2 }],
  within: [{ d: 'M2.5 8.5 6.5 12.5 13.5 4', width: 2 }],
  near: [{ d: 'M8 2.2 14.6 13.6H1.4Z', width: 1.75 }],
  over: [{ d: 'M3 3l10 10M13 3 3 13', width: 2.25 }],
  'needs-judgement': [{ d: RING }, { d: QUERY }, { d: 'M7.2 10.4h1.6V12H7.2z', filled: true }],
  'not-covered': [{ d: RING, dash: '2.6 2.3' }],
  stop: [{ d: OCTAGON }, { d: 'M4 8h8', width: 2.25 }],
} as const satisfies Record<string, readonly Line[]>

export type IconName = keyof typeof ICON_LINES

/** The lines of one icon, all with the fields of `Line`. */
export function iconLines(name: IconName): readonly Line[] {
  return ICON_LINES[name]
}
