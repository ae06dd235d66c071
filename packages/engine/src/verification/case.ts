import type { Kind } from '@coldfill/units'
import type { ExampleOrigin } from '../method.ts'

interface CaseHead {
  readonly id: string
  /** Publication, edition and place. */
  readonly source: string
  readonly title: string
  /** `published`: read on a page. `derived`: evaluated from the published equation apart from this program. */
  readonly origin: ExampleOrigin
  /** Relative; from the digits that are printed, or from what the source rounds on the way, as `because` says. */
  readonly tolerance: number
  readonly because: string
  /** Why the printed figure is wrong. Such a case has to deviate by more than its tolerance. */
  readonly knownWrong?: string
}

/** One figure of a case, computed by a function of the engine in the SI unit of its kind. */
export interface Figure {
  readonly what: string
  readonly kind: Kind
  /** As printed, with its unit. */
  readonly expected: string
  readonly compute: () => number
}

/**
 * A published case of the verification manual: run through a method with what the source gives, or computed figure by
 * figure; or a printed mistake that has no figure to compute.
 */
export type VerificationCase = CaseHead &
  (
    | {
        readonly by: 'method'
        readonly method: string
        readonly given: Readonly<Record<string, string>>
        readonly expected: Readonly<Record<string, string>>
      }
    | { readonly by: 'figures'; readonly figures: readonly Figure[] }
    | { readonly by: 'words'; readonly knownWrong: string }
  )

export const byMethod = (
  head: CaseHead,
  method: string,
  given: Readonly<Record<string, string>>,
  expected: Readonly<Record<string, string>>,
): VerificationCase => ({ ...head, by: 'method', method, given, expected })

export const byFigures = (head: CaseHead, ...figures: readonly Figure[]): VerificationCase => ({
  ...head,
  by: 'figures',
  figures,
})

export const figure = (what: string, kind: Kind, expected: string, compute: () => number): Figure => ({
  what,
  kind,
  expected,
  compute,
})
