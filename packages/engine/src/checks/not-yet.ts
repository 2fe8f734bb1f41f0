import type { Family, Refused, Zone } from '../result'
import { refusal } from './outcome'

/** What is stored and drawn but not checked by this version is said where it stands, so that silence never passes. */
export function notYetChecked(zone: Zone, family: Family, message: string): Refused {
  const head = {
    zoneId: zone.id,
    family,
    name: 'Not yet checked',
    plane: null,
    stage: null,
    limitKind: 'C',
    notes: [],
  } as const
  const clause = { source: 'This version', section: 'families not yet checked', tag: 'practice' } as const
  return refusal({ ...head, clause }, { code: 'NOT_YET_CHECKED', field: zone.kind, message })
}
