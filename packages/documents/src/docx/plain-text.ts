/** Text as a document part may hold it: no control characters, no half surrogate pairs; line ends become spaces. */
export const plainText = (text: string): string =>
  text
    .replace(/\p{Surrogate}/gu, '\ufffd')
    .replace(/\s*[\r\n]+\s*/g, ' ')
    .replace(/\t/g, ' ')
    // oxlint-disable-next-line no-control-regex
    .replace(/[\u0000-\u001f\u007f\ufffe\uffff]/g, '')
