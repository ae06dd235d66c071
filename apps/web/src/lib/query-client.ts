import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query'
import { isStatus } from './api-error.ts'
import { createStore } from './store.ts'

/** True once the server has said that the session is over; the frame then offers to sign in again and nothing typed is lost. */
export const sessionEnded = createStore(false)

const noteSessionEnd = (error: unknown) => {
  if (isStatus(error, 401)) sessionEnded.set(true)
}

export const queryClient = new QueryClient({
  // Asking who is signed in is answered by 401 before anyone is; that is no session that ended.
  queryCache: new QueryCache({
    onError: (error, query) => (query.queryKey[0] === 'session' ? undefined : noteSessionEnd(error)),
  }),
  mutationCache: new MutationCache({ onError: noteSessionEnd }),
  defaultOptions: {
    queries: { staleTime: 10_000, retry: false, throwOnError: false },
    mutations: { retry: false },
  },
})
