/** Where the text in the editor is kept. */
export const keptWords = (draft: {
  readonly readOnly: boolean
  readonly saving: boolean
  readonly dirty: boolean
  readonly kept: boolean
  readonly savedAt: string
  readonly version: number
}): string => {
  if (draft.readOnly) return ''
  if (draft.saving) return 'Saving…'
  if (!draft.dirty) return `Saved ${draft.savedAt}, version ${draft.version}`
  return draft.kept ? 'Not saved; kept on this device' : 'Not saved, and this browser keeps no draft'
}

/** What the results beside the text are worth just now. */
export const sizedWords = (sizing: {
  /** Of the newest results that have vessels. */
  readonly goodText: string | null
  readonly goodAt: string
  /** Text of the newest answer, whatever it said. */
  readonly latestText: string | null
  readonly text: string
  /** Why the server did not answer. */
  readonly failure: string | null
}): string => {
  const fallback = sizing.goodText === null ? '' : ` Results of ${sizing.goodAt}.`
  if (sizing.failure !== null) return `${sizing.failure}${fallback}`
  if (sizing.goodText === sizing.text) return 'Sized'
  if (sizing.latestText === sizing.text)
    return sizing.goodText === null ? 'Nothing to size' : `Cannot be sized; results of ${sizing.goodAt}`
  return 'Sizing…'
}
