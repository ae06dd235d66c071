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

export const passes = (redline: Redline, filter: Filter): boolean => {
  switch (filter) {
    case 'open':
      return redline.state !== 'closed'
    case 'waiting':
      return redline.state === 'open' && redline.waitingOnYou
    case 'adrift':
      return redline.anchorState === 'adrift'
    case 'closed':
      return redline.state === 'closed'
    case 'all':
      return true
  }
}

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

export const placeOf = (anchor: Redline['anchor']): string => {
  switch (anchor.type) {
    case 'row':
      return `row ${anchor.mark}`
    case 'cell':
      return `cell ${anchor.mark} ${anchor.column}`
    case 'assumption':
      return `assumption ${anchor.assumption}`
    case 'spec':
      return `spec ${anchor.path}`
  }
}
