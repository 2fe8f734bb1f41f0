import type { Check } from '@wedgeline/engine'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space, useWide } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { LimitKindBox } from '@/components/ui/limit-kind'
import { Link } from '@/components/ui/link'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { OnProposed } from '../checks/on-proposed'
import { clauseText, notYetText, outcomeText, shownQuantity, sidesText } from '../checks/words'
import { calculationPathOf, pathOfZone } from '../checks/zone-words'
import type { ZoneRow } from './zone-rows'

export interface ZoneChecksProps {
  readonly jobId: string
  readonly row: ZoneRow
  /** Only checks of one status are shown. */
  readonly isNarrowed: boolean
}

/** Checks of a zone that need no look are folded away until asked for. */
const FOLDED = 6

/** One zone: its name, its checks in a line each, and where to go from here. */
export function ZoneChecks({ jobId, row, isNarrowed }: ZoneChecksProps) {
  const { zone, notYetChecked } = row.result
  const [isOpen, setOpen] = useState(false)
  const shown = isOpen ? row.checks : row.checks.slice(0, FOLDED)
  const hidden = row.checks.length - shown.length
  const path = pathOfZone(jobId, zone)
  const missing = notYetText(notYetChecked)
  return (
    <View>
      <View style={styles.head}>
        <Text kind="heading" level={2}>
          {zone.name}
        </Text>
        <View style={styles.links}>
          <Link href={calculationPathOf(jobId, zone.id)} aria-label={`Calculation of ${zone.name}`}>
            Calculation
          </Link>
          {path ? (
            <Link href={path.path} aria-label={`${zone.name} ${path.words.toLowerCase()}`}>
              {path.words}
            </Link>
          ) : null}
        </View>
      </View>
      {shown.map((check, at) => (
        <CheckRow key={at} check={check} />
      ))}
      {hidden > 0 ? (
        <View style={styles.more}>
          <Button
            kind="quiet"
            label={`${hidden} more ${hidden === 1 ? 'check' : 'checks'} of ${zone.name}`}
            icon={<Icon name="down" size={12} />}
            onPress={() => setOpen(true)}
          />
        </View>
      ) : null}
      {missing && !isNarrowed ? (
        <Text kind="small" tone="soft" style={styles.missing}>
          {missing}
        </Text>
      ) : null}
    </View>
  )
}

function CheckRow({ check }: { readonly check: Check }) {
  const isWide = useWide()
  const name = check.stage ? `${check.name}, ${check.stage}` : check.name
  const words = wordsOf(check)
  const named = (
    <View style={styles.named}>
      {check.kind === 'advice' ? <Icon name="info" /> : <StatusMark status={check.status} markOnly />}
      <Text style={styles.shrink}>{name}</Text>
      <LimitKindBox kind={check.limitKind} />
      <OnProposed check={check} />
    </View>
  )
  const outcome = (
    <Text kind="figureStrong" tone={isOver(check) ? 'over' : 'ink'} style={isWide ? styles.outcome : undefined}>
      {words.outcome}
    </Text>
  )
  if (!isWide) {
    return (
      <View style={styles.phone}>
        <View style={styles.line}>
          {named}
          {outcome}
        </View>
        <Text kind="small" tone="soft" style={styles.indent}>
          {[words.sides, clauseText(check.clause)].filter(Boolean).join(' · ')}
        </Text>
      </View>
    )
  }
  return (
    <View style={styles.wide}>
      <View style={styles.name}>{named}</View>
      <Text kind="figure" style={styles.sides}>
        {words.sides}
      </Text>
      {outcome}
      <Text kind="small" tone="soft" style={styles.clause}>
        {clauseText(check.clause)}
      </Text>
    </View>
  )
}

const isOver = (check: Check): boolean =>
  check.kind !== 'advice' && (check.status === 'over' || check.status === 'stop')

function wordsOf(check: Check): { readonly sides: string; readonly outcome: string } {
  switch (check.kind) {
    case 'compared':
      return { sides: sidesText(check), outcome: outcomeText(check) }
    case 'refused':
      return { sides: check.message, outcome: 'not covered' }
    case 'advice':
      return {
        sides: `${shownQuantity(check.measured, check.unit)}, usually ${check.usual}`,
        outcome: check.isUsual ? 'as usual' : 'not usual',
      }
  }
}

const styles = StyleSheet.create({
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    justifyContent: 'space-between',
    columnGap: space.l,
    borderBottomWidth: 1,
    borderColor: colour.ink,
    paddingBottom: 2,
  },
  links: { flexDirection: 'row', gap: space.l },
  wide: {
    flexDirection: 'row',
    alignItems: 'baseline',
    columnGap: space.l,
    paddingVertical: 3,
    borderBottomWidth: 1,
    borderColor: colour.rule,
  },
  phone: { paddingVertical: 6, borderBottomWidth: 1, borderColor: colour.rule, gap: 2 },
  line: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'flex-start', gap: space.s },
  named: { flexDirection: 'row', alignItems: 'center', gap: space.s, flexShrink: 1, minWidth: 0 },
  shrink: { flexShrink: 1, minWidth: 0 },
  name: { flexBasis: '28%', minWidth: 0 },
  sides: { flexBasis: '28%', minWidth: 0, flexShrink: 1 },
  outcome: { flexBasis: 120 },
  clause: { flex: 1, minWidth: 0 },
  indent: { paddingLeft: 24 },
  more: { flexDirection: 'row' },
  missing: { paddingTop: space.xs },
})
