import { byPourSchema } from '@wedgeline/contract'
import { exportSchedule, scheduleOfPour } from '../schedules'
import { issueProcedure, jobProcedure, router } from '../trpc/builders'

export const scheduleRouter = router({
  byPour: jobProcedure()
    .input(byPourSchema)
    .query(({ ctx, input }) => scheduleOfPour(ctx, input.pourId)),
  export: issueProcedure(['drafter', 'detailer', 'engineer'])
    .input(byPourSchema)
    .mutation(({ ctx, input }) => exportSchedule(ctx, input.pourId)),
})
