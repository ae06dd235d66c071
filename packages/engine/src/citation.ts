/** A publication as one edition. Ids are never reused; another edition is another source. */
export interface Source {
  readonly id: string
  readonly title: string
  readonly publisher: string
  readonly edition: string
  readonly year: number | null
}

/** A place in a source. `fromMemory` is printed with the words "from memory; verify against the adopted edition". */
export interface Citation {
  readonly source: string
  readonly locator: string
  readonly fromMemory?: true
}

export const cite = (source: Source, locator: string): Citation => ({ source: source.id, locator })

export const citeFromMemory = (source: Source, locator: string): Citation => ({
  source: source.id,
  locator,
  fromMemory: true,
})
