import { ProjectResult, SpecConflict, SpecDocument, type SaveSpecRequest } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api, projectApi } from '#lib/api-client.ts'
import { ApiError } from '#lib/api-error.ts'
import { queryClient } from '#lib/query-client.ts'

export const specQuery = (project: string) =>
  queryOptions({
    queryKey: ['projects', project, 'spec'],
    queryFn: ({ signal }) => api.get(projectApi(project, '/spec'), SpecDocument, { signal }),
  })

export const saveSpec = async (project: string, request: SaveSpecRequest): Promise<SpecDocument> => {
  const saved = await api.put(projectApi(project, '/spec'), request, SpecDocument)
  queryClient.setQueryData(specQuery(project).queryKey, saved)
  return saved
}

/** What stands on the server, where a save was refused because someone saved before. */
export const conflictOf = (error: unknown): SpecConflict | null => {
  if (!(error instanceof ApiError) || error.code !== 'version_conflict') return null
  const current = SpecConflict.safeParse(error.problem?.['current'])
  return current.success ? current.data : null
}

/** Sizes a text as it is typed; nothing is saved. */
export const sizeText = (project: string, text: string, signal: AbortSignal): Promise<ProjectResult> =>
  api.post(projectApi(project, '/sizing'), { text }, ProjectResult, { signal })
