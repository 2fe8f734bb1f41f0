import { BASIS_SOURCES } from '@wedgeline/engine/bases'
import { FAMILIES } from '@wedgeline/engine/result'
import { router, useLocalSearchParams } from 'expo-router'
import { useEffect } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Screen, Section } from '@/components/ui/screen'
import { Select } from '@/components/ui/select'
import { Empty, Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { FactorsAndReadings, NotChecked } from './beside-formulas'
import type { Method, MethodFamily } from './method'
import { anchorOf, MethodEntry } from './method-entry'
import { narrowed, type MethodFilter } from './method-filter'
import { familyTitle, methodsByFamily, surenessCounts, surenessWords, SURENESS, type Sureness } from './method-words'
import { useMethods } from './use-methods'

const ALL = 'all'
const MAY: readonly MethodFamily[] = [...FAMILIES, 'schedule']

/** Every formula with its clause, how sure we are of it, and the test that shows it to be right. */
export function MethodsScreen() {
  const methods = useMethods()
  return (
    <Screen title="How it is checked" parents={[{ label: 'Jobs', href: '/' }]}>
      <Cautions />
      {methods.data ? (
        <Methods methods={methods.data} />
      ) : methods.error ? (
        <Failed
          what="The list of methods could not be fetched."
          advice="It comes with the program. Try again once the network is there; docs/methods.md holds the same list."
          onRetry={() => void methods.refetch()}
        />
      ) : (
        <Waiting what="the list of methods" />
      )}
      <NotChecked />
    </Screen>
  )
}

function Cautions() {
  return (
    <View style={styles.text}>
      <Text>
        Every number comes from one of these formulas. Each line of a calculation is made from the same data as this
        list. No code of practice was read in the original print: compare a clause with the standard before relying on
        it.
      </Text>
      <Text>Results assist a qualified engineer and do not replace one. Local codes and licensed practice govern.</Text>
    </View>
  )
}

function Methods({ methods }: { readonly methods: readonly Method[] }) {
  const filter = useFilter()
  const { method: asked = null } = useLocalSearchParams<{ method?: string }>()
  const shown = narrowed(methods, filter)
  useEffect(() => {
    if (asked === null || typeof document === 'undefined') return
    document.getElementById(anchorOf(asked))?.scrollIntoView({ block: 'center' })
  }, [asked])
  return (
    <>
      <Counts methods={methods} />
      <Filters filter={filter} />
      {shown.length === 0 ? (
        <Empty
          what="No formula is like that."
          firstStep="Widen the list."
          action={<Button label="Show all" onPress={() => narrow({ basis: ALL, family: ALL, sure: ALL })} />}
        />
      ) : null}
      {methodsByFamily(shown).map(({ family, list }) => (
        <Section key={family} title={familyTitle(family)}>
          <View role="list">
            {list.map((method) => (
              <MethodEntry key={method.id} method={method} isAsked={method.id === asked} />
            ))}
          </View>
        </Section>
      ))}
      <FactorsAndReadings basis={filter.basis} />
    </>
  )
}

function Counts({ methods }: { readonly methods: readonly Method[] }) {
  const clauses = methods.flatMap((method) => method.clauses)
  const counts = surenessCounts(clauses).map(({ words, count }) => `${count} ${words}`)
  return (
    <Text kind="strong" style={styles.text}>
      {`${methods.length} formulas on ${clauses.length} clauses: ${counts.join(', ')}.`}
    </Text>
  )
}

interface Asked {
  readonly basis?: string
  readonly family?: string
  readonly sure?: string
}

const narrow = (asked: Asked) => router.setParams({ ...asked, method: undefined })

/** What the address asks for; a word that is none asks for nothing. */
function useFilter(): MethodFilter {
  const { basis, family, sure } = useLocalSearchParams<{ basis?: string; family?: string; sure?: string }>()
  return {
    basis: BASIS_SOURCES.find(({ id }) => id === basis)?.id ?? null,
    family: MAY.find((one) => one === family) ?? null,
    sureness: SURENESS.find((one) => one === sure) ?? null,
  }
}

function Filters({ filter }: { readonly filter: MethodFilter }) {
  const everything = { value: ALL, label: 'all' } as const
  return (
    <View style={styles.filters} dataSet={{ print: 'no' }}>
      <View style={styles.filter}>
        <Select
          label="Basis"
          options={[everything, ...BASIS_SOURCES.map(({ id, title }) => ({ value: id, label: title }))]}
          value={filter.basis ?? ALL}
          onChange={(basis) => narrow({ basis })}
        />
      </View>
      <View style={styles.filter}>
        <Select<MethodFamily | typeof ALL>
          label="Family of checks"
          options={[everything, ...MAY.map((family) => ({ value: family, label: familyTitle(family) }))]}
          value={filter.family ?? ALL}
          onChange={(family) => narrow({ family })}
        />
      </View>
      <View style={styles.filter}>
        <Select<Sureness | typeof ALL>
          label="How sure"
          options={[everything, ...SURENESS.map((sure) => ({ value: sure, label: surenessWords(sure) }))]}
          value={filter.sureness ?? ALL}
          onChange={(sure) => narrow({ sure })}
        />
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  text: { maxWidth: 900, gap: space.xs },
  filters: { flexDirection: 'row', flexWrap: 'wrap', gap: space.l },
  filter: { width: 240, maxWidth: '100%' },
})
