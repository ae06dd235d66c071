/** Hands out sheet names that every spreadsheet program takes: ASCII, at most 31 characters, each once whatever the case. */
export class SheetNames {
  readonly #taken = new Set<string>(['history'])

  /** A name as near to `wanted` as the rules allow. */
  take(wanted: string): string {
    const plain =
      wanted
        .normalize('NFKD')
        .replace(/[\u0300-\u036f]/g, '')
        .replace(/[^A-Za-z0-9 .()_-]+/g, '-')
        .replace(/^[\s.-]+|[\s.-]+$/g, '')
        .slice(0, 31)
        .trim() || 'Sheet'
    for (let n = 1; ; n += 1) {
      const end = n === 1 ? '' : ` (${n})`
      const name = plain.slice(0, 31 - end.length).trim() + end
      if (this.#taken.has(name.toLowerCase())) continue
      this.#taken.add(name.toLowerCase())
      return name
    }
  }
}

/** A defined name for a table: letters, digits and underscores, and never an address. */
export const tableName = (title: string): string =>
  `tbl${title
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9]+(.)?/g, (_, next: string | undefined) => (next ?? '').toUpperCase())
    .replace(/^./, (first) => first.toUpperCase())}`
