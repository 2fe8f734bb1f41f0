import {
  acceptInvitationSchema,
  byCompanySchema,
  invitationSchema,
  invitationTokenSchema,
  withdrawInvitationSchema,
} from '@wedgeline/contract'
import { acceptInvitation, invitationByToken, invite, withdraw } from '../invite'
import { openInvitationsOf } from '../stores/invitation'
import { companyProcedure, publicProcedure, router } from '../trpc/builders'

export const invitationRouter = router({
  byToken: publicProcedure.input(invitationTokenSchema).query(({ ctx, input }) => invitationByToken(ctx, input.token)),
  accept: publicProcedure.input(acceptInvitationSchema).mutation(({ ctx, input }) => acceptInvitation(ctx, input)),
  list: companyProcedure(['admin'])
    .input(byCompanySchema)
    .query(({ ctx, input }) => openInvitationsOf(ctx.db, { companyId: input.companyId, nowMs: ctx.now() })),
  create: companyProcedure(['admin'])
    .input(invitationSchema)
    .mutation(({ ctx, input: { email, name, roles } }) => invite(ctx, { email, name, roles })),
  withdraw: companyProcedure(['admin'])
    .input(withdrawInvitationSchema)
    .mutation(({ ctx, input }) => withdraw(ctx, input.invitationId)),
})
