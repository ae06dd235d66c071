import type { Redline } from '@coldfill/contract'

export const FILTERS = ['open', 'waiting', 'adrift', 'closed', 'all'] as const
export type Filter = (typeof FILTERS)[number]

export const filterLabels: Readonly<Record<Filter, string>> = {
  open: 'Open',
  waiting: 'Waiting on you',
  adrift: 'Adrift',
  closed: 'Closed',
  all: 'All',
}

export const isFilter = (text: string | null): text is Filter => FILTERS.some((filter) => filter === text)

const tests: Readonly<Record<Filter, (redline: Redline) => boolean>> = {
  open: (redline) => redline.state !== 'closed',
  waiting: (redline) => redline.state === 'open' && redline.waitingOnYou,
  adrift: (redline) => redline.anchorState === 'adrift',
  closed: (redline) => redline.state === 'closed',
  all: () => true,
}

export const passes = (redline: Redline, filter: Filter): boolean => tests[filter](redline)

/** Redlines by the cell or assumption they stand on; closed ones are left out. */
export const redlinesByPlace = (redlines: readonly Redline[]): ReadonlyMap<string, readonly Redline[]> => {
  const places = new Map<string, Redline[]>()
  for (const redline of redlines) {
    if (redline.state === 'closed') continue
    const place = placeOf(redline.anchor)
    places.set(place, [...(places.get(place) ?? []), redline])
  }
  return places
}

/** One word for a place, to find redlines by. */
export const placeOf = (anchor: Redline['anchor']): string => {
  if (anchor.type === 'row') return `row ${anchor.mark}`
  if (anchor.type === 'cell') return `cell ${anchor.mark} ${anchor.column}`
  return anchor.type === 'assumption' ? `assumption ${anchor.assumption}` : `spec ${anchor.path}`
}
