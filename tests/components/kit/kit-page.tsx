import { useState } from 'react'
import { View } from 'react-native'
import type { Status } from '@wedgeline/engine'
import { space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { BottomSheet } from '@/components/ui/bottom-sheet'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Dialog } from '@/components/ui/dialog'
import { Icon } from '@/components/ui/icon'
import type { IconName } from '@/components/ui/icon-lines'
import { ICON_LINES } from '@/components/ui/icon-lines'
import { LimitKindBox } from '@/components/ui/limit-kind'
import { Menu } from '@/components/ui/menu'
import { NavBar } from '@/components/ui/nav-bar'
import { NumberField } from '@/components/ui/number-field'
import { Screen, Section } from '@/components/ui/screen'
import { Select } from '@/components/ui/select'
import { Empty, Failed, Waiting } from '@/components/ui/states'
import { StatusMark } from '@/components/ui/status-mark'
import { Table } from '@/components/ui/table'
import { Tabs } from '@/components/ui/tabs'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { useToast } from '@/components/ui/toast'
import { DrawingSample } from './drawing-sample'

const STATUSES: readonly Status[] = ['stop', 'not-covered', 'over', 'needs-judgement', 'near', 'within']
const PARENTS = [
  { label: 'Quillmarsh Yard', href: '/' as const },
  { label: 'Pour P3', href: '/' as const },
]

const ANCHORS = [
  { mark: 'E6-01', end: 'live', chainage: 900, height: 110, status: 'within', words: 'bursting 0.74' },
  { mark: 'E6-02', end: 'dead', chainage: 2100, height: 110, status: 'not-covered', words: 'dead end' },
  { mark: 'E6-03', end: 'live', chainage: 3300, height: 62, status: 'over', words: 'height, short 13' },
  { mark: 'E6-04', end: 'live', chainage: 4500, height: 110, status: 'near', words: 'bursting 0.97' },
  { mark: 'E6-05', end: 'live', chainage: 5700, height: 110, status: 'needs-judgement', words: 'uneven row' },
] as const

/** Every part of the kit, closed and open, on one page. Built for tests alone. */
export function KitPage() {
  return (
    <Screen
      title="Edge E6, north"
      parents={PARENTS}
      summary={
        <>
          <StatusMark status="over" words="2 over" />
          <StatusMark status="near" words="1 near" />
          <StatusMark status="within" words="61 within" />
        </>
      }
      actions={
        <>
          <Button label="Undo" />
          <Button label="Paste anchors" disabled />
          <Button label="Propose steel" kind="main" />
        </>
      }
      nav={
        <NavBar
          label="Pour"
          items={['Plan', 'Zones', 'Schedule', 'Review', 'Walk'].map((label, index) => ({
            label,
            href: `/${label}` as '/',
            isHere: index === 1,
          }))}
        />
      }
    >
      <Marks />
      <Fields />
      <Anchors />
      <Overlays />
      <Section title="Drawing">
        <DrawingSample />
      </Section>
      <Section title="States">
        <Waiting what="the pours of this job" />
        <Failed
          what="The pours could not be fetched."
          advice="There is no connection. Try again once there is signal."
          onRetry={() => {}}
        />
        <Empty
          what="No pours yet."
          firstStep="Draw the outline of the first pour, or bring in a layout file."
          action={<Button kind="main" label="New pour" />}
        />
        <Banner
          words="A newer version is there. It is taken when nothing is left to send."
          actions={<Button label="Reload" />}
        />
        <Banner tone="over" words="Issue B is withdrawn: do not build from this." />
        <Banner tone="near" words="14 readings are not sent." />
      </Section>
    </Screen>
  )
}

function Marks() {
  return (
    <Section title="Marks">
      <View style={row}>
        {STATUSES.map((status) => (
          <StatusMark key={status} status={status} />
        ))}
      </View>
      <View style={row}>
        {STATUSES.map((status) => (
          <StatusMark key={status} status={status} markOnly size={24} />
        ))}
        <LimitKindBox kind="C" />
        <LimitKindBox kind="H" />
        <LimitKindBox kind="P" />
      </View>
      <View style={row}>
        {(Object.keys(ICON_LINES) as IconName[]).map((name) => (
          <Icon key={name} name={name} />
        ))}
      </View>
    </Section>
  )
}

function Fields() {
  const [chainage, setChainage] = useState<number | null>(3300)
  const [height, setHeight] = useState<number | null>(62)
  const [name, setName] = useState('')
  const [end, setEnd] = useState<'live' | 'dead' | null>(null)
  const [isCracked, setCracked] = useState(true)
  return (
    <Section title="Fields">
      <View style={fields}>
        <NumberField
          label="Chainage"
          unit="mm"
          value={chainage}
          onCommit={setChainage}
          usual={{ range: '300 to 20000', source: 'common practice' }}
        />
        <NumberField
          label="Height above soffit"
          unit="mm"
          value={height}
          onCommit={setHeight}
          note={
            <View style={{ gap: space.s }}>
              <StatusMark
                kind="small"
                status="over"
                words="62 is 13 short of the 75 that this hardware needs. Kept as typed."
              />
              <View style={row}>
                <Button label="Use 75" onPress={() => setHeight(75)} />
                <Button label="Other hardware" />
                <Button label="Give a reason" />
              </View>
            </View>
          }
        />
        <TextField label="Name of the job" value={name} onChangeText={setName} required hint="As on the drawings." />
        <TextField
          label="Address"
          value="rowan@"
          onChangeText={() => {}}
          error="“rowan@” is no address. Write name@place."
        />
        <TextField label="Reason" value="" onChangeText={() => {}} multiline />
        <TextField label="Locked" value="E6" onChangeText={() => {}} disabled />
        <Select
          label="End"
          value={end}
          onChange={setEnd}
          options={[
            { value: 'live', label: 'live' },
            { value: 'dead', label: 'dead' },
          ]}
        />
        <View>
          <Checkbox label="Concrete is cracked" checked={isCracked} onChange={setCracked} hint="At stressing." />
          <Checkbox label="Not to be changed" checked={false} onChange={() => {}} disabled />
        </View>
      </View>
      <View style={row}>
        <Button label="Main" kind="main" />
        <Button label="Ordinary" />
        <Button label="Quiet" kind="quiet" icon={<Icon name="plus" />} />
        <Button label="Off" disabled />
        <Button label="Saving" busy />
        <Button label="Print" iconOnly icon={<Icon name="print" />} />
        <Button label="To the walk" href="/" />
        <Button label="Workbook" fileHref="/exports/1" icon={<Icon name="download" />} />
        <Button label="As drawn" large />
      </View>
    </Section>
  )
}

function Anchors() {
  const [selected, setSelected] = useState<string | null>('E6-03')
  return (
    <Section title="Anchors">
      <Table
        caption="Anchors of edge E6"
        columns={[
          { key: 'mark', head: 'Anchor', isRowHead: true, cell: (anchor) => anchor.mark },
          { key: 'end', head: 'End', cell: (anchor) => anchor.end },
          { key: 'chainage', head: 'Chainage, mm', align: 'end', cell: (anchor) => anchor.chainage },
          { key: 'height', head: 'Height, mm', align: 'end', cell: (anchor) => anchor.height },
          { key: 'steel', head: 'Steel', cell: () => '3 links H8, 4 H12 across' },
          {
            key: 'worst',
            head: 'Worst',
            cell: (anchor) => <StatusMark status={anchor.status} words={anchor.words} kind="figure" />,
          },
        ]}
        rows={ANCHORS}
        rowKey={(anchor) => anchor.mark}
        selectedKey={selected}
        onSelect={(anchor) => setSelected(anchor.mark)}
        foot={{ mark: '5 anchors', steel: '96 kg' }}
      />
    </Section>
  )
}

function Overlays() {
  const [open, setOpen] = useState<'dialog' | 'sheet' | null>(null)
  const [tab, setTab] = useState<'checks' | 'steel' | 'notes'>('checks')
  const say = useToast()
  const close = () => setOpen(null)
  return (
    <Section title="What opens">
      <View style={row}>
        <Button label="Open dialog" aria-haspopup="dialog" onPress={() => setOpen('dialog')} />
        <Button label="Open sheet" aria-haspopup="dialog" onPress={() => setOpen('sheet')} />
        <Menu
          label="More"
          items={[
            { key: 'copy', label: 'Copy anchors', onPress: () => say('5 anchors copied.') },
            { key: 'renumber', label: 'Renumber', disabled: true },
            { key: 'walk', label: 'Walk', href: '/' },
            { key: 'remove', label: 'Remove edge', startsGroup: true },
          ]}
        />
        <Button
          label="Say"
          onPress={() => say({ words: 'Anchor removed.', action: { label: 'Undo', onPress: () => {} } })}
        />
      </View>
      <Tabs
        label="Anchor E6-03"
        selected={tab}
        onSelect={setTab}
        tabs={[
          { key: 'checks', label: 'Checks' },
          { key: 'steel', label: 'Steel' },
          { key: 'notes', label: 'Notes' },
        ]}
      >
        <Text>{`What is under ${tab}.`}</Text>
      </Tabs>
      <Dialog
        title="Remove the edge?"
        isOpen={open === 'dialog'}
        onClose={close}
        actions={
          <>
            <Button label="Keep it" onPress={close} />
            <Button kind="main" label="Remove" onPress={close} />
          </>
        }
      >
        <Text>Its 12 anchors go with it. Undo brings them back.</Text>
        <NumberField label="Anchors to keep" value={12} onCommit={() => {}} />
      </Dialog>
      <BottomSheet
        title="E6-03, live end"
        detail="A + 1800"
        isOpen={open === 'sheet'}
        onClose={close}
        bar={
          <View style={{ flex: 1, flexDirection: 'row', justifyContent: 'space-around' }}>
            <Button kind="quiet" label="02" icon={<Icon name="back" />} />
            <Button kind="quiet" label="Undo" />
            <Button kind="quiet" label="04" icon={<Icon name="forward" />} />
          </View>
        }
      >
        <NumberField label="Height above soffit" unit="mm" value={62} onCommit={() => {}} />
        <StatusMark status="over" words="62 is 13 short of the 75 that this hardware needs." />
      </BottomSheet>
    </Section>
  )
}

const row = {
  flexDirection: 'row',
  flexWrap: 'wrap',
  alignItems: 'center',
  columnGap: space.l,
  rowGap: space.s,
} as const
const fields = {
  display: 'grid',
  gridTemplateColumns: 'repeat(auto-fill, minmax(260px, 1fr))',
  gap: space.l,
} as unknown as { gap: number }
