import { queryClient } from './query-client.ts'

/** After a write: everything shown of the project is asked again, and the list of projects too. */
export const refreshProject = async (number: string): Promise<void> => {
  await Promise.all([
    queryClient.invalidateQueries({ queryKey: ['projects', number] }),
    queryClient.invalidateQueries({ queryKey: ['projects'], exact: true }),
  ])
}
