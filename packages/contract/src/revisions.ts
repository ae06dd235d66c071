import { z } from 'zod'
import { Person } from './people.ts'

export const RevisionState = z.enum([
  'in review',
  'accepted',
  'revise',
  'rejected',
  'issued for construction',
  'superseded',
  'withdrawn',
])
export type RevisionState = z.infer<typeof RevisionState>

export const Outcome = z.enum(['accepted', 'accepted_noted', 'revise', 'rejected', 'information'])
export type Outcome = z.infer<typeof Outcome>

/** Usual wording of the outcomes. */
export const OUTCOME_LABELS: Readonly<Record<Outcome, string>> = {
  accepted: 'Accepted',
  accepted_noted: 'Accepted as noted',
  revise: 'Revise and resubmit',
  rejected: 'Rejected',
  information: 'For information',
}

export const RevisionFile = z.object({
  name: z.string(),
  /** `pdf` is a print of the submittal. */
  kind: z.enum(['schedule', 'submittal', 'pdf']),
  /** Which making: the files as they went to review, or with the construction status on their pages. */
  set: z.enum(['review', 'construction']),
  size: z.number().int(),
  sha256: z.string(),
  /** Address of the bytes. */
  href: z.string(),
})
export type RevisionFile = z.infer<typeof RevisionFile>

/** What the documents of an issue are made with. */
export const FileContents = z.object({
  units: z.enum(['US', 'SI']),
  /** The submittal has an appendix of redlines with their answers. */
  redlines: z.boolean(),
  /** The submittal has the verification manual as an appendix. */
  verification: z.boolean(),
})
export type FileContents = z.infer<typeof FileContents>

/** A set of files as it was made. */
export const FileSet = z.object({
  set: z.enum(['review', 'construction']),
  contents: FileContents,
  /** Why the contents list of the submittal has no page numbers; null where it has them. */
  noPages: z.string().nullable(),
  /** Why there is no PDF; null where there is one. */
  noPdf: z.string().nullable(),
})
export type FileSet = z.infer<typeof FileSet>

export const Disposition = z.object({
  reviewer: Person,
  required: z.boolean(),
  outcome: Outcome,
  reason: z.string(),
  at: z.string(),
  /** Content the reviewer saw. */
  contentHash: z.string(),
  /** Label of the revision it was set on. */
  revision: z.string(),
  /** True where the content it was set on is not the content of this revision. */
  stale: z.boolean(),
})
export type Disposition = z.infer<typeof Disposition>

/** Files being made. `problem` says why they stopped; POST …/files then tries again. */
export const Making = z.object({
  set: z.enum(['review', 'construction']),
  stage: z.number().int(),
  of: z.number().int(),
  name: z.string(),
  problem: z.string().nullable(),
})
export type Making = z.infer<typeof Making>

export const Revision = z.object({
  id: z.string(),
  /** '' is the first issue, then A, B …; '-' stands for '' in addresses. */
  label: z.string(),
  state: RevisionState,
  purpose: z.enum(['review', 'construction']),
  issuedAt: z.string(),
  issuedBy: Person,
  note: z.string(),
  /** SHA-256 over spec text, results, engine version and the catalogue that vessels were chosen from. */
  contentHash: z.string(),
  engine: z.string(),
  files: z.array(RevisionFile),
  sets: z.array(FileSet),
  /** Not null while files are being made: ask again after a moment. A construction issue takes effect when it is done. */
  making: Making.nullable(),
  dispositions: z.array(Disposition),
  constructionIssue: z
    .object({ at: z.string(), by: Person, override: z.object({ reason: z.string() }).nullable() })
    .nullable(),
  withdrawal: z.object({ at: z.string(), by: Person, reason: z.string() }).nullable(),
})
export type Revision = z.infer<typeof Revision>

const note = z.string().trim().max(2000)
const reason = z.string().trim().min(1, 'Give a reason.').max(2000)

/** What is left out has the units of the spec, and no appendix. */
const ContentsChoice = FileContents.partial().strict()
export type ContentsChoice = z.infer<typeof ContentsChoice>

/** POST /api/projects/:project/revisions */
export const IssueForReviewRequest = z.strictObject({
  purpose: z.literal('review'),
  note: note.default(''),
  contents: ContentsChoice.default({}),
})
export type IssueForReviewRequest = z.input<typeof IssueForReviewRequest>

/** POST …/revisions/:rev/reviews */
export const ReviewRequest = z
  .strictObject({ outcome: Outcome, reason: note.default(''), contentHash: z.string().min(1) })
  .refine((review) => review.reason !== '' || (review.outcome !== 'revise' && review.outcome !== 'rejected'), {
    path: ['reason'],
    message: 'Give the reason: it goes into the mail and on the sheet.',
  })
export type ReviewRequest = z.input<typeof ReviewRequest>

/** POST …/revisions/:rev/construction */
export const IssueForConstructionRequest = z.strictObject({
  override: z.strictObject({ reason }).optional(),
  /** What is left out is as in the files for review. */
  contents: ContentsChoice.default({}),
})
export type IssueForConstructionRequest = z.input<typeof IssueForConstructionRequest>

/** POST …/revisions/:rev/withdraw */
export const WithdrawRequest = z.strictObject({ reason })
export type WithdrawRequest = z.input<typeof WithdrawRequest>

/** Address part of a revision label: '-' for the first issue. */
export const revisionSegment = (label: string): string => (label === '' ? '-' : label)
/** Label of an address part. */
export const revisionLabel = (segment: string): string => (segment === '-' ? '' : segment)
/** "First issue" or "Rev B". */
export const revisionTitle = (label: string): string => (label === '' ? 'First issue' : `Rev ${label}`)
