import { ProjectResult, SpecConflict, SpecDocument, type SaveSpecRequest } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { withQuery } from '#config/paths.ts'
import { api, projectApi } from '#lib/api-client.ts'
import { ApiError } from '#lib/api-error.ts'
import { queryClient } from '#lib/query-client.ts'

/** The working copy, or a frozen revision (`-` for the first issue); without `rev` the server chooses by role. */
export const specQuery = (project: string, rev: string | null = null) =>
  queryOptions({
    queryKey: ['projects', project, 'spec', rev],
    queryFn: ({ signal }) => api.get(withQuery(projectApi(project, '/spec'), { rev }), SpecDocument, { signal }),
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

/** Results of a text that stays as it is, beside which another one is set. */
export const sizedTextQuery = (project: string, text: string) =>
  queryOptions({
    queryKey: ['sized text', project, text],
    queryFn: ({ signal }) => sizeText(project, text, signal),
    staleTime: Infinity,
    gcTime: 60_000,
  })
