import { useState } from 'react'

/** One write at a time with its failure, for forms and buttons. `run` says whether it worked. */
export const useAction = () => {
  const [busy, setBusy] = useState(false)
  const [error, setError] = useState<unknown>(null)
  const run = async (work: () => Promise<unknown>): Promise<boolean> => {
    setBusy(true)
    setError(null)
    try {
      await work()
      return true
    } catch (failure) {
      setError(failure)
      return false
    } finally {
      setBusy(false)
    }
  }
  return { busy, error, run, forget: () => setError(null) }
}
