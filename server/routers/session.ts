import { signInSchema } from '@wedgeline/contract'
import { me, signIn } from '../sign-in'
import { publicProcedure, router } from '../trpc/builders'

export const sessionRouter = router({
  me: publicProcedure.query(({ ctx }) => (ctx.person ? me(ctx, ctx.person) : null)),
  signIn: publicProcedure.input(signInSchema).mutation(({ ctx, input }) => signIn(ctx, input)),
  signOut: publicProcedure.mutation(({ ctx }) => ctx.session.end()),
})
