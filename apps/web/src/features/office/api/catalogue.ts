import { OfficeCatalogue, type PutCatalogueRequest } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api } from '#lib/api-client.ts'
import { queryClient } from '#lib/query-client.ts'
import { base64 } from './base64.ts'

const address = '/api/office/catalogue'
export const exampleCatalogueAddress = `${address}/example`

export const catalogueQuery = queryOptions({
  queryKey: ['office', 'catalogue'],
  queryFn: ({ signal }) => api.get(address, OfficeCatalogue, { signal }),
})

/** Sizes change with the catalogue, and the audit trail tells of it. */
const refreshAll = async (): Promise<void> => {
  await queryClient.invalidateQueries({ queryKey: ['office'] })
  await queryClient.invalidateQueries({ queryKey: ['projects'] })
}

export const uploadCatalogue = async (file: File): Promise<void> => {
  const request: PutCatalogueRequest = { fileName: file.name, content: await base64(file) }
  queryClient.setQueryData(catalogueQuery.queryKey, await api.put(address, request, OfficeCatalogue))
  await refreshAll()
}

export const removeCatalogue = async (): Promise<void> => {
  await api.act('DELETE', address)
  await refreshAll()
}
