import { companyRouter } from './routers/company'
import { invitationRouter } from './routers/invitation'
import { peopleRouter } from './routers/people'
import { sessionRouter } from './routers/session'
import { router } from './trpc/builders'

export const appRouter = router({
  session: sessionRouter,
  invitation: invitationRouter,
  people: peopleRouter,
  company: companyRouter,
})

export type AppRouter = typeof appRouter
