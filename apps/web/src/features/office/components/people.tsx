import { useQuery } from '@tanstack/react-query'
import { Loaded } from '#components/loaded.tsx'
import { Cell, HeadCell, RowHead, RuledTable } from '#components/ui/ruled-table.tsx'
import { clock } from '#lib/format.ts'
import { peopleQuery } from '../api/office.ts'
import { MembershipForm } from './membership-form.tsx'

export const PeopleTable = () => {
  const people = useQuery(peopleQuery)
  return (
    <Loaded query={people} what="Loading the people">
      {(list) => (
        <>
          <RuledTable
            caption="People"
            className="min-w-160"
            head={
              <tr>
                <HeadCell>Name</HeadCell>
                <HeadCell>E-mail</HeadCell>
                <HeadCell>In the office</HeadCell>
                <HeadCell>Projects</HeadCell>
                <HeadCell figures>Last sign-in</HeadCell>
              </tr>
            }
          >
            {list.map((person) => (
              <tr key={person.id}>
                <RowHead>
                  {person.name} <span className="font-mono font-normal text-pencil">{person.initials}</span>
                </RowHead>
                <Cell>{person.email}</Cell>
                <Cell>
                  {person.administrator ? 'Administrator' : person.mayCreateProjects ? 'May make projects' : '—'}
                </Cell>
                <Cell>
                  {person.projects.length === 0
                    ? '—'
                    : person.projects.map((project) => (
                        <span key={project.number} className="block">
                          <span className="font-mono">{project.number}</span> {project.roles.join(', ')}
                          {project.requiredReviewer ? ', required' : ''}
                        </span>
                      ))}
                </Cell>
                <Cell figures>{person.lastSignIn ? clock(person.lastSignIn) : 'never'}</Cell>
              </tr>
            ))}
          </RuledTable>
          <MembershipForm people={list} />
        </>
      )}
    </Loaded>
  )
}
