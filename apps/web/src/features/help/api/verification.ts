import { Verification } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api } from '#lib/api-client.ts'

export const verificationQuery = queryOptions({
  queryKey: ['verification'],
  queryFn: ({ signal }) => api.get('/api/verification', Verification, { signal }),
  staleTime: Infinity,
})
