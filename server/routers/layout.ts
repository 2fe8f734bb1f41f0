import { ENGINE_VERSION, batchSchema, byJobSchema } from '@wedgeline/contract'
import { keyOf } from '../job-call'
import { applyBatch } from '../layout-editing'
import { loadLayout, loadVersions } from '../stores/layout'
import { jobProcedure, router } from '../trpc/builders'

export const layoutRouter = router({
  byJob: jobProcedure()
    .input(byJobSchema)
    .query(({ ctx }) => ({
      layout: loadLayout(ctx.db, keyOf(ctx)),
      versions: loadVersions(ctx.db, keyOf(ctx)),
      engineVersion: ENGINE_VERSION,
    })),
  applyBatch: jobProcedure(['drafter', 'detailer', 'engineer'])
    .input(batchSchema)
    .mutation(({ ctx, input }) => applyBatch(ctx, input)),
})
