import { auditListSchema } from '@wedgeline/contract'
import { keyOf } from '../job-call'
import { auditOf } from '../stores/audit'
import { jobProcedure, router } from '../trpc/builders'

export const auditRouter = router({
  list: jobProcedure()
    .input(auditListSchema)
    .query(({ ctx, input: { limit, before } }) => auditOf(ctx.db, keyOf(ctx), { limit, before })),
})
