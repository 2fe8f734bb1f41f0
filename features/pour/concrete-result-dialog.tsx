import type { LayoutFile } from '@wedgeline/contract'
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { NumberField } from '@/components/ui/number-field'
import { Select } from '@/components/ui/select'
import { TextField } from '@/components/ui/text-field'
import { ON_SITE, typedStrengths } from './concrete-results'

export type ConcreteResultData = LayoutFile['concreteResults'][number]
export type ConcreteResultValues = Omit<ConcreteResultData, 'id' | 'pourId'>

export interface ConcreteResultDialogProps {
  /** The set that is changed; null for a new one. */
  readonly result: ConcreteResultData | null
  /** Answers whether the set was taken. */
  readonly onStore: (values: ConcreteResultValues) => boolean
  readonly onRemove: () => void
  readonly onClose: () => void
}

type Curing = 'on-site' | 'elsewhere'

/** One set of specimens: its age, where it lay, its certificate and each strength. */
export function ConcreteResultDialog({ result, onStore, onRemove, onClose }: ConcreteResultDialogProps) {
  const [ageHours, setAgeHours] = useState<number | null>(result?.ageHours ?? null)
  const [curing, setCuring] = useState<Curing>(!result || /^\s*on site\b/i.test(result.cured) ? 'on-site' : 'elsewhere')
  const [elsewhere, setElsewhere] = useState(curing === 'elsewhere' ? (result?.cured ?? '') : '')
  const [certificate, setCertificate] = useState(result?.certificate ?? '')
  const [specimens, setSpecimens] = useState(result?.specimensMPa.join('  ') ?? '')
  const [isTried, setTried] = useState(false)
  const read = typedStrengths(specimens)
  const isAge = ageHours !== null && ageHours > 0
  const onSite = result && curing === 'on-site' && /^\s*on site\b/i.test(result.cured) ? result.cured : ON_SITE
  const store = () => {
    setTried(true)
    if (!isAge || 'problem' in read) return
    const cured = curing === 'on-site' ? onSite : elsewhere.trim()
    if (onStore({ ageHours, cured, certificate: certificate.trim(), specimensMPa: [...read.strengths] })) onClose()
  }
  return (
    <Dialog
      title={result ? `Specimens at ${result.ageHours} h` : 'A set of specimens'}
      isOpen
      onClose={onClose}
      actions={
        <>
          {result ? <Button label="Remove this set" onPress={onRemove} /> : null}
          <Button label="Cancel" onPress={onClose} />
          <Button kind="main" label="Store" onPress={store} />
        </>
      }
    >
      <NumberField
        label="Age when tested"
        unit="h"
        value={ageHours}
        required
        usual={{ range: '24 before the first stage', source: 'common practice' }}
        error={isTried && !isAge ? 'Type the age in hours, more than 0.' : undefined}
        onCommit={setAgeHours}
        onType={setAgeHours}
      />
      <TextField
        label="Strength of each specimen, cylinder"
        unit="MPa"
        hint="With blanks between them. The lowest counts; the mean stands beside it."
        value={specimens}
        required
        onChangeText={setSpecimens}
        error={isTried && 'problem' in read ? read.problem : undefined}
      />
      <Select
        label="Cured"
        hint="Only specimens that lay beside the pour tell its strength; others need an engineer's judgement."
        options={[
          { value: 'on-site', label: ON_SITE },
          { value: 'elsewhere', label: 'elsewhere' },
        ]}
        value={curing}
        onChange={setCuring}
      />
      {curing === 'elsewhere' ? (
        <TextField label="Where and how" value={elsewhere} maxLength={120} onChangeText={setElsewhere} />
      ) : null}
      <TextField label="Certificate" value={certificate} maxLength={120} onChangeText={setCertificate} />
    </Dialog>
  )
}
