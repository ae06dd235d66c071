import { type FieldSetting, type Handover, revisionTitle } from '@coldfill/contract'
import type { ProjectResult, VesselResult } from '@coldfill/sizing'
import type { ProjectAccess } from '../../policies/project-access.ts'
import type { ProjectFacts, RevisionRow } from '../../review/project-facts.ts'
import { constructionRevision } from '../../review/standing.ts'
import { presentFile } from '../revisions/revisions.presenter.ts'

const gauge = (value: number | undefined): FieldSetting | null =>
  value === undefined ? null : { kind: 'gauge pressure', value }

const setting = (vessel: VesselResult, key: string): FieldSetting | null => {
  const found = vessel.results[key]
  return found?.kind === 'gauge pressure' ? gauge(found.value) : null
}

/** What is to be set in the field, vessel by vessel. */
const settings = (result: ProjectResult): NonNullable<Handover['current']>['settings'] =>
  result.vessels
    .filter((vessel) => vessel.status === 'sized')
    .map((vessel) => ({
      system: vessel.system,
      mark: vessel.mark,
      serves: vessel.serves,
      kind: vessel.kind,
      precharge: setting(vessel, 'precharge'),
      fill: setting(vessel, 'fill-pressure'),
      relief: gauge(result.systems.find(({ id }) => id === vessel.system)?.relief?.set),
    }))

const wordFor = (facts: ProjectFacts, current: RevisionRow | null): string => {
  if (current) return 'Issued for construction'
  const last = facts.revisions.find((row) => row.constructionAt)
  if (last?.withdrawnAt)
    return `${revisionTitle(last.label)} was withdrawn. Do not work by it; wait for the next issue.`
  return 'Nothing has been issued for construction yet.'
}

/** `result` is the frozen result of the issue in force; `asked` the revision of the address, where it names one. */
export const presentHandover = (
  access: ProjectAccess,
  facts: ProjectFacts,
  result: ProjectResult | null,
  asked: RevisionRow | null,
): Handover => {
  const current = constructionRevision(facts)
  const by = current?.constructionBy ? facts.people.get(current.constructionBy) : undefined
  return {
    project: {
      number: facts.project.number,
      title: result?.project.title ?? facts.project.title,
      client: result?.project.client ?? facts.project.client,
      office: access.principal.office.name,
      units: result?.project.units ?? 'US',
    },
    current:
      current?.constructionAt && result
        ? {
            revision: current.label,
            issuedAt: current.constructionAt.toISOString(),
            issuedBy: { id: by?.id ?? '', name: by?.name ?? 'A former member', initials: by?.initials ?? '–' },
            files: facts.files
              .filter((file) => file.revisionId === current.id && file.set === 'construction')
              .map((file) => presentFile(facts.project.number, current, file)),
            noPdf:
              facts.fileSets.find((row) => row.revisionId === current.id && row.set === 'construction')?.noPdf ?? null,
            contentHash: current.contentHash,
            settings: settings(result),
          }
        : null,
    word: wordFor(facts, current),
    superseded: asked !== null && asked.id !== current?.id,
  }
}
