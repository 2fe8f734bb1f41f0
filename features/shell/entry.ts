/**
 * Where the client starts. The first screens are named here, so that the bundler keeps what they have in common with
 * what lies behind them in the page's own script, and what only the latter share in a script that comes later.
 */
import '@/features/jobs/jobs-screen'
import '@/features/shell/crash-screen'
import '@/features/shell/not-found-screen'
import '@/features/shell/providers'
import '@/features/shell/work-layout'
import '@/features/sign-in/forgotten-screen'
import '@/features/sign-in/invitation-screen'
import '@/features/sign-in/reset-screen'
import '@/features/sign-in/sign-in-screen'
import 'expo-router/entry'
