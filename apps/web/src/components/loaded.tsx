import type { UseQueryResult } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { ApiError, messageOf } from '#lib/api-error.ts'
import { Band } from './ui/band.tsx'
import { Button } from './ui/button.tsx'
import { GhostRows } from './ui/waiting.tsx'

interface Props<T> {
  readonly query: UseQueryResult<T>
  /** Said while it takes long: "Loading the schedule". */
  readonly what: string
  readonly rows?: number
  readonly children: (data: T) => ReactNode
}

/** Ghost rows, then the thing. Where asking again fails the last answer stays, under a band that offers to try again. */
export const Loaded = <T,>({ query, what, rows = 6, children }: Props<T>) => {
  const failed = query.isError ? (
    <Band
      tone="error"
      live="alert"
      title={query.data === undefined ? `${what} failed.` : `${what} failed; this is the last answer.`}
      actions={
        <Button busy={query.isFetching} onClick={() => void query.refetch()}>
          Try again
        </Button>
      }
    >
      {messageOf(query.error)}
      {query.error instanceof ApiError && query.error.problem ? (
        <span className="ml-2 font-mono text-cell text-pencil">{query.error.problem.instance}</span>
      ) : null}
    </Band>
  ) : null
  if (query.data === undefined) return failed ?? <GhostRows rows={rows} what={what} />
  return (
    <>
      {failed ? <div className="mb-3">{failed}</div> : null}
      {children(query.data)}
    </>
  )
}
