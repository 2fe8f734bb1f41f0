import type { HardwareData, JackData } from '@wedgeline/contract'
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { router } from 'expo-router'
import { useState } from 'react'
import { v7 as newId } from 'uuid'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Screen } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { useCompanyRoles } from '../company/company-roles'
import { HardwareForm } from './hardware-form'
import { useKeptForm } from './kept-form'
import { newHardware, readHardware, roundsAligned, type TypedHardware } from './typed'

const NEW = 'new'

/** One anchorage of the company. An admin enters and changes it; everybody else reads it. */
export function HardwareScreen({ companyId, hardwareId }: { companyId: string; hardwareId: string }) {
  const list = useQuery(useTRPC().hardware.list.queryOptions({ companyId }))
  const [freshId] = useState(() => newId())
  const parents = [{ label: 'Hardware', href: `/companies/${companyId}/hardware` }] as const
  const isNew = hardwareId === NEW
  const stored = list.data?.hardware.find(({ id }) => id === hardwareId)
  if (list.data && (stored || isNew)) {
    return (
      <HardwareEditor
        key={hardwareId}
        companyId={companyId}
        stored={stored ?? newHardware(freshId)}
        isNew={isNew}
        names={list.data.hardware.filter(({ id }) => id !== hardwareId).map(({ name }) => name)}
        jacks={list.data.jacks}
      />
    )
  }
  return (
    <Screen title="Hardware" parents={parents}>
      {list.data ? (
        <Failed
          what="This hardware is not among the company’s."
          advice="The address may be old. Pick it from the list."
          actions={<Button label="Hardware" href={parents[0].href} />}
        />
      ) : list.error ? (
        <Failed
          what="The hardware could not be fetched."
          advice={failureOf(list.error).sentence}
          onRetry={() => void list.refetch()}
        />
      ) : (
        <Waiting what="the hardware" />
      )}
    </Screen>
  )
}

interface EditorProps {
  readonly companyId: string
  readonly stored: TypedHardware
  readonly isNew: boolean
  readonly names: readonly string[]
  readonly jacks: readonly JackData[]
}

function HardwareEditor({ companyId, stored, isNew, names, jacks }: EditorProps) {
  const isAdmin = useCompanyRoles(companyId).includes('admin')
  const { form, isTyped, set } = useKeptForm(`hardware/${companyId}/${isNew ? NEW : stored.id}`, stored)
  const [isTried, setTried] = useState(false)
  const save = useSaveHardware(companyId, () => set(null))
  const read = readHardware(roundsAligned(form))
  const isTaken = names.includes(form.name.trim())
  const errors = { ...read.errors, ...(isTaken ? { name: 'There is hardware of this name already.' } : {}) }
  const send = () => {
    setTried(true)
    if (read.data && !isTaken) save.mutate({ companyId, hardware: read.data })
  }
  return (
    <Screen
      title={isNew ? 'New hardware' : `Hardware ${stored.name}`}
      parents={[{ label: 'Hardware', href: `/companies/${companyId}/hardware` }]}
      summary={isTyped ? <Text tone="soft">changed, not stored yet</Text> : null}
      actions={
        isAdmin ? (
          <>
            {isTyped ? (
              <Button
                label="Put back"
                disabled={save.isPending}
                onPress={() => {
                  set(null)
                  setTried(false)
                }}
              />
            ) : null}
            <Button kind="main" label="Store" onPress={send} busy={save.isPending} disabled={!isTyped && !isNew} />
          </>
        ) : null
      }
    >
      {isAdmin ? null : <Text tone="soft">An admin of the company enters and changes hardware.</Text>}
      {save.error ? <Banner tone="over" isUrgent words={`Not stored. ${failureOf(save.error).sentence}`} /> : null}
      {isTried && Object.keys(errors).length > 0 ? (
        <Banner
          tone="over"
          isUrgent
          words={`Not stored yet: ${Object.keys(errors).length} values below need another look.`}
        />
      ) : null}
      <HardwareForm
        typed={form}
        onChange={(changed) => set({ ...form, ...changed })}
        errors={isTried ? errors : {}}
        disabled={!isAdmin}
        jacks={jacks}
      />
    </Screen>
  )
}

/** Jobs hold the company's hardware in their layouts, so what was read of them is asked for again. */
function useSaveHardware(companyId: string, onStored: () => void) {
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const say = useToast()
  return useMutation(
    trpc.hardware.save.mutationOptions({
      onSuccess: async (_, { hardware }: { hardware: Pick<HardwareData, 'name'> }) => {
        await queryClient.invalidateQueries(trpc.hardware.list.queryFilter({ companyId }))
        onStored()
        say(`${hardware.name} is stored. Jobs that use it were checked again.`)
        router.replace(`/companies/${companyId}/hardware`)
      },
    }),
  )
}
