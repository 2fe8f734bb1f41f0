import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Table } from '@/components/ui/table'
import { Text } from '@/components/ui/text'
import { conflictWords } from './field-words'
import { useJobDraft } from './job-draft'

/** A thin bar above a job's screens, there only while something about saving needs saying. */
export function SaveBar() {
  const job = useJobDraft()
  if (job.save === 'conflict') return <ConflictBar />
  if (job.save === 'refused') {
    return (
      <Banner
        tone="over"
        isUrgent
        words={`The last edits could not be stored: ${job.problem ?? 'the server refused them'} They are kept here; undo or change them, and they are sent again.`}
        actions={
          <>
            {job.canUndo ? <Button label="Undo" onPress={job.undo} /> : null}
            <Button label="Take what the server holds" onPress={() => void job.settle('theirs')} />
          </>
        }
      />
    )
  }
  if (job.save === 'not-sent') {
    return (
      <Banner
        tone="near"
        words={job.problem ?? 'Not sent yet: the server cannot be reached. Your work is kept here.'}
        actions={<Button label="Send now" onPress={() => void job.flush()} />}
      />
    )
  }
  return <DroppedBar key={job.dropped} />
}

/** Edits whose row somebody else removed meanwhile. */
function DroppedBar() {
  const { dropped } = useJobDraft()
  const [isPutAway, setPutAway] = useState(false)
  if (dropped === 0 || isPutAway) return null
  const what = dropped === 1 ? 'One kept edit was' : `${dropped} kept edits were`
  return (
    <Banner
      tone="near"
      words={`${what} left out, because what they changed is no longer in the job.`}
      actions={<Button label="Put away" onPress={() => setPutAway(true)} />}
    />
  )
}

function ConflictBar() {
  const { conflicts, layout, settle } = useJobDraft()
  const [isSettling, setSettling] = useState(false)
  const end = (keep: 'mine' | 'theirs') => {
    setSettling(true)
    // Where the server cannot be reached the bar stays, and either choice can be made again.
    settle(keep)
      .finally(() => setSettling(false))
      .catch(() => undefined)
  }
  const rows = conflicts.map((conflict, at) => ({ key: String(at), ...conflictWords(layout, conflict) }))
  return (
    <View role="alert" style={styles.conflict}>
      <Text kind="strong">
        {rows.length > 0
          ? 'Somebody else changed the same place. Your edits are kept here and are not stored yet.'
          : 'Somebody else changed this place meanwhile. Your edits are kept here and are not stored yet.'}
      </Text>
      {rows.length > 0 ? (
        <Table
          caption="Values that two people changed"
          columns={[
            { key: 'row', head: 'Where', isRowHead: true, cell: (row) => row.row },
            { key: 'field', head: 'What', cell: (row) => row.field },
            { key: 'mine', head: 'Yours', cell: (row) => row.mine },
            { key: 'theirs', head: 'Theirs', cell: (row) => row.theirs },
          ]}
          rows={rows}
          rowKey={(row) => row.key}
          maxHeight={200}
        />
      ) : null}
      <View style={styles.choices}>
        <Button label="Keep mine" disabled={isSettling} onPress={() => end('mine')} />
        <Button label="Keep theirs" disabled={isSettling} onPress={() => end('theirs')} />
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  conflict: {
    gap: space.s,
    padding: space.m,
    backgroundColor: colour.sheet,
    borderLeftWidth: 4,
    borderBottomWidth: 1,
    borderColor: colour.near,
  },
  choices: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
})
