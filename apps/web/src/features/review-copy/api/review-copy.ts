import { ReviewCopyAnswer, revisionSegment } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api, projectApi } from '#lib/api-client.ts'
import { queryClient } from '#lib/query-client.ts'

const address = (project: string, label: string) =>
  projectApi(project, `/revisions/${revisionSegment(label)}/review-copy`)

export const reviewCopyQuery = (project: string, label: string) =>
  queryOptions({
    queryKey: ['projects', project, 'review-copy', label],
    queryFn: async ({ signal }) => (await api.get(address(project, label), ReviewCopyAnswer, { signal })).copy,
    // While it is being prepared it is asked for again.
    refetchInterval: (query) => (query.state.data?.state === 'preparing' ? 700 : false),
  })

export const prepareReviewCopy = async (project: string, label: string): Promise<void> => {
  const { copy } = await api.post(address(project, label), undefined, ReviewCopyAnswer)
  queryClient.setQueryData(reviewCopyQuery(project, label).queryKey, copy)
}
