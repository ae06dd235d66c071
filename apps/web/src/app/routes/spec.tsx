import { useQuery } from '@tanstack/react-query'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Loaded } from '#components/loaded.tsx'
import { referenceQuery } from '#features/help/api/reference.ts'
import { useProject } from '#features/projects/api/projects.ts'
import { useSession } from '#features/session/api/session.ts'
import { specQuery } from '#features/spec/api/spec.ts'
import { queryClient } from '#lib/query-client.ts'
import { useAddress } from '#lib/search-params.ts'
import { useProjectNumber } from '#lib/route-params.ts'
import { SpecSheet } from './spec-sheet.tsx'

export const loader = () => {
  void queryClient.prefetchQuery(referenceQuery)
  return null
}

export function Component() {
  const number = useProjectNumber()
  const project = useProject(number)
  const { user } = useSession()
  const { get } = useAddress()
  const rev = get('rev')
  const document = useQuery(specQuery(number, rev))
  const reference = useQuery(referenceQuery)
  if (document.data) {
    return (
      <SpecSheet
        key={`${user.id} ${number} ${rev ?? ''}`}
        project={project}
        user={user.id}
        document={document.data}
        rev={rev}
        reference={reference}
      />
    )
  }
  return (
    <Sheet title="Spec">
      <Loaded query={document} what="Loading the spec">
        {() => null}
      </Loaded>
    </Sheet>
  )
}
