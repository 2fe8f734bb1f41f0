import { ForgottenScreen } from '@/features/sign-in/forgotten-screen'

export default function ForgottenRoute() {
  return <ForgottenScreen />
}
