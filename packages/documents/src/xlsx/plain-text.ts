/** Longest text a cell can hold. */
const LONGEST = 32_767

/**
 * Text as a cell may hold it: no control characters but the line feed, no half surrogate pairs, and no `_x0041_` that a
 * spreadsheet would decode into another character.
 */
export const cellText = (text: string): string => (PLAIN.test(text) && text.length <= LONGEST ? text : cleaned(text))

/** Letters of which none needs anything done; most texts are made of them. */
const PLAIN = /^[ -^`-~\u00a0-\u02ff]*$/

const cleaned = (text: string): string =>
  text
    .replace(/\p{Surrogate}/gu, '\ufffd')
    .replace(/\r\n?/g, '\n')
    .replace(/\t/g, ' ')
    // oxlint-disable-next-line no-control-regex
    .replace(/[\u0000-\u0009\u000b-\u001f\u007f\ufffe\uffff]/g, '')
    .replace(/_(?=x[0-9A-Fa-f]{4}_)/g, '_x005F_')
    .slice(0, LONGEST)
