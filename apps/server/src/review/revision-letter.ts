/** Letters that cannot be mistaken for a figure or for each other on a print: I, O, Q, S, X and Z are left out. */
const LETTERS = 'ABCDEFGHJKLMNPRTUVWY'

/** Label of an issue by its place: '' for the first, then A, B … Y, AA, AB … */
export const revisionLetter = (sequence: number): string => {
  let letters = ''
  for (let rest = sequence; rest > 0; rest = Math.floor((rest - 1) / LETTERS.length))
    letters = `${LETTERS[(rest - 1) % LETTERS.length]}${letters}`
  return letters
}
