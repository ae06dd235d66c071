import type { SpecConflict, SpecDocument } from '@coldfill/contract'
import { mergeSpecs, type MergeChange } from '@coldfill/spec'
import { useCallback, useEffect, useRef, useState } from 'react'
import { refreshProject } from '#lib/refresh.ts'
import { conflictOf, saveSpec } from './api/spec.ts'
import { draftsOf, dropDraft, keepDraft, type Draft, type DraftOwner } from './draft-store.ts'

const newSlot = (): string => `${Date.now().toString(36)}${Math.random().toString(36).slice(2, 8)}`

/** A merge with what somebody saved meanwhile, and what is left to choose. */
export interface MergedText {
  readonly version: number
  readonly base: string
  readonly theirs: string
  readonly taken: number
  readonly conflicts: readonly MergeChange[]
}

/**
 * The text in the editor and its life: kept on this device while it is not saved, saved against the version it was made from,
 * and set beside the other text where somebody saved meanwhile. Nothing typed is ever thrown away unasked.
 */
export const useSpecDraft = (document: SpecDocument, owner: DraftOwner) => {
  const [base, setBase] = useState<SpecConflict>(document)
  const [text, setText] = useState(document.text)
  const [offered, setOffered] = useState<readonly Draft[]>(() =>
    draftsOf(localStorage, owner).filter((draft) => draft.text !== document.text),
  )
  const [conflict, setConflict] = useState<SpecConflict | null>(null)
  const [merged, setMerged] = useState<MergedText | null>(null)
  const [saving, setSaving] = useState(false)
  const [error, setError] = useState<unknown>(null)
  const [kept, setKept] = useState(true)
  const [slot, setSlot] = useState(newSlot)
  const latest = useRef(text)
  const dirty = text !== base.text

  const keep = useCallback(
    (next: string, onto: SpecConflict, inSlot: string) => {
      if (next === onto.text) {
        dropDraft(localStorage, owner, inSlot)
        setKept(true)
      } else
        setKept(
          keepDraft(localStorage, owner, {
            slot: inSlot,
            text: next,
            baseVersion: onto.version,
            at: new Date().toISOString(),
          }),
        )
    },
    [owner],
  )

  const change = useCallback(
    (next: string) => {
      setText(next)
      keep(next, base, slot)
    },
    [base, keep, slot],
  )

  // What was typed while a save is under way is compared with what was sent when the answer comes.
  useEffect(() => {
    latest.current = text
  }, [text])

  // Someone else saved while this editor was open: follow where nothing was typed, say so where something was.
  const [seen, setSeen] = useState(document)
  if (document !== seen) {
    setSeen(document)
    if (document.version > base.version) {
      if (dirty && document.text !== text) setConflict(document)
      else {
        setBase(document)
        setText(document.text)
      }
    }
  }

  const saveOnto = async (onto: SpecConflict) => {
    const sent = text
    setSaving(true)
    setError(null)
    try {
      const saved = await saveSpec(owner.project, { text: sent, baseVersion: onto.version })
      setBase(saved)
      setConflict(null)
      keep(latest.current, saved, slot)
      await refreshProject(owner.project)
    } catch (failure) {
      const current = conflictOf(failure)
      if (current) setConflict(current)
      else setError(failure)
    } finally {
      setSaving(false)
    }
  }

  /** Puts the other text into the editor; the own one stays on this device and is offered. */
  const takeTheirs = () => {
    if (!conflict) return
    const mine: Draft = { slot, text, baseVersion: base.version, at: new Date().toISOString() }
    setKept(keepDraft(localStorage, owner, mine))
    setOffered((drafts) => [mine, ...drafts])
    setSlot(newSlot())
    setBase(conflict)
    setText(conflict.text)
    setConflict(null)
  }

  /** Puts their changes into the own text by path. False where a text cannot be read, so that only comparing is left. */
  const mergeBoth = (): boolean => {
    if (!conflict) return false
    const merge = mergeSpecs(base.text, text, conflict.text)
    if (!merge.ok) return false
    const mine: Draft = { slot, text, baseVersion: base.version, at: new Date().toISOString() }
    const inSlot = newSlot()
    setKept(keepDraft(localStorage, owner, mine))
    setOffered((drafts) => [mine, ...drafts])
    setSlot(inSlot)
    setMerged({
      version: conflict.version,
      base: base.text,
      theirs: conflict.text,
      taken: merge.taken.length,
      conflicts: merge.conflicts,
    })
    setBase(conflict)
    setText(merge.text)
    keep(merge.text, conflict, inSlot)
    setConflict(null)
    return true
  }

  /** Chooses their value at one place that both changed. */
  const takeTheirsAt = (path: string) => {
    if (!merged) return
    const merge = mergeSpecs(merged.base, text, merged.theirs, (each) => (each === path ? 'theirs' : 'mine'))
    if (!merge.ok) return
    change(merge.text)
    setMerged({
      ...merged,
      taken: merged.taken + merge.taken.filter((each) => each.path === path).length,
      conflicts: merge.conflicts.filter((each) => merged.conflicts.some((open) => open.path === each.path)),
    })
  }

  const throwAway = (draft: Draft) => {
    dropDraft(localStorage, owner, draft.slot)
    setOffered((drafts) => drafts.filter((other) => other.slot !== draft.slot))
  }

  /** Puts a kept draft into the editor; what stood there is kept in its place, if it was not saved. */
  const takeUp = (draft: Draft) => {
    if (dirty) {
      const mine: Draft = { slot, text, baseVersion: base.version, at: new Date().toISOString() }
      keepDraft(localStorage, owner, mine)
      setOffered((drafts) => [mine, ...drafts.filter((other) => other.slot !== draft.slot)])
    } else setOffered((drafts) => drafts.filter((other) => other.slot !== draft.slot))
    setSlot(draft.slot)
    setText(draft.text)
    keep(draft.text, base, draft.slot)
  }

  return {
    text,
    change,
    base,
    dirty,
    kept,
    saving,
    error,
    offered,
    conflict,
    save: () => saveOnto(base),
    saveOver: () => saveOnto(conflict ?? base),
    takeTheirs,
    mergeBoth,
    merged,
    takeTheirsAt,
    endMerge: () => setMerged(null),
    takeUp,
    throwAway,
  }
}
