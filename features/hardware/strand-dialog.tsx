import type { StrandTypeData } from '@wedgeline/contract'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { v7 as newId } from 'uuid'
import { TextField } from '@/components/ui/text-field'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { STRAND_FIELDS } from './fields'
import { NumberGrid } from './number-grid'
import { SmallDialog } from './small-dialog'
import { readStrandType, type Typed } from './typed'

export interface StrandDialogProps {
  readonly companyId: string
  readonly strandType: StrandTypeData | null
  readonly isAdmin: boolean
  readonly onClose: () => void
}

const EMPTY = {
  name: '',
  diameterMm: null,
  areaMm2: null,
  breakingLoadKN: null,
  proofLoadKN: null,
  modulusMPa: 195_000,
}

/** One strand: its size and the loads that the jacking force is held against. */
export function StrandDialog({ companyId, strandType, isAdmin, onClose }: StrandDialogProps) {
  const [typed, setTyped] = useState<Typed<StrandTypeData>>(() => strandType ?? { id: newId(), ...EMPTY })
  const [isTried, setTried] = useState(false)
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const save = useMutation(
    trpc.hardware.saveStrandType.mutationOptions({
      onSuccess: async () => {
        await queryClient.invalidateQueries(trpc.hardware.list.queryFilter({ companyId }))
        onClose()
      },
    }),
  )
  const read = readStrandType(typed)
  const errors = isTried ? read.errors : {}
  return (
    <SmallDialog
      title={strandType ? `Strand ${strandType.name}` : 'New strand type'}
      isAdmin={isAdmin}
      failure={save.error ? failureOf(save.error).sentence : null}
      isBusy={save.isPending}
      onClose={onClose}
      onStore={() => {
        setTried(true)
        if (read.data) save.mutate({ companyId, strandType: read.data })
      }}
    >
      <TextField
        label="Name"
        value={typed.name}
        onChangeText={(name) => setTyped({ ...typed, name })}
        error={errors.name}
        disabled={!isAdmin}
        maxLength={60}
        required
      />
      <NumberGrid
        specs={STRAND_FIELDS}
        values={typed}
        onChange={(changed) => setTyped({ ...typed, ...changed })}
        errors={errors}
        disabled={!isAdmin}
      />
    </SmallDialog>
  )
}
