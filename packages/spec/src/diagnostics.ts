import { linkingCodes } from './diagnostics/linking-codes.ts'
import { readingCodes } from './diagnostics/reading-codes.ts'
import { syntaxCodes } from './diagnostics/syntax-codes.ts'

export type { Diagnostic, Layer } from './diagnostics/diagnostic.ts'

/** Every finding of the syntax and the spec layer. A code is never given to another mistake. */
export const findingCodes = { ...syntaxCodes, ...readingCodes, ...linkingCodes }

export type FindingCode = keyof typeof findingCodes

export const isFindingCode = (code: string): code is FindingCode => Object.hasOwn(findingCodes, code)
