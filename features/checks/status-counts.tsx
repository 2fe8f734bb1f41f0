import { STATUSES } from '@wedgeline/engine/result'
import type { Status, ZoneResult } from '@wedgeline/engine'
import { StatusMark, STATUS_WORD } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { useWide } from '@/components/theme'

/** How many zones stand at each status, worst first; a status without a zone is left out. */
export function StatusCounts({ zones, isStale }: { readonly zones: readonly ZoneResult[]; readonly isStale: boolean }) {
  const isWide = useWide()
  const counts = countZones(zones)
  const shown = STATUSES.filter((status) => counts[status] > 0)
  return (
    <>
      {shown.map((status) => (
        <StatusMark
          key={status}
          status={status}
          words={isWide ? `${counts[status]} ${STATUS_WORD[status]}` : String(counts[status])}
        />
      ))}
      {isStale ? <Text tone="soft">working out …</Text> : null}
    </>
  )
}

/** Zones by their worst status. */
export function countZones(zones: readonly ZoneResult[]): Readonly<Record<Status, number>> {
  const count = (wanted: Status) => zones.filter(({ status }) => status === wanted).length
  return {
    stop: count('stop'),
    'not-covered': count('not-covered'),
    over: count('over'),
    'needs-judgement': count('needs-judgement'),
    near: count('near'),
    within: count('within'),
  }
}
