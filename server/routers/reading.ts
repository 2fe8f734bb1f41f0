import { acceptReadingSchema, withdrawReadingSchema } from '@wedgeline/contract'
import { acceptReading, withdrawReading } from '../readings'
import { jobProcedure, router } from '../trpc/builders'

export const readingRouter = router({
  accept: jobProcedure(['engineer'])
    .input(acceptReadingSchema)
    .mutation(({ ctx, input }) => acceptReading(ctx, input)),
  withdraw: jobProcedure(['engineer'])
    .input(withdrawReadingSchema)
    .mutation(({ ctx, input }) => withdrawReading(ctx, input.readingId)),
})
