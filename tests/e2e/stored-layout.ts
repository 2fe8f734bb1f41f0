import { layoutSchema, type LayoutFile, type Role } from '@wedgeline/contract'
import { z } from 'zod'
import type { Product } from './product'

const answerOf = <Data extends z.ZodType>(data: Data) => z.object({ result: z.object({ data }) })
const jobsSchema = answerOf(z.array(z.object({ id: z.string(), companyId: z.string(), title: z.string() })))
const layoutAnswerSchema = answerOf(z.object({ layout: layoutSchema }))

/** What the server holds, asked for beside the browser. */
export interface Stored {
  readonly jobId: string
  readonly companyId: string
  layout(): Promise<LayoutFile>
  /** Height of an anchor by its edge's mark and its number. */
  heightOf(edgeMark: string, number: number): Promise<number | undefined>
}

/** The demo's job as a person of this role reads it. @throws where signing in or reading fails. */
export async function storedDemo({ origin, signInOf }: Product, role: Role = 'detailer'): Promise<Stored> {
  const answer = await fetch(`${origin}/trpc/session.signIn`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', Origin: origin },
    body: JSON.stringify(signInOf(role)),
  })
  const cookie = answer.headers.get('set-cookie')?.split(';')[0] ?? ''
  const ask = async (procedure: string, input: string): Promise<unknown> =>
    (await fetch(`${origin}/trpc/${procedure}${input}`, { headers: { cookie } })).json()
  const { result } = jobsSchema.parse(await ask('job.list', ''))
  const job = result.data.find(({ title }) => title.startsWith('Quillmarsh'))
  if (!job) throw new Error('The demo has no job Quillmarsh.')
  const { id: jobId, companyId } = job
  const layout = async () => {
    const read = await ask('layout.byJob', `?input=${encodeURIComponent(JSON.stringify({ jobId }))}`)
    return layoutAnswerSchema.parse(read).result.data.layout
  }
  return {
    jobId,
    companyId,
    layout,
    async heightOf(edgeMark, number) {
      const { anchors, edges } = await layout()
      const edge = edges.find(({ mark }) => mark === edgeMark)
      return anchors.find((anchor) => anchor.edgeId === edge?.id && anchor.number === number)?.heightMm
    },
  }
}
