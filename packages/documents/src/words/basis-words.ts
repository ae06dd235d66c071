import { methods } from '@coldfill/engine'
import type { ProjectResult } from '@coldfill/sizing'
import { numbersOf, sentenceCase } from '@coldfill/presentation'

/** The basis of one vessel in whole sentences: what it is, by which method it is sized, and what that method takes for granted. */
export const basisWords = (vessel: ProjectResult['vessels'][number], result: ProjectResult): string[] => {
  const what = [vessel.construction, vessel.kind].filter(Boolean).join(' ')
  const many =
    vessel.quantity > 1 ? ` ${vessel.quantity} equal vessels share the duty; each is sized to its share.` : ''
  const numbers = numbersOf(vessel.assumptions, result)
  // A result that was frozen under an older engine may name a method that this one has changed or no longer has.
  const method = Object.hasOwn(methods, vessel.methodId) ? methods[vessel.methodId] : undefined
  const basis = method?.revision === vessel.methodRevision ? method.basis : undefined
  return [
    `${vessel.mark} is ${/^[aeiou]/i.test(what) ? 'an' : 'a'} ${what} that serves ${vessel.serves || vessel.system}, filled with ${vessel.fluid}.${many}`,
    ...(vessel.methodTitle
      ? [`Method: ${vessel.methodTitle} (${vessel.methodId}, revision ${vessel.methodRevision}).`]
      : []),
    ...(basis ? [sentenceCase(basis)] : []),
    ...(numbers ? [`It leans on ${vessel.assumptions.length === 1 ? 'assumption' : 'assumptions'} ${numbers}.`] : []),
  ]
}
