import { Session, type SignInRequest } from '@coldfill/contract'
import { queryOptions, useSuspenseQuery } from '@tanstack/react-query'
import { api } from '#lib/api-client.ts'
import { queryClient } from '#lib/query-client.ts'
import { sessionEnded } from '#lib/session-ended.ts'

export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: ({ signal }) => api.get('/api/session', Session, { signal }),
  staleTime: Infinity,
})

export const useSession = (): Session => useSuspenseQuery(sessionQuery).data

export const signIn = async (request: SignInRequest): Promise<void> => {
  const session = await api.post('/api/session', request, Session)
  // Another person may have used this tab: nothing of theirs stays.
  queryClient.clear()
  queryClient.setQueryData(sessionQuery.queryKey, session)
  sessionEnded.set(false)
}

export const signOut = async (): Promise<void> => {
  await api.act('DELETE', '/api/session')
  queryClient.clear()
}
