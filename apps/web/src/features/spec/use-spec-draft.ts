import type { SpecConflict, SpecDocument } from '@coldfill/contract'
import { mergeSpecs, type MergeChange } from '@coldfill/spec'
import { useCallback, useEffect, useRef, useState } from 'react'
import { refreshProject } from '#lib/refresh.ts'
import { conflictOf, saveSpec } from './api/spec.ts'
import { keptVersion, type Draft, type DraftOwner } from './draft-store.ts'
import { newSlot, useDraftShelf } from './use-draft-shelf.ts'

/** A merge with what somebody saved meanwhile, and what is left to choose. */
export interface MergedText {
  /** On which both texts were begun. */
  readonly base: SpecConflict
  readonly theirs: SpecConflict
  /** How many changes of theirs were put in; null where that was before the page was loaded. */
  readonly taken: number | null
  readonly conflicts: readonly MergeChange[]
  /** Where the own text from before is kept until the choice is saved. */
  readonly mineSlot: string | null
}

/**
 * A text that did not come from the keys of the editor that shows it. An editor takes only such a text over: what it reported
 * itself may come back to it later than the next key.
 */
export interface PushedText {
  readonly text: string
  readonly by: 'choice' | 'comparison'
}

export type SaveOutcome = 'saved' | 'conflict' | 'failed'

/**
 * The text in the editor and its life: kept on this device while it is not saved, saved against the version it was made from,
 * and set beside the other text where somebody saved meanwhile. Nothing typed is ever thrown away unasked.
 */
export const useSpecDraft = (document: SpecDocument, owner: DraftOwner) => {
  const [base, setBase] = useState<SpecConflict>(document)
  const [text, setText] = useState(document.text)
  const [pushed, setPushed] = useState<PushedText>({ text: document.text, by: 'choice' })
  const replace = (next: string) => {
    setText(next)
    setPushed({ text: next, by: 'choice' })
  }
  const shelf = useDraftShelf(owner, document.text)
  const { keep: keepOnShelf, drop } = shelf
  const [conflict, setConflict] = useState<SpecConflict | null>(null)
  const [merged, setMerged] = useState<MergedText | null>(null)
  const [saving, setSaving] = useState(false)
  const [error, setError] = useState<unknown>(null)
  const [slot, setSlot] = useState(newSlot)
  const latest = useRef(text)
  const dirty = text !== base.text
  const mergedFrom = merged?.base.version

  const draftOf = useCallback(
    (next: string, onto: SpecConflict, inSlot: string, from: number | undefined): Omit<Draft, 'at'> => ({
      slot: inSlot,
      text: next,
      baseVersion: onto.version,
      ...(from === undefined ? {} : { part: 'merged', mergedFrom: from }),
    }),
    [],
  )

  const keep = useCallback(
    (next: string, onto: SpecConflict, inSlot: string, from: number | undefined) => {
      if (next === onto.text) drop(inSlot)
      else keepOnShelf(draftOf(next, onto, inSlot, from), onto)
    },
    [keepOnShelf, drop, draftOf],
  )

  const change = useCallback(
    (next: string) => {
      setText(next)
      keep(next, base, slot, mergedFrom)
    },
    [base, keep, slot, mergedFrom],
  )

  /** The same for what is typed into the right text of a comparison. */
  const changeInComparison = (next: string) => {
    change(next)
    setPushed({ text: next, by: 'comparison' })
  }

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
        replace(document.text)
      }
    }
  }

  const saveOnto = async (onto: SpecConflict): Promise<SaveOutcome> => {
    const sent = text
    setSaving(true)
    setError(null)
    try {
      const saved = await saveSpec(owner.project, { text: sent, baseVersion: onto.version })
      // The server keeps the newest text alone: what was saved over is kept here.
      if (conflict && onto === conflict)
        shelf.offer(
          shelf.keep(
            { slot: newSlot(), text: conflict.text, baseVersion: conflict.version, part: 'saved over' },
            conflict,
          ),
        )
      if (merged?.mineSlot) drop(merged.mineSlot)
      setBase(saved)
      setConflict(null)
      setMerged(null)
      keep(latest.current, saved, slot, undefined)
      await refreshProject(owner.project)
      return 'saved'
    } catch (failure) {
      const current = conflictOf(failure)
      if (current) setConflict(current)
      else setError(failure)
      return current ? 'conflict' : 'failed'
    } finally {
      setSaving(false)
    }
  }

  /** Keeps what stands in the editor beside what comes in its place. */
  const setAside = (part?: Draft['part']): string => {
    shelf.offer(shelf.keep({ ...draftOf(text, base, slot, mergedFrom), ...(part && { part }) }, base))
    const next = newSlot()
    setSlot(next)
    return next
  }

  /** Puts the other text into the editor; the own one stays on this device and is offered. */
  const takeTheirs = () => {
    if (!conflict) return
    setAside()
    setBase(conflict)
    replace(conflict.text)
    setConflict(null)
    setMerged(null)
  }

  /** Puts their changes into the own text by path. False where a text cannot be read, so that only comparing is left. */
  const mergeBoth = (): boolean => {
    if (!conflict) return false
    const merge = mergeSpecs(base.text, text, conflict.text)
    if (!merge.ok) return false
    const mineSlot = slot
    const next = setAside('before merging')
    setMerged({ base, theirs: conflict, taken: merge.taken.length, conflicts: merge.conflicts, mineSlot })
    setBase(conflict)
    replace(merge.text)
    keep(merge.text, conflict, next, base.version)
    setConflict(null)
    return true
  }

  const settle = (path: string) => {
    if (merged) setMerged({ ...merged, conflicts: merged.conflicts.filter((each) => each.path !== path) })
  }

  /** Chooses their value at one place that both changed. False where it cannot be put in by itself. */
  const takeTheirsAt = (path: string): boolean => {
    if (!merged) return false
    const merge = mergeSpecs(merged.base.text, text, merged.theirs.text, (each) => (each === path ? 'theirs' : 'mine'))
    if (!merge.ok || !merge.taken.some((each) => each.path === path)) return false
    replace(merge.text)
    keep(merge.text, base, slot, mergedFrom)
    settle(path)
    return true
  }

  const throwAway = (draft: Draft) => drop(draft.slot)

  /**
   * Puts a kept draft into the editor; what stood there is kept in its place, if it was not saved. A draft that was begun on an
   * older version comes back with the conflict, so that saving it never swallows what was saved meanwhile.
   */
  const takeUp = (draft: Draft) => {
    const newest = conflict ?? (document.version > base.version ? document : base)
    if (dirty) setAside()
    shelf.withdraw(draft.slot)
    const versionOf = (version: number) => keptVersion(localStorage, owner, version)
    const begun =
      draft.part === 'saved over' || draft.baseVersion === newest.version
        ? newest
        : (versionOf(draft.baseVersion) ?? { ...newest, version: draft.baseVersion, text: '' })
    const from = draft.part === 'merged' && draft.mergedFrom !== undefined ? versionOf(draft.mergedFrom) : null
    const left = from ? mergeSpecs(from.text, draft.text, begun.text, () => 'mine') : null
    const before = shelf.offered.find((each) => each.part === 'before merging')
    setMerged(
      from && left?.ok
        ? { base: from, theirs: begun, taken: null, conflicts: left.conflicts, mineSlot: before?.slot ?? null }
        : null,
    )
    setConflict(begun === newest ? null : newest)
    setBase(begun)
    setSlot(draft.slot)
    replace(draft.text)
    keep(draft.text, begun, draft.slot, from?.version)
  }

  return {
    text,
    pushed,
    change,
    changeInComparison,
    base,
    dirty,
    kept: shelf.kept,
    saving,
    error,
    offered: shelf.offered,
    conflict,
    save: () => saveOnto(base),
    saveOver: () => saveOnto(conflict ?? base),
    takeTheirs,
    mergeBoth,
    merged,
    takeTheirsAt,
    keepMineAt: settle,
    endMerge: () => setMerged(null),
    takeUp,
    throwAway,
  }
}

export type SpecDraft = ReturnType<typeof useSpecDraft>
