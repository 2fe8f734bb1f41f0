import { useLocalSearchParams } from 'expo-router'
import { ResetScreen } from '@/features/sign-in/reset-screen'

export default function ResetRoute() {
  const { token } = useLocalSearchParams<{ token: string }>()
  return <ResetScreen token={token} />
}
