import { messageOf } from '#lib/api-error.ts'
import { Band } from './ui/band.tsx'

/** The sentence of a write that failed; nothing where none did. */
export const Failure = ({ error }: { readonly error: unknown }) =>
  error === null || error === undefined ? null : (
    <Band tone="error" live="alert">
      {messageOf(error)}
    </Band>
  )
