import {
  Redline,
  RedlineList,
  Revision,
  revisionSegment,
  type CreateRedlineRequest,
  type EditRedlineRequest,
  type ReviewRequest,
} from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { withQuery } from '#config/paths.ts'
import { api, projectApi } from '#lib/api-client.ts'
import { refreshProject } from '#lib/refresh.ts'

export const redlinesQuery = (project: string, rev: string | null) =>
  queryOptions({
    queryKey: ['projects', project, 'redlines', rev],
    queryFn: async ({ signal }) =>
      (await api.get(withQuery(projectApi(project, '/redlines'), { rev }), RedlineList, { signal })).redlines,
  })

const path = (project: string, number: number, rest = '') => projectApi(project, `/redlines/${number}${rest}`)

const after = async <T>(project: string, work: Promise<T>): Promise<T> => {
  const done = await work
  await refreshProject(project)
  return done
}

export const createRedline = (project: string, request: CreateRedlineRequest) =>
  after(project, api.post(projectApi(project, '/redlines'), request, Redline))
export const editRedline = (project: string, number: number, request: EditRedlineRequest) =>
  after(project, api.patch(path(project, number), request, Redline))
export const removeRedline = (project: string, number: number) =>
  after(project, api.act('DELETE', path(project, number)))
export const replyTo = (project: string, number: number, text: string) =>
  after(project, api.act('POST', path(project, number, '/replies'), { text }))
export const closeRedline = (project: string, number: number, comment: string) =>
  after(project, api.act('POST', path(project, number, '/close'), { comment }))
export const reopenRedline = (project: string, number: number, comment: string) =>
  after(project, api.act('POST', path(project, number, '/reopen'), { comment }))

/** Publishes the reviewer's pending redlines and sets the disposition, bound to the content that was seen. */
export const sendReview = (project: string, revision: string, request: ReviewRequest) =>
  after(project, api.post(projectApi(project, `/revisions/${revisionSegment(revision)}/reviews`), request, Revision))
