import type { Redline } from '@coldfill/contract'
import { outlineOf, type OutlineItem, type Range } from '@coldfill/spec'
import { memo, useMemo, useState } from 'react'
import { SeverityMark } from '#components/ui/severity-mark.tsx'
import { plural } from '#lib/format.ts'
import type { Finding } from '#lib/sized-project.ts'
import type { MarginEntry } from '../margin-lines.ts'
import { badgesOf, type Badge } from '../outline-badges.ts'
import { redlinesOf } from '../redlined.ts'

interface Props {
  readonly text: string
  readonly findings: readonly Finding[]
  readonly entries: readonly MarginEntry[]
  readonly stale: boolean
  /** Those of the newest issue, or of the one that is shown. */
  readonly redlines: readonly Redline[]
  readonly onJump: (range: Range) => void
}

type Filter = 'all' | 'findings' | 'changed' | 'redlines'

const NOTHING: Readonly<Record<Filter, string>> = {
  all: 'Nothing is written yet.',
  findings: 'No finding.',
  changed: 'Nothing differs from the last issue.',
  redlines: 'No open redline.',
}

const Badges = ({ badge }: { readonly badge: Badge | undefined }) =>
  badge ? (
    <span className="inline-flex shrink-0 items-center gap-0.5" title={plural(badge.count, 'finding')}>
      <SeverityMark severity={badge.severity} />
      {badge.count > 1 ? <span className="figures text-cell">{badge.count}</span> : null}
    </span>
  ) : null

/** The flag of a redline, with how many there are. */
const Redlined = ({ count }: { readonly count: number }) =>
  count === 0 ? null : (
    <span
      title={plural(count, 'open redline')}
      className="figures inline-flex h-4 min-w-4 shrink-0 items-center justify-center bg-redline px-1 font-mono text-[10px] font-semibold text-sheet"
    >
      <span className="sr-only">{plural(count, 'open redline')}</span>
      <span aria-hidden="true">{count}</span>
    </span>
  )

interface ItemProps {
  readonly item: OutlineItem
  readonly badge: Badge | undefined
  readonly redlines: number
  readonly entry: MarginEntry | undefined
  readonly stale: boolean
  readonly onJump: (range: Range) => void
}

const insets = { building: 'pl-3', fluid: 'pl-3', system: 'pl-3', vessel: 'pl-6' } as const

const Item = ({ item, badge, redlines, entry, stale, onJump }: ItemProps) => (
  <button
    type="button"
    onClick={() => onJump(item.range)}
    className={`block w-full py-[3px] pr-3 text-left hover:bg-steel-wash ${insets[item.sort]}`}
  >
    <span className="flex items-baseline justify-between gap-2">
      <span className={`font-mono text-cell break-words ${item.sort === 'vessel' ? '' : 'font-semibold'}`}>
        {item.name || item.detail}
        {entry?.was ? (
          <span className="ml-1 font-sans text-redline" title={`${entry.was} in the last issue`}>
            △
          </span>
        ) : null}
      </span>
      <span className="flex min-w-0 items-center gap-1.5">
        {entry ? (
          <span
            className={`figures truncate text-cell ${entry.sized ? 'text-pencil' : 'text-fault'} ${stale ? 'opacity-60' : ''}`}
          >
            {entry.size}
          </span>
        ) : null}
        <Redlined count={redlines} />
        <Badges badge={badge} />
      </span>
    </span>
    {item.sort !== 'vessel' && item.name !== '' && item.detail !== '' ? (
      <span className="block truncate text-cell text-pencil">{item.detail}</span>
    ) : null}
  </button>
)

const flat = (item: OutlineItem): readonly OutlineItem[] => [item, ...item.children.flatMap(flat)]

const Drawn = ({ text, findings, entries, stale, redlines, onJump }: Props) => {
  const [filter, setFilter] = useState<Filter>('all')
  const read = useMemo(() => outlineOf(text), [text])
  // While nothing can be read the outline stays as it was.
  const [outline, setOutline] = useState(read)
  if (read && read !== outline) setOutline(read)
  const badges = useMemo(() => (outline ? badgesOf(outline, findings) : new Map<string, Badge>()), [outline, findings])
  const redlined = useMemo(
    () => (outline ? redlinesOf(outline, redlines) : new Map<string, number>()),
    [outline, redlines],
  )
  if (!outline)
    return (
      <nav aria-label="Outline" className="h-full border-r border-hair py-2">
        <p className="px-3 text-cell text-pencil">No outline while the text cannot be read.</p>
      </nav>
    )
  const entryOf = (item: OutlineItem) =>
    item.sort === 'vessel' ? entries.find((entry) => entry.line === item.range.start.line) : undefined
  const items = flat(outline)
  const answers: Readonly<Record<Filter, (item: OutlineItem) => boolean>> = {
    all: () => true,
    findings: ({ path }) => badges.has(path),
    changed: (item) => Boolean(entryOf(item)?.was),
    redlines: ({ path }) => redlined.has(path),
  }
  const holds = (item: OutlineItem): boolean => answers[filter](item) || item.children.some(holds)
  const shown = items.filter((item) => (item === outline && filter === 'all') || (item !== outline && holds(item)))
  const filters = [
    { id: 'all' as const, label: 'All' },
    { id: 'findings' as const, label: 'Findings' },
    { id: 'changed' as const, label: 'Changed' },
    { id: 'redlines' as const, label: 'Redlines' },
  ]
  return (
    <nav aria-label="Outline" className="flex h-full flex-col border-r border-hair">
      <div role="group" aria-label="Show" className="flex shrink-0 border-b border-hair">
        {filters.map(({ id, label }) => (
          <button
            key={id}
            type="button"
            aria-pressed={filter === id}
            onClick={() => setFilter(id)}
            className={`h-7 flex-auto px-1 text-cell ${filter === id ? 'border-b-[3px] border-b-steel font-semibold' : 'text-pencil hover:text-ink'}`}
          >
            {label}
          </button>
        ))}
      </div>
      <ul className="min-h-0 flex-1 overflow-y-auto py-1">
        {shown.length === 0 ? <li className="px-3 text-cell text-pencil">{NOTHING[filter]}</li> : null}
        {shown.map((item) => (
          <li key={item.path}>
            <Item
              item={item}
              badge={badges.get(item.path)}
              redlines={redlined.get(item.path) ?? 0}
              entry={entryOf(item)}
              stale={stale}
              onJump={onJump}
            />
          </li>
        ))}
      </ul>
    </nav>
  )
}

/** The building with its fluids, systems and vessels, each with its size and its findings; a way through a long spec. */
export const Outline = memo(Drawn)
