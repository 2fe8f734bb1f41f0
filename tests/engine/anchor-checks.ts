import { checkPour, type Approval, type Check, type Compared, type Hardware, type Layout } from '@wedgeline/engine'
import { anchor, B7, D4, layout, S4, type Parts } from './sample-layout'

/** Plain plate of the invented podium, without an approval: 300 x 120, hole 90 x 26. */
export const K4: Hardware = {
  ...S4,
  id: 'K4',
  name: 'K4',
  plate: { width: 300, height: 120 },
  hole: { width: 90, height: 26, isRound: false },
  pocket: { width: 360, height: 140, depth: 110 },
  spacingAlongMin: 450,
  edgeAlongMin: 240,
  edgeHeightMin: 90,
}

const distances = { spacingAlongMin: 350, spacingHeightMin: 350, edgeAlongMin: 190, edgeHeightMin: 75 }
export const APPROVAL: Approval = {
  reference: 'INVENTED-QY-S4',
  strengths: [
    { share: 0.25, strengthMin: 9, ...distances },
    { share: 1, strengthMin: 22, ...distances },
  ],
}
export const S4_APPROVED: Hardware = { ...S4, id: 'S4A', name: 'S4A', approval: APPROVAL }

/** Seven anchors at 1750 from 2650 on the north edge; the fourth, in the middle, is the one that is looked at. */
export function row(
  hardwareId: string,
  change: Parts & { readonly middle?: Parameters<typeof anchor>[2] } = {},
): Layout {
  const { middle = {}, ...parts } = change
  const anchors = [1, 2, 3, 4, 5, 6, 7].map((number) =>
    anchor('E4', number, { chainage: 900 + 1750 * number, hardwareId, ...(number === 4 ? middle : {}) }),
  )
  return layout({ hardware: [S4, S4_APPROVED, K4, B7, D4], anchors, ...parts })
}

/** All checks at one anchor, steps included. */
export function checksAt(of: Layout, anchorId = 'E4-4'): readonly Check[] {
  const zone = checkPour(of, { pourId: 'P1', withSteps: true }).zones.find(
    (one) => one.zone.id === `anchor:${anchorId}`,
  )
  if (!zone) throw new Error(`No zone of ${anchorId}`)
  return zone.checks
}

/** The check of one family; with a stage where there is one for each. */
export function checkAt(of: Layout, family: Check['family'], stage: string | null = null): Check {
  const check = checksAt(of).find((one) => one.family === family && (stage === null || one.stage === stage))
  if (!check) throw new Error(`No check of ${family}`)
  return check
}

export function compared(check: Check): Compared {
  if (check.kind !== 'compared') throw new Error(`${check.family} is ${check.kind}`)
  return check
}

export const accepting = (of: Layout, ...readingIds: readonly string[]): Layout => ({
  ...of,
  job: {
    ...of.job,
    readings: readingIds.map((readingId, i) => ({
      readingId,
      acceptedBy: 'A. Engineer',
      acceptedAtMs: i + 1,
      reason: 'usual slab',
    })),
  },
})

/** Both proposed readings accepted. */
export const accepted = (of: Layout): Layout => accepting(of, 'en-window', 'en-steel-300')
