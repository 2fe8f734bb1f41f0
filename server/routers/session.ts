import { askResetSchema, resetPasswordSchema, signInSchema } from '@wedgeline/contract'
import { askReset, resetPassword } from '../password-reset'
import { me, signIn } from '../sign-in'
import { publicProcedure, router } from '../trpc/builders'

export const sessionRouter = router({
  me: publicProcedure.query(({ ctx }) => (ctx.person ? me(ctx, ctx.person) : null)),
  signIn: publicProcedure.input(signInSchema).mutation(({ ctx, input }) => signIn(ctx, input)),
  signOut: publicProcedure.mutation(({ ctx }) => ctx.session.end()),
  askReset: publicProcedure.input(askResetSchema).mutation(({ ctx, input }) => askReset(ctx, input.email)),
  resetPassword: publicProcedure.input(resetPasswordSchema).mutation(({ ctx, input }) => resetPassword(ctx, input)),
})
