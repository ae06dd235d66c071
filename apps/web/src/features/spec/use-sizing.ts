import type { ProjectResult } from '@coldfill/contract'
import { useEffect, useState } from 'react'
import { sizeText } from './api/spec.ts'

/** Longer than lies between two keys of somebody who types on, and no longer: results are wanted 400 ms after the last one. */
const DELAY = 180

/** Results with the text that they are of, and the ISO instant of the answer. */
export interface SizedText {
  readonly result: ProjectResult
  readonly text: string
  readonly at: string
}

export interface Sizing {
  /** The newest answer, whatever it says. */
  readonly latest: SizedText | null
  /** The newest answer that has vessels: shown greyed while the text is being sized again or cannot be read. */
  readonly good: SizedText | null
  readonly error: unknown
}

/** Sizes the text on the server a moment after typing stops. An answer to an older text is dropped. */
export const useSizing = (project: string, text: string, enabled: boolean): Sizing => {
  const [sizing, setSizing] = useState<Sizing>({ latest: null, good: null, error: null })
  useEffect(() => {
    if (!enabled) return undefined
    const stop = new AbortController()
    const run = async () => {
      try {
        const result = await sizeText(project, text, stop.signal)
        const answer = { result, text, at: new Date().toISOString() }
        setSizing((before) => ({ latest: answer, good: result.vessels.length > 0 ? answer : before.good, error: null }))
      } catch (error) {
        if (!stop.signal.aborted) setSizing((before) => ({ ...before, error }))
      }
    }
    const timer = setTimeout(() => void run(), DELAY)
    return () => {
      clearTimeout(timer)
      stop.abort()
    }
  }, [project, text, enabled])
  return sizing
}
