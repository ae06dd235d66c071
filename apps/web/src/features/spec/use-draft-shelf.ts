import type { SpecConflict } from '@coldfill/contract'
import { useCallback, useRef, useState } from 'react'
import { draftsOf, dropDraft, keepDraft, keepVersion, type Draft, type DraftOwner } from './draft-store.ts'

export const newSlot = (): string => `${Date.now().toString(36)}${Math.random().toString(36).slice(2, 8)}`

/** What is kept on this device of a spec: the text being typed, and others that are offered until one is chosen. */
export const useDraftShelf = (owner: DraftOwner, savedText: string) => {
  const [offered, setOffered] = useState<readonly Draft[]>(() =>
    draftsOf(localStorage, owner).filter((draft) => draft.text !== savedText),
  )
  const [kept, setKept] = useState(true)
  const begun = useRef('')

  /** Keeps a text with the version that it was begun on. */
  const keep = useCallback(
    (draft: Omit<Draft, 'at'>, base: SpecConflict): Draft => {
      const dated: Draft = { ...draft, at: new Date().toISOString() }
      setKept(keepDraft(localStorage, owner, dated))
      // The version is written once, not with every key.
      const name = `${draft.slot} ${base.version}`
      if (begun.current !== name) keepVersion(localStorage, owner, base)
      begun.current = name
      return dated
    },
    [owner],
  )

  const drop = useCallback(
    (slot: string) => {
      dropDraft(localStorage, owner, slot)
      begun.current = ''
      setKept(true)
      setOffered((drafts) =>
        drafts.some((each) => each.slot === slot) ? drafts.filter((each) => each.slot !== slot) : drafts,
      )
    },
    [owner],
  )

  const offer = useCallback((draft: Draft) => {
    setOffered((drafts) => [draft, ...drafts.filter((each) => each.slot !== draft.slot)])
  }, [])

  const withdraw = useCallback((slot: string) => {
    setOffered((drafts) => drafts.filter((each) => each.slot !== slot))
  }, [])

  return { offered, kept, keep, drop, offer, withdraw }
}
