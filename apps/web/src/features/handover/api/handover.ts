import { Handover } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { withQuery } from '#config/paths.ts'
import { api, projectApi } from '#lib/api-client.ts'

export const handoverQuery = (project: string, rev: string | null) =>
  queryOptions({
    queryKey: ['projects', project, 'handover', rev],
    queryFn: ({ signal }) => api.get(withQuery(projectApi(project, '/handover'), { rev }), Handover, { signal }),
  })
