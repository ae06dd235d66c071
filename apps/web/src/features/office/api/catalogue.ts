import { OfficeCatalogue, type PutCatalogueRequest } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api } from '#lib/api-client.ts'
import { queryClient } from '#lib/query-client.ts'

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

const base64 = async (file: File): Promise<string> => {
  const bytes = new Uint8Array(await file.arrayBuffer())
  let text = ''
  const piece = 32_768
  for (let at = 0; at < bytes.length; at += piece) text += String.fromCharCode(...bytes.subarray(at, at + piece))
  return btoa(text)
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
