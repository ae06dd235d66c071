/** A row of a side-by-side comparison; a side that has no line there is null. Line numbers count from 1. */
export interface DiffRow {
  readonly kind: 'same' | 'changed' | 'removed' | 'added'
  readonly left: { readonly line: number; readonly text: string } | null
  readonly right: { readonly line: number; readonly text: string } | null
}

// Beyond this the middle is shown as removed and added whole; the table would need more memory than the answer is worth.
const MOST_CELLS = 4_000_000

/** Lengths of the longest common tails, row by row. */
const tails = (a: readonly string[], b: readonly string[]): Uint32Array[] => {
  const table = Array.from({ length: a.length + 1 }, () => new Uint32Array(b.length + 1))
  for (let i = a.length - 1; i >= 0; i -= 1) {
    const row = table[i]
    const below = table[i + 1]
    if (!row || !below) continue
    for (let j = b.length - 1; j >= 0; j -= 1) {
      row[j] = a[i] === b[j] ? (below[j + 1] ?? 0) + 1 : Math.max(below[j] ?? 0, row[j + 1] ?? 0)
    }
  }
  return table
}

type Step = { readonly take: 'both' | 'left' | 'right' }

const middleSteps = (a: readonly string[], b: readonly string[]): Step[] => {
  if (a.length * b.length > MOST_CELLS)
    return [...a.map((): Step => ({ take: 'left' })), ...b.map((): Step => ({ take: 'right' }))]
  const table = tails(a, b)
  const steps: Step[] = []
  let i = 0
  let j = 0
  while (i < a.length || j < b.length) {
    if (i < a.length && j < b.length && a[i] === b[j]) {
      steps.push({ take: 'both' })
      i += 1
      j += 1
    } else if (j >= b.length || (i < a.length && (table[i + 1]?.[j] ?? 0) >= (table[i]?.[j + 1] ?? 0))) {
      steps.push({ take: 'left' })
      i += 1
    } else {
      steps.push({ take: 'right' })
      j += 1
    }
  }
  return steps
}

/** Compares two texts by lines. A run of removed lines stands beside the run of added lines that replaced it. */
export const diffLines = (left: string, right: string): readonly DiffRow[] => {
  const a = left.split('\n')
  const b = right.split('\n')
  let head = 0
  while (head < a.length && head < b.length && a[head] === b[head]) head += 1
  let tail = 0
  while (tail < a.length - head && tail < b.length - head && a[a.length - 1 - tail] === b[b.length - 1 - tail])
    tail += 1
  const steps: Step[] = [
    ...Array.from({ length: head }, (): Step => ({ take: 'both' })),
    ...middleSteps(a.slice(head, a.length - tail), b.slice(head, b.length - tail)),
    ...Array.from({ length: tail }, (): Step => ({ take: 'both' })),
  ]

  const rows: DiffRow[] = []
  let i = 0
  let j = 0
  let removed: DiffRow['left'][] = []
  let added: DiffRow['right'][] = []
  const flush = () => {
    for (let at = 0; at < Math.max(removed.length, added.length); at += 1) {
      const was = removed[at] ?? null
      const now = added[at] ?? null
      rows.push({ kind: was && now ? 'changed' : was ? 'removed' : 'added', left: was, right: now })
    }
    removed = []
    added = []
  }
  for (const { take } of steps) {
    if (take === 'left') removed.push({ line: i + 1, text: a[i] ?? '' })
    else if (take === 'right') added.push({ line: j + 1, text: b[j] ?? '' })
    else {
      flush()
      rows.push({ kind: 'same', left: { line: i + 1, text: a[i] ?? '' }, right: { line: j + 1, text: b[j] ?? '' } })
    }
    if (take !== 'right') i += 1
    if (take !== 'left') j += 1
  }
  flush()
  return rows
}

/** Rows that differ with a few unchanged lines around each; `null` stands for a run that was left out. */
export const nearChanges = (rows: readonly DiffRow[], around = 2): readonly (DiffRow | null)[] => {
  const keep = new Set<number>()
  rows.forEach((row, at) => {
    if (row.kind === 'same') return
    for (let near = at - around; near <= at + around; near += 1) keep.add(near)
  })
  const shown: (DiffRow | null)[] = []
  rows.forEach((row, at) => {
    if (keep.has(at)) shown.push(row)
    else if (shown.at(-1) !== null) shown.push(null)
  })
  return shown
}
