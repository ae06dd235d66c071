import { OUTCOME_LABELS, revisionTitle, type Project } from '@coldfill/contract'
import { NumberAndTitle, TitleStrip } from '#components/layouts/title-strip.tsx'
import { StateWord } from '#components/ui/state-word.tsx'
import { paths } from '#config/paths.ts'
import { day } from '#lib/format.ts'

/** The title strip of a project's sheets. */
export const ProjectStrip = ({ project, sheet }: { readonly project: Project; readonly sheet: string }) => {
  const latest = project.revisions[0]
  const checked = latest?.dispositions.find((disposition) => !disposition.stale)
  const issue = paths.issue(project.number)
  return (
    <TitleStrip
      fields={[
        { caption: 'Prepared for', value: project.client || '—', to: paths.cover(project.number), room: 'wide' },
        {
          caption: 'Title',
          value: <NumberAndTitle number={project.number} title={project.title} />,
          to: paths.cover(project.number),
          room: 'always',
          grows: true,
        },
        { caption: 'Status', value: <StateWord state={project.state} />, to: issue, room: 'always' },
        {
          caption: 'Revision',
          value: project.revision === null ? '—' : project.revision || 'First issue',
          to: issue,
          room: 'always',
        },
        {
          caption: 'Prepared',
          value: latest ? `${latest.issuedBy.initials} ${day(latest.issuedAt)}` : '—',
          room: 'wide',
        },
        {
          caption: 'Checked',
          value: checked ? (
            <span
              title={`${OUTCOME_LABELS[checked.outcome]}, ${revisionTitle(checked.revision)}`}
            >{`${checked.reviewer.initials} ${day(checked.at)}`}</span>
          ) : (
            '—'
          ),
          to: paths.redlines(project.number),
          room: 'wide',
        },
        { caption: 'Sheet', value: <span className="font-mono">{sheet}</span>, room: 'desk' },
      ]}
    />
  )
}
