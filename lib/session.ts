import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import type { inferOutput } from '@trpc/tanstack-react-query'
import { failureOf, type CallFailure } from './failure'
import { forgetAnswers } from './query'
import { useTRPC } from './trpc'

export type Me = NonNullable<inferOutput<ReturnType<typeof useTRPC>['session']['me']>>

export type Session =
  | { readonly state: 'waiting' }
  | { readonly state: 'failed'; readonly failure: CallFailure; readonly retry: () => void }
  | { readonly state: 'out' }
  | { readonly state: 'in'; readonly me: Me }

/** Who is signed in. While an answer is there it stands, also when asking again fails. */
export function useSession(): Session {
  const trpc = useTRPC()
  const { data, error, refetch } = useQuery(trpc.session.me.queryOptions())
  if (data) return { state: 'in', me: data }
  if (data === null) return { state: 'out' }
  if (error) return { state: 'failed', failure: failureOf(error), retry: () => void refetch() }
  return { state: 'waiting' }
}

/** Signs in; nothing that another person read before on this device is left. */
export function useSignIn() {
  const takeOver = useTakeOver()
  return useMutation(useTRPC().session.signIn.mutationOptions({ onSuccess: takeOver }))
}

/** Accepts an invitation, which signs in. */
export function useAcceptInvitation() {
  const takeOver = useTakeOver()
  return useMutation(useTRPC().invitation.accept.mutationOptions({ onSuccess: takeOver }))
}

/** Takes a new password for a link; whoever was signed in as that person no longer is, here neither. */
export function useResetPassword() {
  const takeOver = useTakeOver()
  return useMutation(useTRPC().session.resetPassword.mutationOptions({ onSuccess: () => takeOver(null) }))
}

/** Signs out and forgets every answer on this device. */
export function useSignOut() {
  const takeOver = useTakeOver()
  return useMutation(useTRPC().session.signOut.mutationOptions({ onSuccess: () => takeOver(null) }))
}

function useTakeOver() {
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  return async (me: Me | null): Promise<void> => {
    await forgetAnswers(queryClient)
    queryClient.setQueryData(trpc.session.me.queryKey(), me)
  }
}
