import { useQuery } from '@tanstack/react-query'
import { useNavigate, useSearchParams } from 'react-router-dom'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Loaded } from '#components/loaded.tsx'
import { Button } from '#components/ui/button.tsx'
import { paths } from '#config/paths.ts'
import { projectsQuery } from '#features/projects/api/projects.ts'
import { NewProject } from '#features/projects/components/new-project.tsx'
import { ProjectTable } from '#features/projects/components/project-table.tsx'
import { useSession } from '#features/session/api/session.ts'
import { queryClient } from '#lib/query-client.ts'

export const loader = () => {
  void queryClient.prefetchQuery(projectsQuery)
  return null
}

export function Component() {
  const { user } = useSession()
  const projects = useQuery(projectsQuery)
  const navigate = useNavigate()
  const [search, setSearch] = useSearchParams()
  const making = search.has('new') && user.mayCreateProjects
  // Who has handovers only has no use for the rest.
  const handoversOnly =
    !user.mayCreateProjects &&
    projects.data !== undefined &&
    projects.data.projects.length > 0 &&
    projects.data.projects.every((project) => !project.sheets.includes('cover'))
  return (
    <Sheet
      title={handoversOnly ? 'Handovers' : 'Projects'}
      actions={
        handoversOnly ? null : (
          <Button
            look={making ? 'plain' : 'main'}
            aria-expanded={making}
            why={user.mayCreateProjects ? null : 'New projects are made by the consultants of the office.'}
            onClick={() => setSearch(making ? {} : { new: '1' })}
          >
            New project
          </Button>
        )
      }
    >
      <Loaded query={projects} what="Loading the projects">
        {(list) => (
          <>
            {making ? (
              <NewProject
                projects={list.projects}
                onMade={(number) => void navigate(paths.spec(number))}
                onCancel={() => setSearch({})}
              />
            ) : null}
            <ProjectTable projects={list.projects} mayCreate={user.mayCreateProjects} handoversOnly={handoversOnly} />
          </>
        )}
      </Loaded>
    </Sheet>
  )
}
