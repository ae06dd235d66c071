import { useQuery } from '@tanstack/react-query'
import { useEffect } from 'react'
import { useLocation } from 'react-router-dom'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Loaded } from '#components/loaded.tsx'
import { referenceQuery } from '#features/help/api/reference.ts'
import { ReferenceSections } from '#features/help/components/reference-sections.tsx'
import { queryClient } from '#lib/query-client.ts'

export const loader = () => {
  void queryClient.prefetchQuery(referenceQuery)
  return null
}

export function Component() {
  const reference = useQuery(referenceQuery)
  const { hash } = useLocation()
  const loaded = reference.data !== undefined
  useEffect(() => {
    if (!loaded || hash === '') return
    const target = document.getElementById(decodeURIComponent(hash.slice(1)))
    target?.scrollIntoView()
    target?.focus()
  }, [loaded, hash])
  return (
    <Sheet title="Help">
      <Loaded query={reference} what="Loading the reference">
        {(data) => <ReferenceSections reference={data} here={decodeURIComponent(hash.slice(1))} />}
      </Loaded>
    </Sheet>
  )
}
