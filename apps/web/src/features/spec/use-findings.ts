import { pathRange, readSpec, type SpecReading, type Vocabulary } from '@coldfill/spec'
import { startTransition, useEffect, useEffectEvent, useMemo, useState } from 'react'
import type { Finding } from '#lib/sized-project.ts'
import { mergeFindings } from './merge-findings.ts'
import type { SizedText } from './use-sizing.ts'

/** After this long without a key the text is read. Reading a thousand lines takes less time than lies between two keys. */
const PAUSE = 25

interface SettledText {
  readonly text: string
  /** Null until the names of the language are there. */
  readonly reading: SpecReading | null
  /** The sizing whose engineering findings are among these. */
  readonly sized: SizedText | null
  readonly findings: readonly Finding[]
}

const merged = (text: string, reading: SpecReading | null, sized: SizedText | null): readonly Finding[] =>
  mergeFindings(reading?.findings ?? [], sized, text, (path) => pathRange(text, path))

const settle = (text: string, vocabulary: Vocabulary | undefined, sized: SizedText | null): SettledText => {
  const reading = vocabulary ? readSpec(text, vocabulary) : null
  return { text, reading, sized, findings: merged(text, reading, sized) }
}

/**
 * The text as it was when typing last paused, with what the language and the last sizing find in it. `onRead` has the findings
 * at once; what else is made of the text comes as time allows, and typing never waits for it.
 */
export const useFindings = (
  text: string,
  vocabulary: Vocabulary | undefined,
  sized: SizedText | null,
  onRead: (findings: readonly Finding[]) => void,
) => {
  const [settled, setSettled] = useState(() => settle(text, vocabulary, sized))
  const read = useEffectEvent((now: string, names: Vocabulary | undefined) => {
    const next = settle(now, names, sized)
    onRead(next.findings)
    startTransition(() => setSettled(next))
  })
  useEffect(() => {
    const timer = setTimeout(() => read(text, vocabulary), PAUSE)
    return () => clearTimeout(timer)
  }, [text, vocabulary])
  const findings = useMemo(
    () => (settled.sized === sized ? settled.findings : merged(settled.text, settled.reading, sized)),
    [settled, sized],
  )
  return { settled: settled.text, reading: settled.reading, findings }
}
