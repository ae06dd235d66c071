import { z } from 'zod'
import { Member, Role } from './people.ts'
import { Revision } from './revisions.ts'

export const Sheet = z.enum(['cover', 'spec', 'schedule', 'basis', 'redlines', 'issue', 'handover'])
export type Sheet = z.infer<typeof Sheet>

/** Where the project stands, in the words shown. A contractor sees the last three and `not issued` only. */
export const ProjectState = z.enum([
  'working copy',
  'in review',
  'accepted',
  'revise',
  'rejected',
  'not issued',
  'issued for construction',
  'withdrawn',
])
export type ProjectState = z.infer<typeof ProjectState>

export const ProjectSummary = z.object({
  /** Identifies the project in the office and in addresses. */
  number: z.string(),
  title: z.string(),
  client: z.string(),
  roles: z.array(Role),
  state: ProjectState,
  /** Label of the newest revision this person may see; null where none. */
  revision: z.string().nullable(),
  openRedlines: z.number().int(),
  waitingOnYou: z.boolean(),
  lastIssue: z
    .object({ revision: z.string(), purpose: z.enum(['review', 'construction']), date: z.string() })
    .nullable(),
  /** Sheets open to this person. */
  sheets: z.array(Sheet),
})
export type ProjectSummary = z.infer<typeof ProjectSummary>

/** GET /api/projects */
export const ProjectList = z.object({ projects: z.array(ProjectSummary) })
export type ProjectList = z.infer<typeof ProjectList>

/** `why` says, where not allowed, what stands in the way. */
export const Permission = z.object({ allowed: z.boolean(), why: z.string().optional() })
export type Permission = z.infer<typeof Permission>

export const Permissions = z.object({
  editSpec: Permission,
  seeWorkingCopy: Permission,
  redline: Permission,
  /** A thread that only the consultants and the administrator of the office see. */
  officeRedline: Permission,
  reply: Permission,
  dispose: Permission,
  issueForReview: Permission,
  issueForConstruction: Permission,
  withdraw: Permission,
  download: Permission,
})
export type Permissions = z.infer<typeof Permissions>

/** GET /api/projects/:project. Not open to one who is a contractor only: their page is the handover. */
export const Project = ProjectSummary.extend({
  office: z.object({ id: z.string(), name: z.string() }),
  parties: z.array(z.object({ part: z.string(), name: z.string() })),
  members: z.array(Member),
  permissions: Permissions,
  /** Newest first. */
  revisions: z.array(Revision),
  /** Label that the next issue will have. */
  nextRevision: z.string(),
  /** True where the working copy says something else than the newest revision; null for those who may not see it. */
  workingCopyDiffers: z.boolean().nullable(),
  nextStep: z.string(),
  waitingOn: z.array(z.object({ who: z.string(), what: z.string() })),
})
export type Project = z.infer<typeof Project>

export const ProjectNumber = z
  .string()
  .trim()
  .regex(
    /^[A-Za-z0-9][A-Za-z0-9._-]{0,31}$/,
    'Use letters, digits, dot, hyphen and underscore, at most 32, as in FC-241.',
  )

/** POST /api/projects. Answers Project. */
export const CreateProjectRequest = z.strictObject({
  number: ProjectNumber,
  title: z.string().trim().min(1, 'Give the project a title.').max(120),
  /** A commented starter spec, one of the example buildings, or the spec of another project (by number). */
  from: z.union([z.literal('blank'), z.literal('example'), z.strictObject({ copy: ProjectNumber })]),
  /** Folder name of the example building; `fernhollow` where not given. */
  example: z.string().max(60).optional(),
})
export type CreateProjectRequest = z.input<typeof CreateProjectRequest>

/** PUT /api/projects/:project/members/:user (administrator). Empty `roles` ends the membership. Answers { members }. */
export const SetMemberRequest = z.strictObject({
  roles: z.array(Role).max(3),
  requiredReviewer: z.boolean().default(false),
})
export type SetMemberRequest = z.input<typeof SetMemberRequest>

export const MemberList = z.object({ members: z.array(Member) })
export type MemberList = z.infer<typeof MemberList>
