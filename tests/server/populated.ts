import { v7 as uuidv7 } from 'uuid'
import type { AnyTRPCProcedure } from '@trpc/server'
import { ROLES, type LayoutFile, type Role } from '@wedgeline/contract'
import { write } from '@/db/client'
import { appRouter } from '@/server/router'
import { hashToken } from '@/server/session'
import { insertFile } from '@/server/stores/file'
import { insertInvitation } from '@/server/stores/invitation'
import { insertPasswordLink } from '@/server/stores/password-link'
import { insertPerson, setMember } from '@/server/stores/person'
import { createCallerFactory } from '@/server/trpc/builders'
import { addCompany } from './company'
import { contextFor } from './context'
import { sampleLayout } from './layout-sample'
import { PASSWORD, PASSWORD_HASH, openTestServer, type TestServer } from './server'

/** A server with a job, records of every kind, callers of every kind, and an input that is right for each procedure. */

export const CALLERS = [...ROLES, 'nobody', 'other company', 'off the job', 'admin off the job'] as const
export type CallerName = (typeof CALLERS)[number]
/** One who may everything beside them, for inputs alone. */
export type Person = Exclude<CallerName, 'nobody'> | 'everything'

export const PROCEDURES = appRouter._def.procedures as unknown as Record<string, AnyTRPCProcedure>
const TOKEN = 'an-invitation-token-for-this-test-alone'
const RESET_TOKEN = 'a-token-of-a-new-password-for-this-test-alone'
/** One that is accepted before the calls and one that is not. */
const READING = 'en-window'
const OTHER_READING = 'en-own-prism'

const createCaller = createCallerFactory(appRouter)
type AnyCaller = Record<string, Record<string, (input: unknown) => Promise<unknown>>>

export interface Populated {
  readonly server: TestServer
  readonly jobId: string
  readonly fileId: string
  readonly people: Readonly<Record<Person, string>>
  /** An input for each procedure that a caller with the right to it gets an answer to. */
  readonly inputs: Readonly<Record<string, unknown>>
  call(name: Person | 'nobody', path: string, input: unknown): Promise<unknown>
  /** Works and puts the database back as it was. */
  tried<T>(work: () => Promise<T>): Promise<T>
}

export async function openPopulated(): Promise<Populated> {
  const server = openTestServer()
  const { company, db } = server
  const detailer = company.as('detailer')
  const { jobId } = await detailer.job.importLayout({ companyId: company.id, layout: sampleLayout() })
  const people = addOthers(server)
  const onJob = [...ROLES.filter((role) => role !== 'detailer'), 'everything' as const]
  const quick = await detailer.job.importLayout({ companyId: company.id, layout: sampleLayout(), isUnfiled: true })
  for (const name of onJob) {
    await detailer.job.addMember({ jobId, personId: people[name] })
    await detailer.job.addMember({ jobId: quick.jobId, personId: people[name] })
  }
  const { layout, versions } = await detailer.layout.byJob({ jobId })
  await company.as('engineer').reading.accept({ jobId, readingId: READING, reason: 'As the test needs.' })
  return {
    server,
    jobId,
    fileId: await addRecords(server, jobId),
    people,
    inputs: validInputs({ companyId: company.id, jobId, quickId: quick.jobId, layout, versions }),
    call(name, path, input) {
      const caller = createCaller(contextFor(server, name === 'nobody' ? null : people[name])) as unknown as AnyCaller
      const [area = '', procedure = ''] = path.split('.')
      return caller[area]?.[procedure]?.(input) ?? Promise.reject(new Error(`There is no ${path}.`))
    },
    async tried(work) {
      db.$client.exec('BEGIN')
      try {
        return await work()
      } finally {
        db.$client.exec('ROLLBACK')
      }
    },
  }
}

interface Loaded {
  readonly companyId: string
  readonly jobId: string
  /** A quick edge with the same people on it. */
  readonly quickId: string
  readonly layout: LayoutFile
  readonly versions: Readonly<Record<string, number>>
}

/** Everybody beside the five of the company, who hold a role each. */
function addOthers({ db, company }: TestServer): Record<Person, string> {
  const south = addCompany(db, 'south')
  const add = (id: string, companyId: string, roles: readonly Role[]) =>
    write(db, (tx) => {
      insertPerson(tx, { id, name: id, email: `${id}@x.example`, passwordHash: PASSWORD_HASH, nowMs: 0 })
      setMember(tx, { companyId, personId: id, roles, nowMs: 0 })
    })
  add('everything-in-south', south.id, ROLES)
  add(
    'off-the-job',
    company.id,
    ROLES.filter((role) => role !== 'admin'),
  )
  add('admin-off-the-job', company.id, ['admin'])
  add('leaver', company.id, ['inspector'])
  add('everything', company.id, ROLES)
  const own = Object.fromEntries(ROLES.map((role) => [role, company.personId(role)])) as Record<Role, string>
  return {
    ...own,
    everything: 'everything',
    'other company': 'everything-in-south',
    'off the job': 'off-the-job',
    'admin off the job': 'admin-off-the-job',
  }
}

/** An open invitation, a link to a new password and a stored file, whose id is returned. */
async function addRecords({ db, company, files }: TestServer, jobId: string): Promise<string> {
  const createdBy = company.personId('admin')
  const companyId = company.id
  const roles: Role[] = ['drafter']
  write(db, (tx) => {
    const times = { createdAtMs: 0, createdBy, expiresAtMs: Date.UTC(2100, 0, 1) }
    const invitation = { companyId, id: 'invitation-1', email: 'new@x.example', name: 'New', roles }
    insertInvitation(tx, { ...invitation, tokenHash: hashToken(TOKEN), ...times })
    const link = { tokenHash: hashToken(RESET_TOKEN), personId: 'leaver', nowMs: 0 }
    insertPasswordLink(tx, { ...link, expiresAtMs: times.expiresAtMs })
  })
  const { sha256 } = await files.save(companyId, Buffer.from('bars'))
  const fileId = uuidv7()
  insertFile(db, {
    ...{ companyId, id: fileId, jobId, sha256, name: 'bars.txt', type: 'text/plain', bytes: 4 },
    ...{ createdAtMs: 0, createdBy },
  })
  return fileId
}

/** An input for each procedure that a caller with the right to it gets an answer to. */
function validInputs({ companyId, jobId, quickId, layout, versions }: Loaded): Record<string, unknown> {
  const pourId = layout.pours[0]?.id
  const sample = sampleLayout()
  return {
    'session.me': undefined,
    'session.signIn': { email: 'leaver@x.example', password: PASSWORD },
    'session.signOut': undefined,
    'session.askReset': { email: 'leaver@x.example' },
    'session.resetPassword': { token: RESET_TOKEN, password: PASSWORD },
    'invitation.byToken': { token: TOKEN },
    'invitation.accept': { token: TOKEN, name: 'New', password: PASSWORD },
    'invitation.list': { companyId },
    'invitation.create': { companyId, email: 'newer@x.example', name: 'Newer', roles: ['drafter'] },
    'invitation.withdraw': { companyId, invitationId: 'invitation-1' },
    'people.list': { companyId },
    'people.setRoles': { companyId, personId: 'leaver', roles: ['drafter'] },
    'people.remove': { companyId, personId: 'leaver' },
    'company.byId': { companyId },
    'company.update': { companyId, name: 'North', note: '' },
    'hardware.list': { companyId },
    'hardware.save': { companyId, hardware: { ...layout.hardware[0], id: 'h9', name: 'Other plate' } },
    'hardware.saveJack': { companyId, jack: layout.jacks[0] },
    'hardware.saveStrandType': { companyId, strandType: layout.strandTypes[0] },
    'job.list': undefined,
    'job.create': { id: uuidv7(), companyId, number: '7', title: 'Seven' },
    'job.importLayout': { companyId, layout: sample },
    'job.byId': { jobId },
    'job.update': { jobId, number: '8', title: 'Eight' },
    'job.fileQuickEdge': { jobId: quickId, intoJobId: jobId, mark: 'Q1', level: { mark: 'Q' } },
    'job.setBasis': { jobId, basis: 'en-1992', settings: layout.job.settings, factors: [] },
    'job.addMember': { jobId, personId: 'leaver' },
    'job.removeMember': { jobId, personId: 'north-inspector' },
    'layout.byJob': { jobId },
    'layout.applyBatch': {
      id: uuidv7(),
      jobId,
      bases: { [`pour:${pourId}`]: versions[`pour:${pourId}`] },
      // Everybody who may change something may change this.
      commands: [{ type: 'set', table: 'pours', id: pourId, changes: { markPrefix: 'N' } }],
    },
    'reading.accept': { jobId, readingId: OTHER_READING, reason: 'As well.' },
    'reading.withdraw': { jobId, readingId: READING },
    'schedule.byPour': { jobId, pourId },
    'schedule.export': { jobId, pourId },
    'audit.list': { jobId, limit: 10 },
  }
}
