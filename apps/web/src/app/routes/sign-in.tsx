import { redirect, useNavigate, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom'
import { PlainSheet } from '#components/layouts/plain-sheet.tsx'
import { paths } from '#config/paths.ts'
import { sessionQuery } from '#features/session/api/session.ts'
import { SignInForm } from '#features/session/components/sign-in-form.tsx'
import { queryClient } from '#lib/query-client.ts'

/** Only an address of this application may follow the sign-in. */
const destination = (to: string | null): string => (to && /^\/(?![/\\])/.test(to) ? to : paths.projects())

export const loader = async ({ request }: LoaderFunctionArgs) => {
  const session = await queryClient.fetchQuery({ ...sessionQuery, staleTime: 0 }).catch(() => null)
  return session ? redirect(destination(new URL(request.url).searchParams.get('to'))) : null
}

export function Component() {
  const navigate = useNavigate()
  const [search] = useSearchParams()
  return (
    <PlainSheet title="Sign in">
      <SignInForm onDone={() => void navigate(destination(search.get('to')), { replace: true })} />
    </PlainSheet>
  )
}
