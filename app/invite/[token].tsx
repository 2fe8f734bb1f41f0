import { useLocalSearchParams } from 'expo-router'
import { InvitationScreen } from '@/features/sign-in/invitation-screen'

export default function InvitationRoute() {
  const { token } = useLocalSearchParams<{ token: string }>()
  return <InvitationScreen token={token} />
}
