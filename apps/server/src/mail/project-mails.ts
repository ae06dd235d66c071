import { OUTCOME_LABELS, type Outcome, revisionSegment, revisionTitle } from '@coldfill/contract'
import type { MailContent } from './compose-mail.ts'

interface About {
  readonly number: string
  readonly title: string
  readonly label: string
}

const head = ({ number, label }: About): string => `${number} ${revisionTitle(label)}`
const at = ({ number, label }: About, sheet: string): string => `/p/${number}/${sheet}?rev=${revisionSegment(label)}`

export const reviewAsked = (about: About, by: string, note: string): MailContent => ({
  event: 'review asked',
  subject: `${head(about)} – your review is asked for`,
  action: `Please review ${revisionTitle(about.label)} of ${about.title} and set a disposition.`,
  lines: [`${by} issued it for review.`, ...(note === '' ? [] : [`Note: ${note}`])],
  link: { title: 'Open the schedule', path: at(about, 'schedule') },
})

export const reviewSent = (
  about: About,
  review: { by: string; outcome: Outcome; reason: string; redlines: number },
): MailContent => {
  const label = OUTCOME_LABELS[review.outcome]
  const count = review.redlines === 1 ? '1 redline came' : `${review.redlines} redlines came`
  return {
    event: 'disposition set',
    subject: `${head(about)} – ${label}`,
    action:
      review.outcome === 'revise' || review.outcome === 'rejected'
        ? `Answer the redlines, mend the spec and issue ${about.title} again.`
        : `${revisionTitle(about.label)} of ${about.title} has a disposition: see what comes next.`,
    lines: [
      `${review.by} set "${label}".`,
      ...(review.reason === '' ? [] : [`Reason: ${review.reason}`]),
      ...(review.redlines === 0 ? [] : [`${count} with it.`]),
    ],
    link: { title: 'Open the redlines', path: at(about, 'redlines') },
  }
}

export const issuedForConstruction = (
  about: About,
  issue: { by: string; override: string | null },
  reader: 'contractor' | 'other',
): MailContent => ({
  event: 'issued for construction',
  subject: `${head(about)} – issued for construction`,
  action:
    reader === 'contractor'
      ? `Download ${revisionTitle(about.label)} of ${about.title} and work by it alone.`
      : `${revisionTitle(about.label)} of ${about.title} is issued for construction.`,
  lines: [
    `${issue.by} issued it. Earlier issues are superseded.`,
    ...(issue.override === null ? [] : [`Gates were overridden. Reason: ${issue.override}`]),
  ],
  link: { title: 'Open the handover', path: `/d/${about.number}` },
})

export const withdrawn = (
  about: About,
  withdrawal: { by: string; reason: string },
  reader: 'contractor' | 'other',
): MailContent => ({
  event: 'withdrawn',
  subject: `${head(about)} – withdrawn`,
  action: `Do not use ${revisionTitle(about.label)} of ${about.title} any more.`,
  lines: [`${withdrawal.by} withdrew it.`, `Reason: ${withdrawal.reason}`],
  link:
    reader === 'contractor'
      ? { title: 'Open the handover', path: `/d/${about.number}` }
      : { title: 'Open the issue sheet', path: at(about, 'issue') },
})

export const redlineReply = (
  about: About,
  reply: { by: string; redline: number; text: string; did: 'wrote' | 'closed' | 'reopened' },
): MailContent => {
  const happened = { wrote: 'answered', closed: 'closed', reopened: 'reopened' }[reply.did]
  return {
    event: 'redline reply',
    subject: `${about.number} – redline ${reply.redline} ${happened}`,
    action:
      reply.did === 'closed'
        ? `Redline ${reply.redline} on ${about.title} is closed.`
        : `Redline ${reply.redline} on ${about.title} waits on you.`,
    lines: [`${reply.by} ${happened}.`, ...(reply.text === '' ? [] : [reply.text])],
    link: { title: `Open redline ${reply.redline}`, path: `/p/${about.number}/redlines?thread=${reply.redline}` },
  }
}
