/** What turns one text into another: only what differs, so that cursor and history keep their places. */
export const textDifference = (was: string, now: string) => {
  let from = 0
  while (from < was.length && from < now.length && was[from] === now[from]) from += 1
  let tail = 0
  while (tail < was.length - from && tail < now.length - from && was.at(-1 - tail) === now.at(-1 - tail)) tail += 1
  return { from, to: was.length - tail, insert: now.slice(from, now.length - tail) }
}
