import type { UsedAssumption } from '#lib/sized-project.ts'
import { capital } from '#lib/format.ts'

export interface AssumptionGroup {
  readonly title: string
  readonly assumptions: readonly UsedAssumption[]
}

/** Assumptions by the first part of their id, in the order of their numbers: `relief-margin.hydronic` under "Relief margin". */
export const groupAssumptions = (assumptions: readonly UsedAssumption[]): readonly AssumptionGroup[] => {
  const groups = new Map<string, UsedAssumption[]>()
  for (const assumption of assumptions) {
    const topic = assumption.id.split('.')[0] ?? assumption.id
    groups.set(topic, [...(groups.get(topic) ?? []), assumption])
  }
  return [...groups].map(([topic, members]) => ({ title: capital(topic.replaceAll('-', ' ')), assumptions: members }))
}
