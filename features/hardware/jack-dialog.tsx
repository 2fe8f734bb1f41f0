import type { JackData } from '@wedgeline/contract'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { v7 as newId } from 'uuid'
import { TextField } from '@/components/ui/text-field'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { JACK_FIELDS } from './fields'
import { NumberGrid } from './number-grid'
import { SmallDialog } from './small-dialog'
import { readJack, type Typed } from './typed'

export interface JackDialogProps {
  readonly companyId: string
  readonly jack: JackData | null
  readonly isAdmin: boolean
  readonly onClose: () => void
}

const EMPTY: Omit<Typed<JackData>, 'id'> = {
  name: '',
  description: '',
  closedLengthMm: null,
  strokeMm: null,
  strandTailMm: null,
  handRoomMm: null,
  bodyDiameterMm: null,
  noseDiameterMm: null,
  noseLengthMm: null,
  bentNoseMaxDeg: 0,
  sideRoomMm: null,
  roomAboveMm: null,
}

/** One jack: how long, how thick, and the room that it needs. */
export function JackDialog({ companyId, jack, isAdmin, onClose }: JackDialogProps) {
  const [typed, setTyped] = useState<Typed<JackData>>(() => jack ?? { id: newId(), ...EMPTY })
  const [isTried, setTried] = useState(false)
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const save = useMutation(
    trpc.hardware.saveJack.mutationOptions({
      onSuccess: async () => {
        await queryClient.invalidateQueries(trpc.hardware.list.queryFilter({ companyId }))
        onClose()
      },
    }),
  )
  const read = readJack(typed)
  const errors = isTried ? read.errors : {}
  return (
    <SmallDialog
      title={jack ? `Jack ${jack.name}` : 'New jack'}
      isAdmin={isAdmin}
      failure={save.error ? failureOf(save.error).sentence : null}
      isBusy={save.isPending}
      onClose={onClose}
      onStore={() => {
        setTried(true)
        if (read.data) save.mutate({ companyId, jack: read.data })
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
      <TextField
        label="What it is for"
        value={typed.description}
        onChangeText={(description) => setTyped({ ...typed, description })}
        error={errors.description}
        disabled={!isAdmin}
        maxLength={200}
      />
      <NumberGrid
        specs={JACK_FIELDS}
        values={typed}
        onChange={(changed) => setTyped({ ...typed, ...changed })}
        errors={errors}
        disabled={!isAdmin}
      />
    </SmallDialog>
  )
}
