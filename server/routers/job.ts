import {
  byJobSchema,
  fileQuickEdgeSchema,
  importLayoutSchema,
  jobBasisSchema,
  jobMemberSchema,
  jobTitleSchema,
  newJobSchema,
} from '@wedgeline/contract'
import { importLayout } from '../job-import'
import {
  addJobMember,
  createJob,
  describeJob,
  listJobs,
  removeJobMember,
  renameJob,
  setBasis,
  settingsOf,
} from '../jobs'
import { fileQuickEdge } from '../quick-edge'
import { companyProcedure, jobPeopleProcedure, jobProcedure, router, signedIn } from '../trpc/builders'

export const jobRouter = router({
  list: signedIn.query(({ ctx }) => listJobs(ctx.db, ctx.person.id)),
  byId: jobProcedure()
    .input(byJobSchema)
    .query(({ ctx }) => describeJob(ctx)),
  create: companyProcedure(['detailer', 'engineer'])
    .input(newJobSchema)
    .mutation(({ ctx, input: { companyId: _, ...job } }) => createJob(ctx, { job, settings: settingsOf(job.basis) })),
  importLayout: companyProcedure(['detailer', 'engineer'])
    .input(importLayoutSchema)
    .mutation(({ ctx, input }) => importLayout(ctx, input.layout, input)),
  update: jobProcedure(['detailer', 'engineer'])
    .input(jobTitleSchema)
    .mutation(({ ctx, input: { number, title } }) => renameJob(ctx, { number, title })),
  fileQuickEdge: jobProcedure(['detailer', 'engineer'])
    .input(fileQuickEdgeSchema)
    .mutation(({ ctx, input: { jobId: _, ...into } }) => fileQuickEdge(ctx, into)),
  setBasis: jobProcedure(['engineer'])
    .input(jobBasisSchema)
    .mutation(({ ctx, input: { jobId: _, ...change } }) => setBasis(ctx, change)),
  addMember: jobPeopleProcedure(['detailer', 'engineer', 'admin'])
    .input(jobMemberSchema)
    .mutation(({ ctx, input }) => addJobMember(ctx, input.personId)),
  removeMember: jobPeopleProcedure(['detailer', 'engineer', 'admin'])
    .input(jobMemberSchema)
    .mutation(({ ctx, input }) => removeJobMember(ctx, input.personId)),
})
