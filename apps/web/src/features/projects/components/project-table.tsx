import { revisionTitle, type ProjectSummary } from '@coldfill/contract'
import { useState } from 'react'
import { Link } from 'react-router-dom'
import { TextField } from '#components/ui/field.tsx'
import { Cell, HeadCell, RowHead, RuledTable } from '#components/ui/ruled-table.tsx'
import { StateWord } from '#components/ui/state-word.tsx'
import { buttonClass } from '#components/ui/button.tsx'
import { paths } from '#config/paths.ts'
import { day } from '#lib/format.ts'

/** Where the project opens for this person: the contractor's page is the handover. */
const opening = (project: ProjectSummary): string =>
  project.sheets.includes('cover') ? paths.cover(project.number) : paths.handover(project.number)

const Row = ({ project, handoversOnly }: { readonly project: ProjectSummary; readonly handoversOnly: boolean }) => (
  <tr className="hover:bg-steel-wash">
    <RowHead className="font-mono">
      <Link to={opening(project)}>{project.number}</Link>
    </RowHead>
    <Cell>
      <Link to={opening(project)} className="font-semibold text-ink no-underline hover:underline">
        {project.title}
      </Link>
      <span className="block text-pencil">{project.client}</span>
    </Cell>
    <Cell>
      <StateWord state={project.state} />
    </Cell>
    <Cell>{project.revision === null ? '—' : revisionTitle(project.revision)}</Cell>
    {handoversOnly ? null : (
      <>
        <Cell>{project.waitingOnYou ? <strong className="font-semibold">You</strong> : '—'}</Cell>
        <Cell figures>{project.openRedlines === 0 ? '—' : project.openRedlines}</Cell>
      </>
    )}
    <Cell figures>
      {project.lastIssue ? (
        <>
          {day(project.lastIssue.date)}
          <span className="block text-pencil">for {project.lastIssue.purpose}</span>
        </>
      ) : (
        '—'
      )}
    </Cell>
  </tr>
)

export const ProjectTable = ({
  projects,
  mayCreate,
  handoversOnly,
}: {
  readonly projects: readonly ProjectSummary[]
  readonly mayCreate: boolean
  readonly handoversOnly: boolean
}) => {
  const [sought, setSought] = useState('')
  if (projects.length === 0) {
    return (
      <div className="max-w-xl border-t-[3px] border-ink pt-4 text-read">
        <p>No project is open to you yet.</p>
        {mayCreate ? (
          <p className="mt-3 flex gap-3">
            <Link className={buttonClass('main')} to="/?new=example">
              Open an example building
            </Link>
            <Link className={buttonClass('plain')} to="/?new=blank">
              Start from a blank spec
            </Link>
          </p>
        ) : (
          <p className="mt-2 text-pencil">Ask the administrator of your office to put you on one.</p>
        )}
      </div>
    )
  }
  const words = sought.toLowerCase().trim()
  const shown = projects.filter((project) =>
    `${project.number} ${project.title} ${project.client}`.toLowerCase().includes(words),
  )
  return (
    <>
      {projects.length > 5 ? (
        <div className="mb-4 max-w-xs">
          <TextField label="Find" type="search" value={sought} onChange={(event) => setSought(event.target.value)} />
        </div>
      ) : null}
      <RuledTable
        caption="Projects"
        className="min-w-180"
        head={
          <tr>
            <HeadCell>Number</HeadCell>
            <HeadCell>Project</HeadCell>
            <HeadCell>Status</HeadCell>
            <HeadCell>Revision</HeadCell>
            {handoversOnly ? null : (
              <>
                <HeadCell>Waiting on</HeadCell>
                <HeadCell figures>Open redlines</HeadCell>
              </>
            )}
            <HeadCell figures>Last issue</HeadCell>
          </tr>
        }
      >
        {shown.map((project) => (
          <Row key={project.number} project={project} handoversOnly={handoversOnly} />
        ))}
      </RuledTable>
      {shown.length === 0 ? <p className="mt-3 text-pencil">No project matches “{sought}”.</p> : null}
    </>
  )
}
