import { z } from 'zod'
import { Person } from './people.ts'

const name = z.string().min(1).max(300)

/** Where a redline stands. `column` is the name of a result, as `precharge`; `path` a path of the spec. */
export const Anchor = z.discriminatedUnion('type', [
  z.strictObject({ type: z.literal('row'), mark: name }),
  z.strictObject({ type: z.literal('cell'), mark: name, column: name }),
  z.strictObject({ type: z.literal('assumption'), assumption: name }),
  z.strictObject({ type: z.literal('spec'), path: name }),
])
export type Anchor = z.infer<typeof Anchor>

/** `pinned`: same place, same value; `moved`: same place, new value; `adrift`: the place is gone. */
export const AnchorState = z.enum(['pinned', 'moved', 'adrift'])
export type AnchorState = z.infer<typeof AnchorState>

export const RedlineMessage = z.object({
  author: Person,
  at: z.string(),
  text: z.string(),
  /** `closed` and `reopened` mark the messages that changed the state. */
  did: z.enum(['wrote', 'closed', 'reopened']),
})
export type RedlineMessage = z.infer<typeof RedlineMessage>

export const Redline = z.object({
  /** Number in the project: permanent, as in /redlines/17. */
  number: z.number().int(),
  anchor: Anchor,
  anchorState: AnchorState,
  /** The value as the author saw it, with its unit. */
  quoted: z.string(),
  /** What stands there in the revision looked at, in the units of the project; null where adrift. */
  nowValue: z.string().nullable(),
  /** Label of the revision it was written on. */
  revision: z.string(),
  author: Person,
  createdAt: z.string(),
  /** A pending redline is seen by its author alone until the review is sent. */
  state: z.enum(['pending', 'open', 'closed']),
  mustAnswer: z.boolean(),
  /** Seen by the consultants and the administrator alone, and in no document. */
  officeOnly: z.boolean(),
  proposedValue: z.string().nullable(),
  waitingOn: z.enum(['consultant', 'reviewer']).nullable(),
  waitingOnYou: z.boolean(),
  /** The first message is the redline itself. */
  messages: z.array(RedlineMessage),
  closedBy: Person.nullable(),
  /** Label of the revision it was written on, where that is an earlier one than the revision looked at. */
  carriedFrom: z.string().nullable(),
  may: z.object({
    edit: z.boolean(),
    remove: z.boolean(),
    reply: z.boolean(),
    close: z.boolean(),
    reopen: z.boolean(),
  }),
})
export type Redline = z.infer<typeof Redline>

/** GET /api/projects/:project/redlines?rev= */
export const RedlineList = z.object({ redlines: z.array(Redline) })
export type RedlineList = z.infer<typeof RedlineList>

const text = z.string().trim().min(1, 'Write what is to be answered.').max(4000)

/** POST …/redlines. It stands on the newest revision. */
export const CreateRedlineRequest = z.strictObject({
  anchor: Anchor,
  quoted: z.string().max(500).default(''),
  text,
  mustAnswer: z.boolean().default(false),
  proposedValue: z.string().trim().max(200).nullable().default(null),
  /** Fixed from then on. It is open at once, for it is part of no review. */
  officeOnly: z.boolean().default(false),
})
export type CreateRedlineRequest = z.input<typeof CreateRedlineRequest>

/** PATCH …/redlines/:n */
export const EditRedlineRequest = z.strictObject({
  text: text.optional(),
  mustAnswer: z.boolean().optional(),
  proposedValue: z.string().trim().max(200).nullable().optional(),
})
export type EditRedlineRequest = z.input<typeof EditRedlineRequest>

/** POST …/redlines/:n/replies */
export const ReplyRequest = z.strictObject({ text })
export type ReplyRequest = z.input<typeof ReplyRequest>

/** POST …/redlines/:n/close and …/reopen */
export const CloseRedlineRequest = z.strictObject({ comment: z.string().trim().max(4000).default('') })
export type CloseRedlineRequest = z.input<typeof CloseRedlineRequest>
