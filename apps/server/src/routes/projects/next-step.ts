import { type RevisionState, revisionTitle } from '@coldfill/contract'
import { type ProjectFacts, requiredReviewers } from '../../review/project-facts.ts'
import { newestRevision, revisionState, standingDispositions } from '../../review/standing.ts'

/** What brings the project on, in one sentence. `differs`: the working copy says something else than the newest revision. */
export const nextStep = (facts: ProjectFacts, differs: boolean | null): string => {
  const newest = newestRevision(facts)
  if (facts.makings.some((row) => row.problem !== null)) return 'Files could not be made: try again on the Issue sheet.'
  if (!newest)
    return facts.revisions.length === 0
      ? 'Describe the systems, then issue for review.'
      : 'Mend the spec and issue again.'
  const title = revisionTitle(newest.label)
  const mend = differs === true ? 'then issue again' : 'mend the spec, then issue again'
  const steps: Record<RevisionState, string> = {
    'in review': `Reviewers look at ${title} and set a disposition.`,
    revise: `Answer the redlines, ${mend}.`,
    rejected: `Answer the redlines, ${mend}.`,
    accepted: `Issue ${title} for construction.`,
    'issued for construction': `${title} is in force. A change of the spec becomes the next revision.`,
    superseded: 'Issue again.',
    withdrawn: 'Issue again.',
  }
  return steps[revisionState(facts, newest)]
}

/** Who is to do what now. */
export const waitingOn = (facts: ProjectFacts): { who: string; what: string }[] => {
  const waits: { who: string; what: string }[] = []
  const consultants = facts.members.filter(({ roles }) => roles.includes('consultant')).map(({ name }) => name)
  const consultant = consultants.length > 0 ? consultants.join(', ') : 'The consultant'
  const newest = newestRevision(facts)
  if (!newest) return [{ who: consultant, what: 'to issue for review' }]
  const title = revisionTitle(newest.label)
  const state = revisionState(facts, newest)
  const standing = standingDispositions(facts, newest)
  if (state === 'in review')
    for (const member of requiredReviewers(facts)) {
      const word = standing.find(({ row }) => row.reviewerId === member.id)
      if (!word) waits.push({ who: member.name, what: `to review ${title}` })
      else if (word.stale) waits.push({ who: member.name, what: `to look again: the disposition is stale` })
    }
  if (state === 'revise' || state === 'rejected')
    waits.push({ who: consultant, what: 'to mend the spec and issue again' })
  if (state === 'accepted') waits.push({ who: consultant, what: `to issue ${title} for construction` })
  const answers = facts.openThreads.filter((thread) => thread.waitingOn === 'consultant').length
  if (answers > 0)
    waits.push({ who: consultant, what: `to answer ${answers === 1 ? '1 redline' : `${answers} redlines`}` })
  const closings = new Map<string, number>()
  for (const thread of facts.openThreads)
    if (thread.waitingOn === 'reviewer') closings.set(thread.authorId, (closings.get(thread.authorId) ?? 0) + 1)
  for (const [author, count] of closings) {
    const who = facts.members.find(({ id }) => id === author)?.name ?? 'A reviewer'
    waits.push({ who, what: `to read the answer to ${count === 1 ? '1 redline' : `${count} redlines`}` })
  }
  return waits
}
