import { Project, ProjectList, type CreateProjectRequest } from '@coldfill/contract'
import { queryOptions, useSuspenseQuery } from '@tanstack/react-query'
import { api, projectApi } from '#lib/api-client.ts'
import { queryClient } from '#lib/query-client.ts'

export const projectsQuery = queryOptions({
  queryKey: ['projects'],
  queryFn: ({ signal }) => api.get('/api/projects', ProjectList, { signal }),
})

/** A project and everything under it share the head of their keys, so that one call refreshes all. */
export const projectKey = (number: string) => ['projects', number] as const

export const projectQuery = (number: string) =>
  queryOptions({
    queryKey: projectKey(number),
    queryFn: ({ signal }) => api.get(projectApi(number), Project, { signal }),
    // While files are being made their stage is shown.
    refetchInterval: (query) =>
      query.state.data?.revisions.some((revision) => revision.making && !revision.making.problem) ? 700 : false,
  })

export const useProject = (number: string): Project => useSuspenseQuery(projectQuery(number)).data

export const createProject = async (request: CreateProjectRequest): Promise<Project> => {
  const project = await api.post('/api/projects', request, Project)
  await queryClient.invalidateQueries({ queryKey: projectsQuery.queryKey, exact: true })
  return project
}
