import type { LayoutFile, Role } from '@wedgeline/contract'
import type { Page } from 'playwright-core'

/** Every screen of the product on the demo's data: its route's file, an address, its heading, and who looks. */
export interface ScreenCase {
  readonly name: string
  /** Below app/. */
  readonly route: string
  readonly path: string
  readonly heading: RegExp
  readonly role: Role
  /** Opens what stands over the screen, a dialog or a sheet. */
  readonly open?: (page: Page) => Promise<void>
}

export interface Demo {
  readonly jobId: string
  readonly companyId: string
  readonly layout: Pick<LayoutFile, 'pours' | 'edges' | 'pans' | 'anchors' | 'hardware'>
}

const JOB = '(work)/jobs/[jobId]'
const COMPANY = '(work)/companies/[companyId]'

const press = (name: string | RegExp) => async (page: Page) => {
  await page.getByRole('button', { name }).first().click()
  await page.getByRole('dialog').waitFor()
}

const openMenu = async (page: Page) => {
  await page.getByRole('banner').getByRole('button').click()
  await page.getByRole('menu').waitFor()
}

/** Screens that need somebody signed in. */
export function screenCases(demo: Demo): readonly ScreenCase[] {
  return [...jobCases(demo), ...pourCases(demo), ...edgeCases(demo), ...panCases(demo), ...companyCases(demo)]
}

function jobCases({ jobId }: Demo): readonly ScreenCase[] {
  const job = `/jobs/${jobId}`
  const jobs = { route: '(work)/index.tsx', path: '/', heading: /^Jobs$/, role: 'detailer' } as const
  const page = { route: `${JOB}/index.tsx`, path: job, heading: /Quillmarsh/ } as const
  return [
    { name: 'jobs', ...jobs },
    { name: 'jobs-menu', ...jobs, open: openMenu },
    { name: 'jobs-new', ...jobs, open: press('New job') },
    { name: 'jobs-import', ...jobs, open: press('Import a layout') },
    {
      name: 'methods',
      route: '(work)/methods.tsx',
      path: '/methods',
      heading: /^How it is checked$/,
      role: 'engineer',
    },
    {
      name: 'quick-edge',
      route: '(work)/quick-edge.tsx',
      path: '/quick-edge',
      heading: /^Quick edge$/,
      role: 'detailer',
    },
    { name: 'job', ...page, role: 'detailer' },
    { name: 'job-reading', ...page, role: 'engineer', open: press(/^Accept/) },
    { name: 'basis', route: `${JOB}/basis.tsx`, path: `${job}/basis`, heading: /^Basis/, role: 'engineer' },
    { name: 'job-people', route: `${JOB}/people.tsx`, path: `${job}/people`, heading: /^People/, role: 'admin' },
  ]
}

function pourCases({ jobId, layout }: Demo): readonly ScreenCase[] {
  const [pour] = layout.pours
  const pours = `/jobs/${jobId}/pours`
  const plan = { route: `${JOB}/pours/[pourId]/index.tsx`, path: `${pours}/${pour?.id}`, role: 'detailer' } as const
  return [
    { name: 'new-pour', route: `${JOB}/pours/new.tsx`, path: `${pours}/new`, heading: /^New pour$/, role: 'detailer' },
    { name: 'pour', ...plan, heading: /^Pour P1$/ },
    { name: 'pour-lengths', ...plan, heading: /^Pour P1$/, open: press(/^Lengths/) },
    {
      ...plan,
      name: 'zones',
      route: `${JOB}/pours/[pourId]/zones.tsx`,
      path: `${pours}/${pour?.id}/zones?status=over`,
      heading: /^Pour P1, zones$/,
    },
    {
      ...plan,
      name: 'schedule',
      route: `${JOB}/pours/[pourId]/schedule.tsx`,
      path: `${pours}/${pour?.id}/schedule`,
      heading: /^Pour P1, bar schedule$/,
    },
  ]
}

function edgeCases({ jobId, layout }: Demo): readonly ScreenCase[] {
  const edge = layout.edges.find(({ mark }) => mark === 'E1')
  const anchor = layout.anchors.find(({ edgeId, number }) => edgeId === edge?.id && number === 5)
  const zone = encodeURIComponent(`anchor:${anchor?.id}`)
  const path = `/jobs/${jobId}/edges/${edge?.id}`
  const base = { route: `${JOB}/edges/[edgeId].tsx`, heading: /^Edge E1/, role: 'detailer' } as const
  const calculation = { route: `${JOB}/zones/[zoneId].tsx`, path: `/jobs/${jobId}/zones/${zone}` }
  return [
    { name: 'edge', path, ...base },
    { name: 'edge-anchor', path: `${path}?zone=${zone}`, ...base },
    { name: 'edge-bars', path: `${path}?zone=${encodeURIComponent(`edge:${edge?.id}`)}`, ...base },
    { name: 'edge-paste', path, ...base, open: press('Paste anchors') },
    { name: 'calculation', ...calculation, heading: /^Calculation, E1-05$/, role: 'detailer' },
  ]
}

function panCases({ jobId, layout }: Demo): readonly ScreenCase[] {
  const pan = layout.pans.find(({ mark }) => mark === 'PN03')
  const path = `/jobs/${jobId}/pans/${pan?.id}`
  return [{ name: 'pan', route: `${JOB}/pans/[panId].tsx`, path, heading: /^Pan PN03$/, role: 'detailer' }]
}

function companyCases({ companyId, layout }: Demo): readonly ScreenCase[] {
  const company = `/companies/${companyId}`
  const hardware = `${company}/hardware`
  const s4 = layout.hardware.find(({ name }) => name === 'S4')
  const one = { route: `${COMPANY}/hardware/[hardwareId].tsx`, role: 'admin' } as const
  const list = { route: `${COMPANY}/hardware/index.tsx`, path: hardware, heading: /^Hardware/, role: 'admin' } as const
  const people = {
    route: `${COMPANY}/people.tsx`,
    path: `${company}/people`,
    heading: /^People/,
    role: 'admin',
  } as const
  return [
    { name: 'company', route: `${COMPANY}/index.tsx`, path: company, heading: /^Company$/, role: 'admin' },
    { name: 'people', ...people },
    { name: 'people-person', ...people, open: press('Change Dilys Marrow') },
    { name: 'hardware', ...list },
    { name: 'hardware-jack', ...list, open: press('New jack') },
    { name: 'hardware-one', ...one, path: `${hardware}/${s4?.id}`, heading: /^Hardware S4$/ },
    { name: 'hardware-new', ...one, path: `${hardware}/new`, heading: /^New hardware/ },
  ]
}

export interface MadeUp {
  readonly path: string
  readonly says: RegExp
}

const NOBODY = '01a231c2-0000-7000-8000-000000000000'

/** Addresses that name what is not there. */
export function madeUpPaths({ jobId, companyId }: Demo): readonly MadeUp[] {
  const job = `/jobs/${jobId}`
  const noJob = /This job cannot be opened/
  const noPour = /This pour is not in the job/
  return [
    { path: `/jobs/${NOBODY}`, says: noJob },
    { path: '/jobs/nonsense', says: noJob },
    { path: `/jobs/${NOBODY}/edges/${NOBODY}`, says: noJob },
    { path: `${job}/edges/${NOBODY}`, says: /This edge is not in the job/ },
    { path: `${job}/pans/${NOBODY}`, says: /This pan is not in the job/ },
    { path: `${job}/pours/${NOBODY}`, says: noPour },
    { path: `${job}/pours/${NOBODY}/zones`, says: noPour },
    { path: `${job}/pours/${NOBODY}/schedule`, says: noPour },
    { path: `${job}/zones/${encodeURIComponent('anchor:nonsense')}`, says: /This zone is not in the job/ },
    { path: `${job}/zones/%25E0%25A4%25A`, says: /This zone is not in the job/ },
    { path: `/companies/${NOBODY}`, says: /could not be fetched/ },
    { path: `/companies/${NOBODY}/people`, says: /could not be fetched/ },
    { path: `/companies/${NOBODY}/hardware`, says: /could not be fetched/ },
    { path: `/companies/${companyId}/hardware/${NOBODY}`, says: /hardware/i },
  ]
}
