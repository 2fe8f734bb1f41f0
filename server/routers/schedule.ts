import { byPourSchema } from '@wedgeline/contract'
import { exportSchedule, scheduleOfPour } from '../schedules'
import { jobProcedure, router } from '../trpc/builders'

export const scheduleRouter = router({
  byPour: jobProcedure()
    .input(byPourSchema)
    .query(({ ctx, input }) => scheduleOfPour(ctx, input.pourId)),
  export: jobProcedure(['drafter', 'detailer', 'engineer'])
    .input(byPourSchema)
    .mutation(({ ctx, input }) => exportSchedule(ctx, input.pourId)),
})
