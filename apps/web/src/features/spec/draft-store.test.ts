import { describe, expect, it } from 'vitest'
import { draftsOf, dropDraft, keepDraft, keepVersion, keptVersion } from './draft-store.ts'

const shelf = (): Storage => {
  const kept = new Map<string, string>()
  return {
    get length() {
      return kept.size
    },
    key: (at) => [...kept.keys()][at] ?? null,
    getItem: (key) => kept.get(key) ?? null,
    setItem: (key, value) => void kept.set(key, value),
    removeItem: (key) => void kept.delete(key),
    clear: () => kept.clear(),
  }
}
const owner = { user: 'u1', project: 'FC-241' }

describe('drafts of a spec', () => {
  it('keeps one draft for each open editor, newest first', () => {
    const store = shelf()
    keepDraft(store, owner, { slot: 'a', text: 'old', baseVersion: 4, at: '2026-11-01T10:00:00Z' })
    keepDraft(store, owner, { slot: 'b', text: 'new', baseVersion: 4, at: '2026-11-02T10:00:00Z' })
    keepDraft(store, owner, { slot: 'b', text: 'newer', baseVersion: 4, at: '2026-11-02T11:00:00Z' })
    expect(draftsOf(store, owner).map((draft) => draft.text)).toEqual(['newer', 'old'])
  })

  it('shows no draft of another person or another project', () => {
    const store = shelf()
    keepDraft(store, owner, { slot: 'a', text: 'mine', baseVersion: 1, at: '2026-11-01T10:00:00Z' })
    expect(draftsOf(store, { ...owner, user: 'u' })).toEqual([])
    expect(draftsOf(store, { ...owner, project: 'FC-24' })).toEqual([])
  })

  it('drops only the draft of the editor that saved', () => {
    const store = shelf()
    keepDraft(store, owner, { slot: 'a', text: 'one', baseVersion: 1, at: '2026-11-01T10:00:00Z' })
    keepDraft(store, owner, { slot: 'b', text: 'two', baseVersion: 2, at: '2026-11-01T10:00:00Z' })
    dropDraft(store, owner, 'a')
    expect(draftsOf(store, owner).map((draft) => draft.text)).toEqual(['two'])
  })

  it('passes over what another program left under its key', () => {
    const store = shelf()
    store.setItem('coldfill.draft.u1.FC-241.9', '{"text":1}')
    store.setItem('coldfill.draft.u1.FC-241.8', 'not json')
    expect(draftsOf(store, owner)).toEqual([])
  })

  it('says so where the browser keeps nothing', () => {
    const store = shelf()
    store.setItem = () => {
      throw new Error('quota')
    }
    expect(keepDraft(store, owner, { slot: 'a', text: 'x', baseVersion: 1, at: '' })).toBe(false)
  })

  it('keeps the version that a draft was begun on for as long as a draft leans on it', () => {
    const store = shelf()
    const version = (number: number) => ({
      text: `text ${number}`,
      version: number,
      savedAt: '2026-11-01T10:00:00Z',
      savedBy: { id: 'u2', name: 'Ines Halloway', initials: 'IH' },
    })
    const at = '2026-11-01T10:00:00Z'
    keepDraft(store, owner, { slot: 'a', text: 'mine', baseVersion: 4, at, part: 'before merging' })
    keepVersion(store, owner, version(4))
    keepDraft(store, owner, { slot: 'b', text: 'both', baseVersion: 5, at, part: 'merged', mergedFrom: 4 })
    keepVersion(store, owner, version(5))
    dropDraft(store, owner, 'a')
    // The merge still needs what both sides were begun on.
    expect(keptVersion(store, owner, 4)?.text).toBe('text 4')
    expect(keptVersion(store, owner, 5)).toEqual(version(5))
    dropDraft(store, owner, 'b')
    expect(keptVersion(store, owner, 4)).toBeNull()
    expect(store.length).toBe(0)
  })
})
