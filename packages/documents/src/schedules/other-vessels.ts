import type { ProjectResult } from '@coldfill/sizing'
import { sentenceCase } from '../words/vessel-words.ts'
import { defineSchedule, resultNumber, type ScheduleDefinition } from './schedule.ts'
import * as shared from './shared-columns.ts'

/** A schedule of any kind that has no columns of its own yet: every result that one of its vessels has, in order of first appearance. */
export const otherVessels = (kind: string, result: ProjectResult): ScheduleDefinition => {
  const columns = new Map<string, ReturnType<typeof resultNumber>>()
  for (const vessel of result.vessels) {
    if (vessel.kind !== kind) continue
    for (const [key, value] of Object.entries(vessel.results)) {
      if (!columns.has(key))
        columns.set(key, resultNumber(key, sentenceCase(value.name), Math.max(9, value.name.length / 2), value.kind))
    }
  }
  return defineSchedule({
    kind,
    title: `${sentenceCase(kind)}s`,
    purpose: `Every ${kind} of the project with the numbers it was sized to. Pressures are gauge, at the vessel connection.`,
    columns: [
      shared.serves,
      shared.location,
      shared.count,
      ...columns.values(),
      ...shared.selection,
      shared.method,
      shared.assumptions,
    ],
  })
}
