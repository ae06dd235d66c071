import { Results } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { withQuery } from '#config/paths.ts'
import { api, projectApi } from '#lib/api-client.ts'

/** Results of the working copy or of a frozen revision (`-` for the first issue); without `rev` the server chooses by role. */
export const resultsQuery = (project: string, rev: string | null) =>
  queryOptions({
    queryKey: ['projects', project, 'results', rev],
    queryFn: ({ signal }) => api.get(withQuery(projectApi(project, '/results'), { rev }), Results, { signal }),
  })
