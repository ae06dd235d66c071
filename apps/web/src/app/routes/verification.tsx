import { useQuery } from '@tanstack/react-query'
import type { Verification } from '@coldfill/contract'
import { useDeferredValue, useMemo, useState } from 'react'
import { Link } from 'react-router-dom'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Loaded } from '#components/loaded.tsx'
import { Button } from '#components/ui/button.tsx'
import { TextField } from '#components/ui/field.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { paths } from '#config/paths.ts'
import { verificationQuery } from '#features/help/api/verification.ts'
import { VerificationTable } from '#features/help/components/verification-table.tsx'
import {
  countOf,
  filteredGroups,
  isVerificationFilter,
  VERIFICATION_FILTERS,
  type VerificationFilter,
} from '#features/help/verification-filter.ts'
import { capital, plural } from '#lib/format.ts'
import { queryClient } from '#lib/query-client.ts'
import { useAddress } from '#lib/search-params.ts'

export const loader = () => {
  void queryClient.prefetchQuery(verificationQuery)
  return null
}

const parts = [
  { part: 'published cases', title: 'Published cases', note: 'Figures of publications' },
  { part: 'worked examples', title: 'Worked examples', note: 'One at least for each method' },
] as const

const Filters = ({
  manual,
  filter,
  onChoose,
}: {
  readonly manual: Verification
  readonly filter: VerificationFilter
  readonly onChoose: (filter: VerificationFilter) => void
}) => (
  <div role="group" aria-label="Show" className="flex flex-wrap gap-1 print:hidden">
    {VERIFICATION_FILTERS.map((one) => (
      <button
        key={one}
        type="button"
        aria-pressed={one === filter}
        onClick={() => onChoose(one)}
        className={`h-8 border-[1.5px] px-3 text-cell font-medium ${one === filter ? 'border-ink bg-ink text-sheet' : 'border-rule bg-sheet hover:border-ink'}`}
      >
        {capital(one)} <span className="figures">{countOf(manual.groups, one)}</span>
      </button>
    ))}
  </div>
)

const Manual = ({ manual }: { readonly manual: Verification }) => {
  const { get, change } = useAddress()
  const asked = get('show')
  const filter = isVerificationFilter(asked) ? asked : 'all'
  const [sought, setSought] = useState('')
  const settled = useDeferredValue(sought)
  const groups = useMemo(() => filteredGroups(manual.groups, filter, settled), [manual, filter, settled])
  const { counts } = manual
  const fromMemory = countOf(manual.groups, 'from memory')
  return (
    <div className="flex max-w-6xl flex-col gap-7">
      <div className="flex max-w-[80ch] flex-col gap-2 text-read">
        <p>
          Published figures and worked examples, computed now by engine {manual.engine}:{' '}
          <strong>{counts.holds} hold</strong>, <strong>{counts.fails} fail</strong>, and{' '}
          <strong>{counts.knownWrong} are known to be wrong in print</strong>, each with the reason. The tolerance of a
          figure comes from its printed digits.
        </p>
        <p className="text-pencil">
          {plural(fromMemory, 'expected value')} {fromMemory === 1 ? 'is' : 'are'} from memory and marked so: read them
          against the publication before leaning on them. <em>Derived</em> values were evaluated from the published
          equation apart from this program.
        </p>
      </div>
      <div className="flex flex-wrap items-end gap-x-5 gap-y-3 print:hidden">
        <Filters
          manual={manual}
          filter={filter}
          onChoose={(next) => change({ show: next === 'all' ? null : next }, { replace: true })}
        />
        <div className="w-64">
          <TextField
            label="Search"
            type="search"
            value={sought}
            placeholder="Source, case or figure"
            onChange={(event) => setSought(event.target.value)}
          />
        </div>
      </div>
      {groups.length === 0 ? <p className="border-t-2 border-ink pt-2">Nothing like that.</p> : null}
      {parts.map(({ part, title, note }) => {
        const own = groups.filter((group) => group.part === part)
        return own.length === 0 ? null : (
          <section key={part}>
            <SectionHeading note={note}>{title}</SectionHeading>
            <VerificationTable groups={own} />
          </section>
        )
      })}
      {filter === 'all' && settled === '' ? (
        <section>
          <SectionHeading note={plural(manual.notRun.length, 'case')}>Known and not run</SectionHeading>
          <dl className="border-t-2 border-ink">
            {manual.notRun.map(({ id, title, reason }) => (
              <div key={id} className="gap-x-4 border-b border-hair py-1.5 text-cell desk:grid desk:grid-cols-2">
                <dt>{title}</dt>
                <dd className="text-pencil">{reason}</dd>
              </div>
            ))}
          </dl>
        </section>
      ) : null}
    </div>
  )
}

export function Component() {
  const verification = useQuery(verificationQuery)
  return (
    <Sheet
      title="Verification"
      actions={
        <>
          <Link to={paths.help()}>Help</Link>
          <Button onClick={() => window.print()}>Print</Button>
        </>
      }
    >
      <Loaded query={verification} what="Running the verification manual">
        {(manual) => <Manual manual={manual} />}
      </Loaded>
    </Sheet>
  )
}
