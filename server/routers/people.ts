import { byCompanySchema, memberSchema, setRolesSchema } from '@wedgeline/contract'
import { removePerson, setRoles } from '../people'
import { membersOf } from '../stores/person'
import { companyProcedure, router } from '../trpc/builders'

export const peopleRouter = router({
  list: companyProcedure()
    .input(byCompanySchema)
    .query(({ ctx, input }) => membersOf(ctx.db, input.companyId)),
  setRoles: companyProcedure(['admin'])
    .input(setRolesSchema)
    .mutation(({ ctx, input }) => setRoles(ctx, input)),
  remove: companyProcedure(['admin'])
    .input(memberSchema)
    .mutation(({ ctx, input }) => removePerson(ctx, input)),
})
