import { Reference } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api } from '#lib/api-client.ts'

export const referenceQuery = queryOptions({
  queryKey: ['reference'],
  queryFn: ({ signal }) => api.get('/api/reference', Reference, { signal }),
  staleTime: Infinity,
})
