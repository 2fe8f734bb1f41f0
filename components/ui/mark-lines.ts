/** The mark on a field of 30 by 18: four tendons standing on an edge, with three wedges between them. */
export const MARK = {
  edge: 'M0 15h30v2H0z',
  tendons: 'M2.5 1h2v14h-2zM10.2 1h2v14h-2zM17.8 1h2v14h-2zM25.5 1h2v14h-2z',
  wedges: 'M4.5 15l2.85-7.5L10.2 15zM12.2 15 15 7.5 17.8 15zM19.8 15l2.85-7.5L25.5 15z',
} as const
