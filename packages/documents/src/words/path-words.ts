/** A path of the spec as a reader says it: `HWS / ET-1 / relief-margin`, `HWS / contents / line 2 / length`. */
export const pathWords = (path: string): string => {
  const parts = path.split('.')
  return parts
    .filter((part, index) => !((part === 'systems' && index === 0) || (part === 'vessels' && index === 2)))
    .map((part) => (/^\d+$/.test(part) ? `line ${Number(part) + 1}` : part))
    .join(' / ')
}
