import { SignInScreen } from '@/features/sign-in/sign-in-screen'

export default function SignInRoute() {
  return <SignInScreen />
}
