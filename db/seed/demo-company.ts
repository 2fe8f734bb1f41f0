import type { Role } from '@wedgeline/contract'

/** The demo's company and people. All names are invented. */

export const DEMO_COMPANY = {
  name: 'Tarnbeck Stressing (invented)',
  note: 'Demo company. Contractor Pellowane Build, engineer Oddmeadow Structures, bars by Brindlecut Bar Works: all invented.',
} as const

export interface DemoPerson {
  readonly name: string
  readonly email: string
  readonly roles: readonly Role[]
}

/** One person for each role; the admin is a detailer as well, as the first person of a small company is. */
export const DEMO_PEOPLE: readonly DemoPerson[] = [
  { name: 'Dilys Marrow', email: 'detailer@tarnbeck.example', roles: ['detailer'] },
  { name: 'Enoch Vale', email: 'engineer@tarnbeck.example', roles: ['engineer'] },
  { name: 'Dora Finch', email: 'drafter@tarnbeck.example', roles: ['drafter'] },
  { name: 'Ivor Plume', email: 'inspector@tarnbeck.example', roles: ['inspector'] },
  { name: 'Ada Quill', email: 'admin@tarnbeck.example', roles: ['admin', 'detailer'] },
]
