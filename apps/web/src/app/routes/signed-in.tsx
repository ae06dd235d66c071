import { Outlet, redirect, type LoaderFunctionArgs } from 'react-router-dom'
import { paths } from '#config/paths.ts'
import { sessionQuery } from '#features/session/api/session.ts'
import { isStatus } from '#lib/api-error.ts'
import { queryClient } from '#lib/query-client.ts'

export const loader = async ({ request }: LoaderFunctionArgs) => {
  try {
    return await queryClient.ensureQueryData(sessionQuery)
  } catch (error) {
    if (!isStatus(error, 401)) throw error
    const { pathname, search } = new URL(request.url)
    return redirect(paths.signIn(`${pathname}${search}`))
  }
}

export function Component() {
  return <Outlet />
}
