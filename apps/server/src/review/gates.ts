import { type Gate, OUTCOME_LABELS, revisionTitle } from '@coldfill/contract'
import type { Finding } from '@coldfill/spec'
import type { ProjectResult } from '@coldfill/sizing'
import { newestRevision, revisionState, type StandingDisposition, standingDispositions } from './standing.ts'
import { type ProjectFacts, requiredReviewers, reviewersOf, type RevisionRow } from './project-facts.ts'

const many = (count: number, one: string, more: string): string => `${count} ${count === 1 ? one : more}`

const names = (people: readonly { readonly name: string }[]): string => people.map((person) => person.name).join(', ')

const gate = (id: string, title: string, state: Gate['state'], detail: string, link: string | null = null): Gate => ({
  id,
  title,
  state,
  detail,
  link,
})

const unacceptedErrors = (result: ProjectResult): Finding[] =>
  result.findings.filter((finding) => finding.severity === 'error' && finding.accepted === undefined)

/** Syntax and spec findings: the text does not yet say what the building has. */
const isOfTheText = (finding: Finding): boolean => !finding.code.startsWith('CF-E')

/** What must hold before the working copy is issued for review. None of it can be overridden. */
export const reviewGates = (
  facts: ProjectFacts,
  working: { readonly result: ProjectResult; readonly contentHash: string },
): Gate[] => {
  const at = `/p/${facts.project.number}`
  const errors = unacceptedErrors(working.result)
  const ofTheText = errors.filter(isOfTheText).length
  const engineering = errors.length - ofTheText
  const before = newestRevision(facts)
  const reviewers = reviewersOf(facts)
  const vessels = working.result.vessels.length
  const making = facts.makings.find((row) => row.problem === null)
  return [
    gate(
      'vessels',
      'The spec declares vessels',
      vessels > 0 ? 'pass' : 'hold',
      vessels > 0
        ? many(vessels, 'vessel.', 'vessels.')
        : 'There is nothing to review: no vessel is declared, or the spec cannot be read.',
      `${at}/spec`,
    ),
    gate(
      'spec-findings',
      'The spec has no error',
      ofTheText === 0 ? 'pass' : 'hold',
      ofTheText > 0
        ? `${many(ofTheText, 'error is', 'errors are')} in the text. Mend ${ofTheText === 1 ? 'it' : 'them'} first.`
        : engineering > 0
          ? `The text is right. ${many(engineering, 'engineering error goes', 'engineering errors go')} to review as part of the results.`
          : 'No error finding.',
      `${at}/spec`,
    ),
    gate(
      'reviewer',
      'Somebody can review it',
      reviewers.length > 0 ? 'pass' : 'hold',
      reviewers.length > 0
        ? `Goes to ${names(reviewers)}.`
        : 'The project has no reviewer. The administrator of the office names one.',
    ),
    gate(
      'changed',
      'Something is new',
      before && before.contentHash === working.contentHash ? 'hold' : 'pass',
      before && before.contentHash === working.contentHash
        ? `The working copy says the same as ${revisionTitle(before.label)}.`
        : before
          ? `It differs from ${revisionTitle(before.label)}.`
          : 'This is the first issue.',
      `${at}/spec`,
    ),
    gate(
      'making',
      'No files are being made',
      making ? 'hold' : 'pass',
      making ? 'Wait until the files of the last issue are made.' : 'Nothing is under way.',
      `${at}/issue`,
    ),
  ]
}

const dispositionGates = (facts: ProjectFacts, revision: RevisionRow): Gate[] => {
  const at = `/p/${facts.project.number}`
  const standing = standingDispositions(facts, revision)
  const of = (id: string): StandingDisposition | undefined => standing.find(({ row }) => row.reviewerId === id)
  const required = requiredReviewers(facts)
  const missing = required.filter((member) => !of(member.id))
  const stale = required.filter((member) => of(member.id)?.stale)
  const against = standing.filter(
    ({ row, stale: old }) => !old && (row.outcome === 'revise' || row.outcome === 'rejected'),
  )
  return [
    gate(
      'disposition-given',
      'Each required reviewer has set a disposition',
      required.length > 0 && missing.length === 0 ? 'pass' : 'overridable',
      required.length === 0
        ? 'The project has no reviewer.'
        : missing.length === 0
          ? names(required)
          : `Missing: ${names(missing)}.`,
      `${at}/redlines`,
    ),
    gate(
      'disposition-fresh',
      'No disposition is stale',
      stale.length === 0 ? 'pass' : 'overridable',
      stale.length === 0
        ? `Each belongs to the content of ${revisionTitle(revision.label)}.`
        : `Set on other content: ${names(stale)}.`,
      `${at}/redlines`,
    ),
    gate(
      'disposition-for',
      'No disposition stands against it',
      against.length === 0 ? 'pass' : 'overridable',
      against.length === 0
        ? 'None.'
        : against
            .map(
              ({ row }) => `${facts.people.get(row.reviewerId)?.name ?? 'A reviewer'}: ${OUTCOME_LABELS[row.outcome]}.`,
            )
            .join(' '),
      `${at}/redlines`,
    ),
  ]
}

/** What must hold before a revision is issued for construction. `frozen` is the content of the newest revision, where there is one. */
export const constructionGates = (facts: ProjectFacts, frozen: { readonly result: ProjectResult } | null): Gate[] => {
  const at = `/p/${facts.project.number}`
  const revision = newestRevision(facts)
  if (!revision || !frozen)
    return [
      gate('issued', 'A revision has been reviewed', 'hold', 'Issue the working copy for review first.', `${at}/issue`),
    ]
  const title = revisionTitle(revision.label)
  const made = facts.files.some((file) => file.revisionId === revision.id && file.set === 'review')
  const already = revisionState(facts, revision) === 'issued for construction'
  const errors = unacceptedErrors(frozen.result).length
  const mustAnswer = facts.openThreads.filter((thread) => thread.mustAnswer).length
  return [
    gate(
      'issued',
      'A revision waits to be issued',
      already ? 'hold' : 'pass',
      already ? `${title} is issued for construction already.` : `${title} would be issued.`,
      `${at}/issue`,
    ),
    gate(
      'files',
      'Its files are made',
      made ? 'pass' : 'hold',
      made ? 'Made and stored with their SHA-256.' : 'The files that went to review are not made yet.',
      `${at}/issue`,
    ),
    gate(
      'must-answer',
      'No redline marked "must answer" is open',
      mustAnswer === 0 ? 'pass' : 'overridable',
      mustAnswer === 0 ? 'None open.' : `${many(mustAnswer, 'redline is', 'redlines are')} open.`,
      `${at}/redlines`,
    ),
    ...dispositionGates(facts, revision),
    gate(
      'error-findings',
      'No error finding stands unaccepted',
      errors === 0 ? 'pass' : 'overridable',
      errors === 0 ? 'None.' : `${many(errors, 'error finding', 'error findings')} in ${title}.`,
      `${at}/spec?rev=${revision.label === '' ? '-' : revision.label}`,
    ),
  ]
}

export const holding = (gates: readonly Gate[]): Gate[] => gates.filter((one) => one.state === 'hold')
export const overridable = (gates: readonly Gate[]): Gate[] => gates.filter((one) => one.state === 'overridable')
