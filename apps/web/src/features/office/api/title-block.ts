import { OfficeTitleBlock, type PutLogoRequest, type PutTitleBlockRequest } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api } from '#lib/api-client.ts'
import { queryClient } from '#lib/query-client.ts'
import { base64 } from './base64.ts'

const address = '/api/office/title-block'

export const titleBlockQuery = queryOptions({
  queryKey: ['office', 'title-block'],
  queryFn: ({ signal }) => api.get(address, OfficeTitleBlock, { signal }),
})

/** The audit trail tells of each change. */
const stored = async (block: OfficeTitleBlock): Promise<void> => {
  queryClient.setQueryData(titleBlockQuery.queryKey, block)
  await queryClient.invalidateQueries({ queryKey: ['office', 'audit'] })
}

export const saveTitleBlock = async (request: PutTitleBlockRequest): Promise<void> =>
  stored(await api.put(address, request, OfficeTitleBlock))

export const uploadLogo = async (file: File): Promise<void> => {
  const request: PutLogoRequest = { fileName: file.name, content: await base64(file) }
  await stored(await api.put(`${address}/logo`, request, OfficeTitleBlock))
}

export const removeLogo = async (): Promise<void> => {
  await api.act('DELETE', `${address}/logo`)
  await queryClient.invalidateQueries({ queryKey: ['office'] })
}
