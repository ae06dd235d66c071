/**
 * Text of a spec that was typed and not saved, kept on this device until it is saved or thrown away. A draft belongs to a person
 * and a project. It knows the version it was begun on, so that a newer one on the server never swallows it, and each open editor
 * has a slot of its own, so that two tabs never overwrite each other's.
 */
export interface Draft {
  readonly slot: string
  readonly text: string
  readonly baseVersion: number
  /** ISO instant of the last keystroke kept. */
  readonly at: string
}

export interface DraftOwner {
  readonly user: string
  readonly project: string
}

type Shelf = Pick<Storage, 'getItem' | 'setItem' | 'removeItem' | 'key' | 'length'>

const prefix = (owner: DraftOwner) =>
  `coldfill.draft.${encodeURIComponent(owner.user)}.${encodeURIComponent(owner.project)}.`

const isDraft = (value: unknown): value is Draft =>
  typeof value === 'object' &&
  value !== null &&
  'slot' in value &&
  typeof value.slot === 'string' &&
  'text' in value &&
  typeof value.text === 'string' &&
  'baseVersion' in value &&
  typeof value.baseVersion === 'number' &&
  'at' in value &&
  typeof value.at === 'string'

const readDraft = (raw: string | null): Draft | null => {
  if (raw === null) return null
  try {
    const value: unknown = JSON.parse(raw)
    return isDraft(value) ? value : null
  } catch {
    return null
  }
}

/** Says whether the draft was kept; a full or forbidden store says no, and the editor then warns. */
export const keepDraft = (shelf: Shelf, owner: DraftOwner, draft: Draft): boolean => {
  try {
    shelf.setItem(`${prefix(owner)}${draft.slot}`, JSON.stringify(draft))
    return true
  } catch {
    return false
  }
}

export const dropDraft = (shelf: Shelf, owner: DraftOwner, slot: string): void => {
  try {
    shelf.removeItem(`${prefix(owner)}${slot}`)
  } catch {
    // Nothing is kept where the browser forbids it, so there is nothing to drop.
  }
}

/** Every draft of this person in this project, newest first. */
export const draftsOf = (shelf: Shelf, owner: DraftOwner): readonly Draft[] => {
  try {
    const found: Draft[] = []
    for (let at = 0; at < shelf.length; at += 1) {
      const key = shelf.key(at)
      if (key === null || !key.startsWith(prefix(owner))) continue
      const draft = readDraft(shelf.getItem(key))
      if (draft) found.push(draft)
    }
    return found.toSorted((a, b) => b.at.localeCompare(a.at))
  } catch {
    return []
  }
}
