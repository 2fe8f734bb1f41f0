import type { LayoutFile } from '../layout'
import { refused, type Problem } from './problem'

/** Whether the name is an IANA time zone that this machine can write an instant in. */
export function isTimeZone(name: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: name })
    return true
  } catch {
    return false
  }
}

/** The schedule prints every instant in the job's time zone. */
export const timeZoneProblems = ({ job }: LayoutFile): Problem[] =>
  isTimeZone(job.timeZone)
    ? []
    : [refused(['job', 'timeZone'], `"${job.timeZone}" is no time zone; must be an IANA name like Europe/London`)]
