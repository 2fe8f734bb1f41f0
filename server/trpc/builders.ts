import { ROLES, idSchema, type Role } from '@wedgeline/contract'
import { TRPCError, initTRPC } from '@trpc/server'
import { z } from 'zod'
import { authoriseCompany, authoriseJob, requireRole } from '../access'
import { assertFiled } from '../quick-edge'
import type { Context } from './context'
import { errorShape, toTrpcError } from './error-shape'

/**
 * The kinds of procedure. Each reads who is asking and what they may do anew on every call; a procedure then adds its
 * own strict input schema, which refuses keys that it does not know, and makes one call.
 */

const t = initTRPC.context<Context>().create({ isDev: false, errorFormatter: errorShape })

export const router = t.router
export const createCallerFactory = t.createCallerFactory

/** Anybody, signed in or not. */
export const publicProcedure = t.procedure.use(async ({ next }) => {
  const result = await next()
  if (!result.ok) throw toTrpcError(result.error)
  return result
})

/** A person who is signed in, whatever their roles: `ctx.person`. */
export const signedIn = publicProcedure.use(({ ctx, next }) => {
  if (!ctx.person) throw new TRPCError({ code: 'UNAUTHORIZED', message: 'Sign in first.' })
  return next({ ctx: { person: ctx.person } })
})

/**
 * A member of the company that `companyId` of the input names, with one of the roles (any role when none is named).
 * Adds `ctx.company`. A company that does not exist and one that the person is not in answer alike.
 */
export const companyProcedure = (roles: readonly Role[] = ROLES) =>
  signedIn.input(z.object({ companyId: idSchema })).use(({ ctx, input, next }) => {
    const company = authoriseCompany(ctx, input.companyId)
    requireRole(company, roles)
    return next({ ctx: { company } })
  })

/**
 * Somebody on the job that `jobId` of the input names, with one of the roles in its company (any role when none is
 * named). Adds `ctx.job` and `ctx.company`. An unknown job, one of another company and one whose people the person is
 * not among answer alike.
 */
export const jobProcedure = (roles: readonly Role[] = ROLES) =>
  signedIn.input(z.object({ jobId: idSchema })).use(({ ctx, input, next }) => {
    const { job, company } = authoriseJob(ctx, input.jobId)
    requireRole(company, roles)
    return next({ ctx: { job, company } })
  })

/** As `jobProcedure`, and an admin of the job's company who is not on the job: who belongs to it is theirs to mend. */
export const jobPeopleProcedure = (roles: readonly Role[]) =>
  signedIn.input(z.object({ jobId: idSchema })).use(({ ctx, input, next }) => {
    const { job, company } = authoriseJob(ctx, input.jobId, { adminsToo: true })
    requireRole(company, roles)
    return next({ ctx: { job, company } })
  })

/** As `jobProcedure`, for what leaves the office: a quick edge is kept in a job first. */
export const issueProcedure = (roles: readonly Role[]) =>
  jobProcedure(roles).use(({ ctx, next }) => {
    assertFiled(ctx.db, ctx.job)
    return next()
  })
