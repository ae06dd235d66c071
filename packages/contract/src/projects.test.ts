import { expect, it } from 'vitest'
import { ProjectNumber } from './projects.ts'

it.each(['FC-241', 'a', '2026.04_B', 'x'.repeat(32)])('takes %s as the number of a project', (number) => {
  expect(ProjectNumber.parse(number)).toBe(number)
})

it.each(['', '-1', 'a/b', '../a', 'a b', 'é', 'x'.repeat(33), 'a%2Fb', 'a?b'])(
  'refuses "%s", which would not stand in an address',
  (number) => {
    expect(ProjectNumber.safeParse(number).success).toBe(false)
  },
)
