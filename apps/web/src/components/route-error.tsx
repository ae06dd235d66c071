import { Link, useRevalidator, useRouteError } from 'react-router-dom'
import { Button, buttonClass } from '#components/ui/button.tsx'
import { PlainSheet } from '#components/layouts/plain-sheet.tsx'
import { paths } from '#config/paths.ts'
import { ApiError, isStatus, messageOf } from '#lib/api-error.ts'

/** Shown in place of a screen that could not be opened. Not found and not allowed look alike. */
export const RouteError = () => {
  const error = useRouteError()
  const { revalidate } = useRevalidator()
  const missing =
    isStatus(error, 404) ||
    isStatus(error, 403) ||
    (typeof error === 'object' && error !== null && 'status' in error && error.status === 404)
  const reference = error instanceof ApiError ? error.problem?.instance : undefined
  if (!missing) console.error(error)
  return (
    <PlainSheet title={missing ? 'Not found' : 'This sheet did not open'}>
      <p className="text-read">
        {missing ? 'There is nothing at this address, or it is not yours to see.' : messageOf(error)}
      </p>
      {reference && !missing ? <p className="mt-2 font-mono text-cell text-pencil">Reference {reference}</p> : null}
      <div className="mt-6 flex gap-3">
        {missing ? null : (
          <Button look="main" onClick={() => void revalidate()}>
            Try again
          </Button>
        )}
        <Link className={buttonClass(missing ? 'main' : 'plain')} to={paths.projects()}>
          Projects
        </Link>
      </div>
    </PlainSheet>
  )
}
