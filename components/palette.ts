export const SCHEMES = ['light', 'dark', 'outdoor'] as const
export type Scheme = (typeof SCHEMES)[number]

/**
 * One colour for one meaning. Rust is bars and the one main action, steel is anchors and tendons, ochre is an edge
 * wedge; within, near and over only ever stand beside a mark of their own shape.
 *
 * `rule` parts things that need no boundary to be found; `line` is the boundary of a control and keeps 3:1.
 * public/theme.css carries the same values for the first paint; a test compares the two.
 */
export const PALETTES = {
  light: {
    paper: '#f6f3eb',
    sheet: '#fcfbf7',
    wash: '#efe8d8',
    input: '#ffffff',
    ink: '#1c2428',
    soft: '#5b6468',
    rule: '#d2ccbd',
    line: '#857d6b',
    concrete: '#e7e2d6',
    rust: '#ae4216',
    onRust: '#ffffff',
    steel: '#28566b',
    ochre: '#a5710e',
    within: '#2c6a3f',
    near: '#8a5a00',
    over: '#a1242b',
  },
  dark: {
    paper: '#14191c',
    sheet: '#1b2125',
    wash: '#2a3236',
    input: '#101518',
    ink: '#ece8de',
    soft: '#a9afae',
    rule: '#3b4549',
    line: '#7c878b',
    concrete: '#2e3334',
    rust: '#f0865a',
    onRust: '#14191c',
    steel: '#84bad2',
    ochre: '#dba94a',
    within: '#7cc48f',
    near: '#e3b04b',
    over: '#f58b8c',
  },
  outdoor: {
    paper: '#ffffff',
    sheet: '#ffffff',
    wash: '#f1ede2',
    input: '#ffffff',
    ink: '#000000',
    soft: '#383e41',
    rule: '#000000',
    line: '#000000',
    concrete: '#e7e2d6',
    rust: '#7a2a0a',
    onRust: '#ffffff',
    steel: '#143c4e',
    ochre: '#5e3f00',
    within: '#0f4a22',
    near: '#5c3a00',
    over: '#7d0f17',
  },
} as const satisfies Record<Scheme, Record<string, string>>

export type Colour = keyof (typeof PALETTES)['light']

export const COLOURS = Object.keys(PALETTES.light) as Colour[]
