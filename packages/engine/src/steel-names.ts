import type { SteelKind } from './model'

/** Kinds of bars as people call them, on screens and in workbooks. */
export const STEEL_NAMES: Readonly<Record<SteelKind, string>> = {
  spiral: 'spirals',
  links: 'links',
  hairpins: 'hairpins',
  'edge-bars': 'edge bars',
  'transverse-bars': 'transverse bars',
  'wedge-bars': 'wedge bars',
  trimmers: 'trimmers',
  diagonals: 'diagonal bars',
  'tie-back-bars': 'tie-back bars',
  'lap-bars': 'lap bars',
}
