import type { Layout } from '@wedgeline/engine'
import { expect, test } from 'vitest'
import { EngineClient } from '@/lib/engine-client'
import type { EngineReply, EngineRequest } from '@/lib/engine-request'

/** A worker that answers when the test says so. */
function handWorker() {
  const asked: EngineRequest[] = []
  const worker = {
    onmessage: null,
    postMessage: (request: EngineRequest) => asked.push(request),
    terminate: () => undefined,
  }
  const answer = () => {
    const last = asked.at(-1)
    const reply = { id: last?.id, result: { pourId: last?.pourId } } as unknown as EngineReply
    const send = worker.onmessage as unknown as (event: { data: EngineReply }) => void
    send({ data: reply })
  }
  return { worker: worker as unknown as Worker, asked, answer }
}

const layout = (name: string) => ({ name }) as unknown as Layout

test('while one request runs only the newest of a pour waits; the one it replaced answers null', async () => {
  const { worker, asked, answer } = handWorker()
  const client = new EngineClient(() => worker)
  const first = client.check(layout('a'), 'P1')
  const second = client.check(layout('b'), 'P1')
  const third = client.check(layout('c'), 'P1')
  expect(asked).toHaveLength(1)
  expect(await second).toBeNull()
  answer()
  expect((await first)?.pourId).toBe('P1')
  expect(asked.map((request) => request.layout)).toEqual([layout('a'), layout('c')])
  answer()
  expect((await third)?.pourId).toBe('P1')
})

test('requests for several pours are all answered', async () => {
  const { worker, answer } = handWorker()
  const client = new EngineClient(() => worker)
  const all = ['P1', 'P2', 'P3'].map((pour) => client.check(layout('a'), pour))
  answer()
  answer()
  answer()
  expect((await Promise.all(all)).map((result) => result?.pourId)).toEqual(['P1', 'P2', 'P3'])
})
