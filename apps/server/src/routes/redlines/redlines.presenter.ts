import type { Redline } from '@coldfill/contract'
import { is, type ProjectAccess } from '../../policies/project-access.ts'
import { type Content, anchorState, readAnchor, readCarriedAnchor } from '../../review/anchor-reading.ts'
import { type ProjectFacts, type RevisionRow, turnAfter } from '../../review/project-facts.ts'
import { redlinePermissions } from '../../policies/redlines.ts'
import type { MessageRow, RedlineRow } from './redlines.queries.ts'

const person = ({ id, name, initials }: { id: string; name: string; initials: string }) => ({ id, name, initials })

export const presentRedline = (
  access: ProjectAccess,
  facts: ProjectFacts,
  row: RedlineRow,
  messages: readonly MessageRow[],
  contents: { readonly viewed: RevisionRow; contentOf(revisionId: string): Content },
): Redline => {
  const written = facts.revisions.find((revision) => revision.id === row.revisionId)
  const now = readCarriedAnchor(row.anchor, contents.contentOf(contents.viewed.id))
  const then = readAnchor(row.anchor, contents.contentOf(row.revisionId))
  const last = messages.at(-1)
  // One for the office has no two sides.
  const turn = row.state === 'open' && !row.officeOnly && last ? turnAfter(facts.members, last.author.id) : null
  const author = messages[0]?.author ?? { id: row.authorId, name: 'A former member', initials: '–' }
  const closing = messages.findLast((message) => message.did === 'closed')
  return {
    number: row.number,
    anchor: row.anchor,
    anchorState: anchorState(then, now),
    quoted: row.quoted,
    nowValue: now?.shown ?? null,
    revision: written?.label ?? '',
    author: person(author),
    createdAt: row.createdAt.toISOString(),
    state: row.state,
    mustAnswer: row.mustAnswer,
    officeOnly: row.officeOnly,
    proposedValue: row.proposedValue,
    waitingOn: turn,
    waitingOnYou:
      (turn === 'consultant' && is(access, 'consultant')) ||
      (turn === 'reviewer' && row.authorId === access.principal.userId),
    messages: messages.map((message) => ({
      author: person(message.author),
      at: message.writtenAt.toISOString(),
      text: message.text,
      did: message.did,
    })),
    closedBy: row.state === 'closed' && closing ? person(closing.author) : null,
    carriedFrom: written && written.id !== contents.viewed.id ? written.label : null,
    may: redlinePermissions(access, row),
  }
}
