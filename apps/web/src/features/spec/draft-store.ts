import { SpecConflict } from '@coldfill/contract'

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
  /** What it is, where it is more than a text that was being typed. */
  readonly part?: 'merged' | 'before merging' | 'saved over'
  /** Version on which both sides of a merged text were begun. */
  readonly mergedFrom?: number
}

export interface DraftOwner {
  readonly user: string
  readonly project: string
}

type Shelf = Pick<Storage, 'getItem' | 'setItem' | 'removeItem' | 'key' | 'length'>

const keyOf = (what: 'draft' | 'version', owner: DraftOwner, name: string | number) =>
  `coldfill.${what}.${encodeURIComponent(owner.user)}.${encodeURIComponent(owner.project)}.${name}`

const PARTS: readonly unknown[] = [undefined, 'merged', 'before merging', 'saved over']

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
  typeof value.at === 'string' &&
  (!('part' in value) || PARTS.includes(value.part)) &&
  (!('mergedFrom' in value) || typeof value.mergedFrom === 'number')

const parsed = (raw: string | null): unknown => {
  if (raw === null) return null
  try {
    return JSON.parse(raw)
  } catch {
    return null
  }
}

const keysUnder = (shelf: Shelf, prefix: string): string[] =>
  Array.from({ length: shelf.length }, (_, at) => shelf.key(at)).filter(
    (key): key is string => key !== null && key.startsWith(prefix),
  )

/** Says whether the draft was kept; a full or forbidden store says no, and the editor then warns. */
export const keepDraft = (shelf: Shelf, owner: DraftOwner, draft: Draft): boolean => {
  try {
    shelf.setItem(keyOf('draft', owner, draft.slot), JSON.stringify(draft))
    return true
  } catch {
    return false
  }
}

/** Every draft of this person in this project, newest first. */
export const draftsOf = (shelf: Shelf, owner: DraftOwner): readonly Draft[] => {
  try {
    return keysUnder(shelf, keyOf('draft', owner, ''))
      .map((key) => parsed(shelf.getItem(key)))
      .filter(isDraft)
      .toSorted((a, b) => b.at.localeCompare(a.at))
  } catch {
    return []
  }
}

/** Saved versions on which no draft leans any more are let go. */
const tidyVersions = (shelf: Shelf, owner: DraftOwner): void => {
  const prefix = keyOf('version', owner, '')
  const leaning = new Set(
    draftsOf(shelf, owner).flatMap(({ baseVersion, mergedFrom }) => [
      `${prefix}${baseVersion}`,
      `${prefix}${mergedFrom}`,
    ]),
  )
  for (const key of keysUnder(shelf, prefix)) if (!leaning.has(key)) shelf.removeItem(key)
}

export const dropDraft = (shelf: Shelf, owner: DraftOwner, slot: string): void => {
  try {
    shelf.removeItem(keyOf('draft', owner, slot))
    tidyVersions(shelf, owner)
  } catch {
    // Nothing is kept where the browser forbids it, so there is nothing to drop.
  }
}

/**
 * Keeps a saved version on which a draft was begun: the server has only the newest, and without the common beginning two texts
 * cannot be merged by path after a reload.
 */
export const keepVersion = (shelf: Shelf, owner: DraftOwner, version: SpecConflict): void => {
  try {
    const { text, savedAt, savedBy } = version
    const kept: SpecConflict = { text, version: version.version, savedAt, savedBy }
    shelf.setItem(keyOf('version', owner, version.version), JSON.stringify(kept))
  } catch {
    // The draft itself matters more; without its beginning it can still be compared.
  }
}

/** A saved version that a draft leans on. Null where it is not kept. */
export const keptVersion = (shelf: Shelf, owner: DraftOwner, version: number): SpecConflict | null => {
  try {
    const read = SpecConflict.safeParse(parsed(shelf.getItem(keyOf('version', owner, version))))
    return read.success ? read.data : null
  } catch {
    return null
  }
}
