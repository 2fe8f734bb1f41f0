import { byCompanySchema, saveHardwareSchema, saveJackSchema, saveStrandTypeSchema } from '@wedgeline/contract'
import { saveHardware, saveJack, saveStrandType } from '../company-hardware'
import { hardwareOf } from '../stores/hardware'
import { companyProcedure, router } from '../trpc/builders'

export const hardwareRouter = router({
  list: companyProcedure()
    .input(byCompanySchema)
    .query(({ ctx }) => hardwareOf(ctx.db, ctx.company.id)),
  save: companyProcedure(['admin'])
    .input(saveHardwareSchema)
    .mutation(({ ctx, input }) => saveHardware(ctx, input.hardware)),
  saveJack: companyProcedure(['admin'])
    .input(saveJackSchema)
    .mutation(({ ctx, input }) => saveJack(ctx, input.jack)),
  saveStrandType: companyProcedure(['admin'])
    .input(saveStrandTypeSchema)
    .mutation(({ ctx, input }) => saveStrandType(ctx, input.strandType)),
})
