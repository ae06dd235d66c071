/** Longest spec that is read, in characters. Longer text is refused before it is looked at. */
export const maxSpecBytes = 1_000_000

/** Deepest nesting of maps and lists. A spec as the reference describes it has eight levels. */
export const maxDepth = 64

/** Most keys and values together. */
export const maxNodes = 20_000
