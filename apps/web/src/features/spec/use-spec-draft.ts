import type { SpecConflict, SpecDocument } from '@coldfill/contract'
import { useCallback, useEffect, useRef, useState } from 'react'
import { refreshProject } from '#lib/refresh.ts'
import { conflictOf, saveSpec } from './api/spec.ts'
import { draftsOf, dropDraft, keepDraft, type Draft, type DraftOwner } from './draft-store.ts'

const newSlot = (): string => `${Date.now().toString(36)}${Math.random().toString(36).slice(2, 8)}`

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
    takeUp,
    throwAway,
  }
}
