/** Whether the prism rule in plan covers the row that an anchor stands in. */

import type { AnchorSite } from '../anchor-site'
import type { Refused } from '../result'
import { refusal, type CheckContext, type Head } from './outcome'

interface RowCover {
  readonly refused: Refused | null
  /** On which a near-equal row rests. */
  readonly readings: readonly string[]
}

/** Rows of up to this many anchors are covered by every basis. */
const FEW = 2

/** One or two anchors always; more where the basis covers them, or by its reading inside a near-equal row. */
export function planRowOf(head: Head, site: AnchorSite, { basis }: CheckContext): RowCover {
  const { equalReadingId, isUnevenCovered, clause } = basis.planRow
  if (site.rowCount <= FEW) return { refused: null, readings: [] }
  if (site.isInEqualRow) return { refused: null, readings: equalReadingId === null ? [] : [equalReadingId] }
  if (isUnevenCovered) return { refused: null, readings: [] }
  return {
    refused: refusal(
      { ...head, clause },
      {
        code: 'UNEVEN_ROW',
        field: site.pan === null ? 'chainage' : 'pan.x',
        message:
          `The rule covers one or two anchors, or an anchor inside a near-equal row; ${site.rowCount} stand here, and ` +
          'gaps, forces or the end of the row differ. An elastic analysis of the whole edge is needed.',
      },
    ),
    readings: [],
  }
}
