import { createHash } from 'node:crypto'

export const sha256 = (content: string | Uint8Array): string => createHash('sha256').update(content).digest('hex')

/**
 * What a disposition binds to: the spec text, the results and the engine that made them, and the hash of the catalogue's rows where
 * there is one, as one SHA-256 in hex.
 */
export const contentHash = (
  engine: string,
  specText: string,
  resultJson: string,
  catalogueHash: string | null,
): string => sha256(JSON.stringify([engine, specText, resultJson, ...(catalogueHash === null ? [] : [catalogueHash])]))
