import { byCompanySchema, companyNameSchema } from '@wedgeline/contract'
import { renameCompany, theCompany } from '../company'
import { companyProcedure, router } from '../trpc/builders'

export const companyRouter = router({
  byId: companyProcedure()
    .input(byCompanySchema)
    .query(({ ctx, input }) => theCompany(ctx.db, input.companyId)),
  update: companyProcedure(['admin'])
    .input(companyNameSchema)
    .mutation(({ ctx, input: { name, note } }) => renameCompany(ctx, { name, note })),
})
