import type { JobData } from '@wedgeline/contract'

type Setting = keyof JobData['settings']

export interface SettingField {
  readonly name: Setting
  readonly kind: 'number' | 'text'
  readonly label: string
  readonly unit?: string
  readonly hint?: string
  readonly usual: { readonly range: string; readonly source: string }
}

/** What the pours of a job have in common. The basis has no say in these: ranges are common practice. */
export const SETTING_FIELDS: readonly SettingField[] = [
  {
    name: 'pocketToFaceMinMm',
    kind: 'number',
    label: 'Pocket to the nearest face, at least',
    unit: 'mm',
    usual: { range: '20 to 40', source: 'common practice' },
  },
  {
    name: 'pocketToPocketMinMm',
    kind: 'number',
    label: 'Pocket to pocket, at least',
    unit: 'mm',
    usual: { range: '20 to 50', source: 'common practice' },
  },
  {
    name: 'clearGapMinMm',
    kind: 'number',
    label: 'Clear gap between bars, at least',
    unit: 'mm',
    hint: 'What concrete has to pass through.',
    usual: { range: '20 to 25', source: 'common practice; the aggregate of a pour may ask for more' },
  },
  {
    name: 'nearFrom',
    kind: 'number',
    label: 'A result is near from',
    hint: 'Share of the limit, 0.90 or more.',
    usual: { range: '0.90 to 0.95', source: 'common practice' },
  },
  {
    name: 'wedgeSpreadDeg',
    kind: 'number',
    label: 'Spread of force behind an anchor, to each side',
    unit: '°',
    hint: 'Draws the edge wedges. Left empty, the basis’s own: 33.7°.',
    usual: { range: '30 to 45', source: 'common practice' },
  },
  {
    name: 'fykMPa',
    kind: 'number',
    label: 'Reinforcement, yield strength',
    unit: 'MPa',
    usual: { range: '400 to 600', source: 'EN 1992-1-1, 3.2.2(3), from memory' },
  },
  {
    name: 'reinforcementGrade',
    kind: 'text',
    label: 'Reinforcement, grade',
    hint: 'As the schedule prints it.',
    usual: { range: 'B500B', source: 'common practice' },
  },
  {
    name: 'stockLengthMm',
    kind: 'number',
    label: 'Longest bar of the yard',
    unit: 'mm',
    hint: 'Longer edge bars are split, with laps placed.',
    usual: { range: '6000 or 12000', source: 'common practice' },
  },
]
