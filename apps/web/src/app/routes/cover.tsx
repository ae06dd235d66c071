import type { Member } from '@coldfill/contract'
import { Link } from 'react-router-dom'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Caption, SectionHeading } from '#components/ui/heading.tsx'
import { StateWord } from '#components/ui/state-word.tsx'
import { paths } from '#config/paths.ts'
import { useProject } from '#features/projects/api/projects.ts'
import { RevisionBlock } from '#features/projects/components/revision-block.tsx'
import { capital, plural } from '#lib/format.ts'
import { useProjectNumber } from '#lib/route-params.ts'

const memberWords = (member: Member): string =>
  member.roles.map((role) => (role === 'reviewer' && member.requiredReviewer ? 'reviewer, required' : role)).join(', ')

export function Component() {
  const number = useProjectNumber()
  const project = useProject(number)
  const working = project.workingCopyDiffers
  const sheetStates: readonly {
    readonly sheet: 'spec' | 'schedule' | 'basis' | 'redlines' | 'issue'
    readonly says: string
  }[] = [
    {
      sheet: 'spec',
      says: project.permissions.editSpec.allowed
        ? working === false
          ? 'Says what the newest revision says'
          : project.revisions.length === 0
            ? 'The working copy; nothing is issued yet'
            : 'Has changes that are not issued'
        : (project.permissions.editSpec.why ?? 'Read only'),
    },
    {
      sheet: 'schedule',
      says: project.permissions.seeWorkingCopy.allowed
        ? 'Sizes of the working copy and of every revision'
        : 'Sizes of the issued revisions',
    },
    { sheet: 'basis', says: 'Assumptions, sources, accepted warnings' },
    {
      sheet: 'redlines',
      says: project.openRedlines === 0 ? 'None open' : `${plural(project.openRedlines, 'redline')} open`,
    },
    {
      sheet: 'issue',
      says: project.revisions.length === 0 ? 'Nothing issued yet' : plural(project.revisions.length, 'revision'),
    },
  ]
  return (
    <Sheet title={project.title} tab={`${project.number} Cover`}>
      <div className="flex flex-col gap-8">
        <div className="grid gap-x-10 gap-y-6 border-t-[3px] border-ink pt-4 bench:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]">
          <div className="flex flex-col gap-3">
            <div>
              <Caption>Next step</Caption>
              <p className="text-lead font-semibold">{project.nextStep}</p>
            </div>
            <div>
              <Caption>Status</Caption>
              <p className="text-read">
                <StateWord state={project.state} />
              </p>
            </div>
            {project.waitingOn.length > 0 ? (
              <div>
                <Caption>Waiting on</Caption>
                <ul className="text-read">
                  {project.waitingOn.map(({ who, what }) => (
                    <li key={`${who} ${what}`}>
                      <strong className="font-semibold">{who}</strong>: {what}
                    </li>
                  ))}
                </ul>
              </div>
            ) : null}
          </div>
          <dl className="grid content-start gap-x-6 gap-y-1 self-start border border-rule p-4 desk:grid-cols-[9rem_minmax(0,1fr)]">
            <dt className="text-pencil">Project number</dt>
            <dd className="font-mono font-semibold">{project.number}</dd>
            {project.parties
              .filter(({ name }) => !project.members.some((member) => member.name === name))
              .map(({ part, name }) => (
                <div key={`${part} ${name}`} className="contents">
                  <dt className="text-pencil">{capital(part)}</dt>
                  <dd>{name}</dd>
                </div>
              ))}
            {project.members.map((member) => (
              <div key={member.id} className="contents">
                <dt className="text-pencil">{capital(memberWords(member))}</dt>
                <dd>{member.name}</dd>
              </div>
            ))}
          </dl>
        </div>
        <section>
          <SectionHeading>Sheets</SectionHeading>
          <ol className="border-t-2 border-ink">
            {sheetStates
              .filter(({ sheet }) => project.sheets.includes(sheet))
              .map(({ sheet, says }, at) => (
                <li
                  key={sheet}
                  className="grid grid-cols-[1.5rem_7rem_minmax(0,1fr)] gap-x-3 border-b border-hair py-2"
                >
                  <span aria-hidden="true" className="font-mono text-pencil">
                    {at + 1}
                  </span>
                  <Link to={paths[sheet](number)} className="font-semibold">
                    {capital(sheet)}
                  </Link>
                  <span>{says}</span>
                </li>
              ))}
          </ol>
        </section>
        <section>
          <SectionHeading>Revision block</SectionHeading>
          {project.revisions.length === 0 ? (
            <p className="border-t-2 border-ink pt-2 text-pencil">No revision yet. The first issue has no letter.</p>
          ) : (
            <RevisionBlock project={project} />
          )}
        </section>
      </div>
    </Sheet>
  )
}
