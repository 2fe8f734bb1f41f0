import { auditRouter } from './routers/audit'
import { companyRouter } from './routers/company'
import { hardwareRouter } from './routers/hardware'
import { invitationRouter } from './routers/invitation'
import { jobRouter } from './routers/job'
import { layoutRouter } from './routers/layout'
import { peopleRouter } from './routers/people'
import { readingRouter } from './routers/reading'
import { scheduleRouter } from './routers/schedule'
import { sessionRouter } from './routers/session'
import { router } from './trpc/builders'

export const appRouter = router({
  session: sessionRouter,
  invitation: invitationRouter,
  people: peopleRouter,
  company: companyRouter,
  hardware: hardwareRouter,
  job: jobRouter,
  layout: layoutRouter,
  reading: readingRouter,
  schedule: scheduleRouter,
  audit: auditRouter,
})

export type AppRouter = typeof appRouter
