import type { Proposal, ProposedZone } from '@wedgeline/engine'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Dialog } from '@/components/ui/dialog'
import { Failed } from '@/components/ui/states'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { colour, space } from '@/components/theme'
import { useJobDraft } from '../editing/job-draft'
import { MarksCurve } from './marks-curve'
import { proposalCommands } from './proposal-commands'
import { changeWords, kg, worstLine } from './proposal-words'
import { useProposal } from './use-proposal'

export interface ProposalDialogProps {
  readonly pourId: string
  /** Only these zones; all of the pour without it. */
  readonly zoneIds?: readonly string[]
  /** What is proposed for: edge E6, pour P3, E6-03. */
  readonly what: string
  readonly onClose: () => void
}

/** Old steel against new, zone by zone, before any of it is put in. It is open as long as it is there. */
export function ProposalDialog({ pourId, zoneIds, what, onClose }: ProposalDialogProps) {
  const { layout, edit } = useJobDraft()
  const [marksAtMost, setMarks] = useState<number | null>(null)
  const [left, setLeft] = useState<ReadonlySet<string>>(new Set())
  const { proposal, isStale, failure } = useProposal(layout, {
    pourId,
    ...(zoneIds ? { zoneIds } : {}),
    ...(marksAtMost === null ? {} : { marksAtMost }),
  })
  const offered = proposal?.zones.filter(({ blocked }) => blocked.length === 0) ?? []
  const taken = offered.filter(({ zone }) => !left.has(zone.id))
  const apply = () => {
    edit({ label: `Bars of ${what}`, commands: proposalCommands(taken, newId) })
    onClose()
  }
  return (
    <Dialog
      title={`Bars proposed for ${what}`}
      isOpen
      onClose={onClose}
      actions={
        <>
          <Button label="Cancel" onPress={onClose} />
          <Button
            kind="main"
            label={taken.length === 0 ? 'Put in' : `Put in at ${taken.length} of ${offered.length}`}
            disabled={taken.length === 0 || isStale}
            onPress={apply}
          />
        </>
      }
    >
      {failure ? (
        <Failed what="No bars could be proposed." advice={failure} />
      ) : proposal ? (
        <Compared
          proposal={proposal}
          isStale={isStale}
          left={left}
          onLeave={(zoneId, isLeft) => setLeft(withOrWithout(left, zoneId, isLeft))}
          onMarks={setMarks}
        />
      ) : (
        <View role="status">
          <Text tone="soft">Trying bars against every check …</Text>
        </View>
      )}
    </Dialog>
  )
}

function withOrWithout(set: ReadonlySet<string>, id: string, isIn: boolean): ReadonlySet<string> {
  const next = new Set(set)
  if (isIn) next.add(id)
  else next.delete(id)
  return next
}

interface ComparedProps {
  readonly proposal: Proposal
  readonly isStale: boolean
  readonly left: ReadonlySet<string>
  readonly onLeave: (zoneId: string, isLeft: boolean) => void
  readonly onMarks: (marks: number) => void
}

function Compared({ proposal, isStale, left, onLeave, onMarks }: ComparedProps) {
  const { zones, mass, marks, curve, point, notes, isExact } = proposal
  const offered = zones.filter(({ blocked }) => blocked.length === 0)
  const blocked = zones.filter((zone) => zone.blocked.length > 0)
  return (
    <View style={styles.list}>
      <View role="status">
        <Text kind="strong">
          {zones.length === 0
            ? 'Nothing to put in: no check here that bars answer is over its limit. What is not covered or needs judgement is for an engineer.'
            : `${offered.length} ${offered.length === 1 ? 'place' : 'places'} with new bars, ${kg(mass)} and ${marks} new ${marks === 1 ? 'mark' : 'marks'}.`}
        </Text>
        {isStale ? <Text tone="soft">working out …</Text> : null}
      </View>
      <Text tone="soft">Bars entered by hand and locked bars stay and count. Bars proposed before are replaced.</Text>
      {notes.map((note) => (
        <Text key={note}>{note}</Text>
      ))}
      <MarksCurve curve={curve} marks={point} onPick={onMarks} />
      {isExact ? null : (
        <Text tone="soft">The search for the fewest marks was cut short: a lighter choice may exist.</Text>
      )}
      {offered.map((zone) => (
        <Offered
          key={zone.zone.id}
          zone={zone}
          isTaken={!left.has(zone.zone.id)}
          onTake={(isTaken) => onLeave(zone.zone.id, !isTaken)}
        />
      ))}
      {blocked.length > 0 ? (
        <Text kind="heading" level={3}>
          {`Nothing passes at ${blocked.length} ${blocked.length === 1 ? 'place' : 'places'}`}
        </Text>
      ) : null}
      {blocked.map((zone) => (
        <Blocked key={zone.zone.id} zone={zone} />
      ))}
    </View>
  )
}

interface OfferedProps {
  readonly zone: ProposedZone
  readonly isTaken: boolean
  readonly onTake: (isTaken: boolean) => void
}

function Offered({ zone, isTaken, onTake }: OfferedProps) {
  const words = changeWords(zone)
  return (
    <View style={styles.zone}>
      <Checkbox label={zone.zone.name} checked={isTaken} onChange={onTake} />
      <Line head="Now" words={words.old} />
      <Line head="New" words={words.new} />
      <Line head="Mass" words={words.mass} />
      <Worst head="Worst now" worst={zone.before} />
      <Worst head="Worst then" worst={zone.after} />
      {zone.notes.map((note) => (
        <Text key={note} kind="small" tone="soft">
          {note}
        </Text>
      ))}
    </View>
  )
}

function Blocked({ zone }: { readonly zone: ProposedZone }) {
  return (
    <View style={styles.zone}>
      <Text kind="strong">{zone.zone.name}</Text>
      <Worst head="Worst now" worst={zone.before} />
      {zone.blocked.map(({ candidate, check, by }, i) => (
        <Line key={`${i}:${candidate}`} head={candidate} words={`${check}, ${by}`} />
      ))}
      {zone.notes.map((note) => (
        <Text key={note} kind="small" tone="soft">
          {note}
        </Text>
      ))}
    </View>
  )
}

function Worst({ head, worst }: { readonly head: string; readonly worst: ProposedZone['before'] }) {
  return (
    <View style={styles.line}>
      <Text kind="small" tone="soft">
        {head}
      </Text>
      {worst ? <StatusMark status={worst.status} words={worstLine(worst)} /> : <Text>{worstLine(worst)}</Text>}
    </View>
  )
}

function Line({ head, words }: { readonly head: string; readonly words: string }) {
  return (
    <View style={styles.line}>
      <Text kind="small" tone="soft">
        {head}
      </Text>
      <Text>{words}</Text>
    </View>
  )
}

const styles = StyleSheet.create({
  list: { gap: space.m },
  zone: { gap: space.xs, paddingTop: space.s, borderTopWidth: 1, borderColor: colour.rule },
  line: { gap: 0 },
})
