import { layoutSchema, type LayoutFile } from '@wedgeline/contract'
import type { Page } from 'playwright-core'
import { z } from 'zod'

const answerSchema = z.object({ result: z.object({ data: z.object({ layout: layoutSchema }) }) })

/** The job's layout as the server holds it, asked for as the person of this page. */
export async function storedLayout(page: Page, jobId: string): Promise<LayoutFile> {
  const input = encodeURIComponent(JSON.stringify({ jobId }))
  const answer = await page.request.get(`/trpc/layout.byJob?input=${input}`)
  return answerSchema.parse(await answer.json()).result.data.layout
}

/** The id that follows a part of the address: jobs, pours, edges. */
export function idInAddress(page: Page, part: 'jobs' | 'pours' | 'edges'): string {
  const id = new RegExp(`/${part}/([^/?]+)`).exec(page.url())?.[1]
  if (!id) throw new Error(`${page.url()} names none of ${part}.`)
  return id
}
