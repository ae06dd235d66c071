import { startTransition, useEffect, useState } from 'react'

/** Shorter than the time between two keys of a quick typist would let each key wait for a reading of the text. */
const PAUSE = 60

/** The text as it was when typing last paused: what takes time is made of it, and typing never waits for that. */
export const useSettled = (text: string): string => {
  const [settled, setSettled] = useState(text)
  useEffect(() => {
    const timer = setTimeout(() => startTransition(() => setSettled(text)), PAUSE)
    return () => clearTimeout(timer)
  }, [text])
  return settled
}
