import type { Anchor, AnchorState } from '@coldfill/contract'
import { paths, withQuery } from '#config/paths.ts'

const spaced = (key: string) => key.replaceAll('-', ' ')

/** Where a redline stands, in words: `ET-1 · precharge`. */
export const anchorWords = (anchor: Anchor): string => {
  if (anchor.type === 'row') return `${anchor.mark} · whole row`
  if (anchor.type === 'cell') return `${anchor.mark} · ${spaced(anchor.column)}`
  return anchor.type === 'assumption'
    ? `Assumption · ${spaced(anchor.assumption.replaceAll('.', ' · '))}`
    : `Spec · ${anchor.path}`
}

/** Address of the place a redline stands on. */
export const anchorLink = (project: string, anchor: Anchor, rev: string | null): string => {
  if (anchor.type === 'row') return withQuery(paths.schedule(project), { rev, row: anchor.mark })
  if (anchor.type === 'cell') return withQuery(paths.schedule(project), { rev, row: anchor.mark, col: anchor.column })
  return anchor.type === 'assumption'
    ? withQuery(paths.basis(project), { rev, assumption: anchor.assumption })
    : withQuery(paths.spec(project), { rev, path: anchor.path })
}

export const anchorStateWords: Readonly<Record<AnchorState, { readonly word: string; readonly says: string }>> = {
  pinned: { word: 'Pinned', says: 'The value is the one it was written on.' },
  moved: { word: 'Moved', says: 'Same place, new value.' },
  adrift: { word: 'Adrift', says: 'The place is gone from this revision; the redline is kept.' },
}
