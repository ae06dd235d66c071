import type { ComponentType } from 'react'
import { redirect } from 'react-router-dom'
import { Sheet } from '#components/layouts/sheet.tsx'
import { paths } from '#config/paths.ts'
import { AuditTrailTable } from '#features/office/components/audit-trail.tsx'
import { Catalogue } from '#features/office/components/catalogue.tsx'
import { OutboxList } from '#features/office/components/outbox.tsx'
import { PeopleTable } from '#features/office/components/people.tsx'
import { TitleBlockPart } from '#features/office/components/title-block.tsx'
import { sessionQuery } from '#features/session/api/session.ts'
import { ApiError } from '#lib/api-error.ts'
import { queryClient } from '#lib/query-client.ts'
import { useAddress } from '#lib/search-params.ts'

/** For others than administrators the page does not exist. */
export const loader = async () => {
  const session = await queryClient.ensureQueryData(sessionQuery).catch(() => null)
  if (!session) return redirect(paths.signIn(paths.office()))
  if (!session.user.administrator) throw new ApiError(404, 'not_found', 'There is nothing at this address.')
  return null
}

const parts: readonly { readonly id: string; readonly name: string; readonly Part: ComponentType }[] = [
  { id: 'outbox', name: 'Outbox', Part: OutboxList },
  { id: 'people', name: 'People', Part: PeopleTable },
  { id: 'catalogue', name: 'Catalogue', Part: Catalogue },
  { id: 'title-block', name: 'Title block', Part: TitleBlockPart },
  { id: 'audit', name: 'Audit trail', Part: AuditTrailTable },
]

export function Component() {
  const { get, change } = useAddress()
  const here = parts.find((part) => part.id === get('part')) ?? parts[0]
  return (
    <Sheet title="Office" tab={`Office ${here?.name ?? ''}`}>
      <div
        role="tablist"
        aria-label="Parts of the office"
        className="mb-5 flex gap-1 overflow-x-auto border-b-2 border-ink"
      >
        {parts.map(({ id, name }) => (
          <button
            key={id}
            type="button"
            role="tab"
            aria-selected={id === here?.id}
            aria-controls="office-part"
            onClick={() => change({ part: id })}
            className={`h-9 shrink-0 px-3 ${id === here?.id ? 'border-b-[3px] border-b-steel font-semibold' : 'text-pencil hover:text-ink'}`}
          >
            {name}
          </button>
        ))}
      </div>
      <div id="office-part" role="tabpanel">
        {here ? <here.Part /> : null}
      </div>
    </Sheet>
  )
}
