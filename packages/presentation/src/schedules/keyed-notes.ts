/** Notes of a schedule numbered by first appearance; the same text has the same number. */
export class KeyedNotes {
  readonly #numbers = new Map<string, number>()

  numberOf(text: string): number {
    const known = this.#numbers.get(text)
    if (known !== undefined) return known
    this.#numbers.set(text, this.#numbers.size + 1)
    return this.#numbers.size
  }

  list(): { number: number; text: string }[] {
    return [...this.#numbers].map(([text, number]) => ({ number, text }))
  }
}
