import { basisOf, factorProblems } from '@wedgeline/engine'
import { expect, test } from 'vitest'
import { layout } from './sample-layout'

const { job } = layout()
const problems = (name: string, value: number) => factorProblems({ ...job, factors: [{ name, value, reason: 'r' }] })

test('an unknown factor is named with those that there are', () => {
  const [problem] = problems('gammaX', 1)
  expect(problem?.field).toBe('job.factors[0].name')
  expect(problem?.message).toContain('gammaC')
})

test.each([
  { value: 0.99, count: 1 },
  { value: 1, count: 0 },
  { value: 2, count: 0 },
  { value: 2.01, count: 1 },
])('gamma P of $value gives $count problems: 1 to 2 is its range', ({ value, count }) => {
  expect(problems('gammaP', value)).toHaveLength(count)
})

test('a basis that is not in the list is refused with the list', () => {
  expect(() => basisOf({ ...job, basis: 'none' })).toThrow('en-1992')
})

test('a factor that is given twice is named at its second place', () => {
  const twice = [1, 1.1].map((value) => ({ name: 'gammaP', value, reason: 'r' }))
  expect(factorProblems({ ...job, factors: twice })).toMatchObject([{ at: 1, part: 'name' }])
})
