import { GateList, Revision, revisionSegment, type ContentsChoice } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api, projectApi } from '#lib/api-client.ts'
import { refreshProject } from '#lib/refresh.ts'

export const gatesQuery = (project: string, purpose: 'review' | 'construction') =>
  queryOptions({
    queryKey: ['projects', project, 'gates', purpose],
    queryFn: async ({ signal }) =>
      (await api.get(projectApi(project, `/gates?for=${purpose}`), GateList, { signal })).gates,
  })

const after = async (project: string, work: Promise<Revision>): Promise<Revision> => {
  try {
    return await work
  } finally {
    await refreshProject(project)
  }
}
const revision = (project: string, label: string, rest: string) =>
  projectApi(project, `/revisions/${revisionSegment(label)}${rest}`)

export const issueForReview = (project: string, note: string, contents: ContentsChoice) =>
  after(project, api.post(projectApi(project, '/revisions'), { purpose: 'review', note, contents }, Revision))

export const issueForConstruction = (
  project: string,
  label: string,
  override: string | null,
  contents: ContentsChoice,
) =>
  after(
    project,
    api.post(
      revision(project, label, '/construction'),
      { contents, ...(override ? { override: { reason: override } } : {}) },
      Revision,
    ),
  )

export const withdraw = (project: string, label: string, reason: string) =>
  after(project, api.post(revision(project, label, '/withdraw'), { reason }, Revision))

/** Starts the making of files again where it stopped. */
export const makeFiles = (project: string, label: string) =>
  after(project, api.post(revision(project, label, '/files'), {}, Revision))
