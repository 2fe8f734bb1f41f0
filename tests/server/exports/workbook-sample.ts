import { scheduleOf, type Check, type Layout, type PourResult, type Steel, type SteelShape } from '@wedgeline/engine'
import type { ScheduleWorkbookInput } from '@/server/exports/workbook'
import { anchor, layout, POUR } from '../../engine/sample-layout'

export const steel = (id: string, anchorId: string, shape: SteelShape): Steel => ({
  id,
  pourId: 'P1',
  zone: { kind: 'anchor', anchorId },
  shape,
  source: 'by-hand',
  isLocked: false,
})

/** Two anchors with links, one with a helix, hairpins, transverse and edge bars. */
export const SAMPLE: Layout = layout({
  anchors: [
    anchor('E2', 1, { chainage: 2000 }),
    anchor('E2', 2, { chainage: 4000 }),
    anchor('E4', 1, { chainage: 3000, hardwareId: 'B7' }),
  ],
  steel: [
    steel('h', 'E2-1', {
      kind: 'hairpins',
      diameter: 10,
      leg: 600,
      bend: 150,
      count: 2,
      lies: 'upright',
      first: 50,
      pitch: 0,
    }),
    steel('t', 'E2-2', {
      kind: 'transverse-bars',
      diameter: 12,
      length: 1400,
      count: 5,
      layers: 'both',
      first: 100,
      pitch: 150,
    }),
    {
      ...steel('e', 'E2-1', {
        kind: 'edge-bars',
        diameter: 12,
        countTop: 1,
        countBottom: 1,
        first: 60,
        pitch: 50,
        from: 0,
        to: 9600,
      }),
      zone: { kind: 'edge', edgeId: 'E2' },
    },
  ],
})

const checkHead = {
  zoneId: 'anchor:E2-1',
  family: 'bearing',
  plane: null,
  stage: 'Full',
  limitKind: 'C',
  clause: { source: 'EN 1992-1-1', section: '6.7', tag: 'read' },
  notes: ['Net area.'],
} as const

export const OVER: Check = {
  ...checkHead,
  kind: 'compared',
  name: 'Bearing under the plate',
  status: 'over',
  demand: 588_800,
  limit: 588_200,
  unit: 'N',
  compares: 'ratio',
  utilisation: 588_800 / 588_200,
  spare: null,
  steps: [],
  readingIds: [],
  statusOnceAccepted: 'over',
  mend: null,
}
const REFUSED: Check = {
  ...checkHead,
  kind: 'refused',
  name: 'Bursting in plan',
  status: 'not-covered',
  code: 'UNEVEN_ROW',
  field: 'chainage',
  message: 'The gaps differ by more than a fifth.',
}
export const WITHIN: Check = { ...OVER, name: 'Cover', status: 'within', statusOnceAccepted: 'within' }

export const results = (checks: readonly Check[]): PourResult => ({
  pourId: 'P1',
  basis: 'en-1992',
  zones: [
    {
      zone: {
        id: 'anchor:E2-1',
        kind: 'anchor',
        name: 'E2-01',
        pourId: 'P1',
        edgeId: 'E2',
        panId: null,
        from: 0,
        to: 1,
      },
      checks,
      status: 'over',
      notYetChecked: ['fit'],
    },
  ],
  counts: { stop: 0, 'not-covered': 1, over: 1, 'needs-judgement': 0, near: 0, within: 0 },
})

export const input = (change: Partial<ScheduleWorkbookInput> = {}): ScheduleWorkbookInput => ({
  schedule: scheduleOf(SAMPLE, 'P1', ['fit', 'spalling']),
  checks: results([WITHIN, OVER, REFUSED]),
  job: { number: 'QM-1', title: 'Quillmarsh Yard Podium (invented)' },
  pour: POUR,
  reference: 'QM1 01',
  drawing: 'QM-D-101',
  preparedBy: 'D. Rafter (invented)',
  preparedOn: '2026-03-02',
  preparedAtMs: Date.UTC(2026, 2, 2, 9, 30),
  checkedBy: null,
  approval: null,
  accepted: [],
  engineVersion: '0.1.0+abcdef012345',
  ...change,
})
