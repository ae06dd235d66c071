import type TestAgent from 'supertest/lib/agent.js'
import type { Revision, SpecDocument } from '@coldfill/contract'
import type { TestApp } from './test-app.ts'

/** A project with its people, each signed in in a browser of their own. */
export interface Team {
  readonly number: string
  /** `/api/projects/T-1` */
  readonly at: string
  readonly consultant: TestAgent
  readonly reviewer: TestAgent
  readonly contractor: TestAgent
  readonly administrator: TestAgent
  /** A person of another office. */
  readonly stranger: TestAgent
  readonly consultantId: string
  /** Saves a text over the newest version. */
  save(text: string): Promise<SpecDocument>
  /** Issues the working copy for review and waits for its files. */
  issue(): Promise<Revision>
  /** Reads a revision: '-' is the first issue. */
  revision(rev: string): Promise<Revision>
  /** Sets a disposition on the revision. */
  review(revision: Revision, outcome: string, reason?: string): Promise<void>
}

const segment = (label: string): string => (label === '' ? '-' : label)

export const createTeam = async (t: TestApp, number = 'T-1', text?: string): Promise<Team> => {
  const office = await t.office(`Office of ${number}`)
  const other = await t.office(`Other than ${number}`)
  const consultant = await t.user(office, { name: 'Runa Sedge', mayCreateProjects: true })
  const reviewer = await t.user(office, { name: 'Otto Vane' })
  const contractor = await t.user(office, { name: 'Mo Tiller' })
  const administrator = await t.user(office, { name: 'Ada Brook', administrator: true })
  const stranger = await t.user(other, { name: 'Nils Far', administrator: true })
  await t.project(office, {
    number,
    ...(text === undefined ? {} : { text }),
    members: [
      { user: consultant, roles: ['consultant'] },
      { user: reviewer, roles: ['reviewer'], required: true },
      { user: contractor, roles: ['contractor'] },
    ],
  })
  const at = `/api/projects/${number}`
  const signedIn = {
    consultant: await t.signIn(consultant.email),
    reviewer: await t.signIn(reviewer.email),
    contractor: await t.signIn(contractor.email),
    administrator: await t.signIn(administrator.email),
    stranger: await t.signIn(stranger.email),
  }
  const revision = async (rev: string): Promise<Revision> =>
    (await signedIn.consultant.get(`${at}/revisions/${rev}`).expect(200)).body as Revision
  return {
    number,
    at,
    ...signedIn,
    consultantId: consultant.id,
    revision,
    save: async (newText) => {
      const spec = (await signedIn.consultant.get(`${at}/spec`).expect(200)).body as SpecDocument
      const saved = await signedIn.consultant
        .put(`${at}/spec`)
        .send({ text: newText, baseVersion: spec.version })
        .expect(200)
      return saved.body as SpecDocument
    },
    issue: async () => {
      const issued = await signedIn.consultant.post(`${at}/revisions`).send({ purpose: 'review' }).expect(201)
      await t.settle()
      const made = await revision(segment((issued.body as Revision).label))
      if (made.files.length === 0) throw new Error(`The files were not made. ${t.errors.join('\n')}`)
      return made
    },
    review: async ({ label, contentHash }, outcome, reason = '') => {
      await signedIn.reviewer
        .post(`${at}/revisions/${segment(label)}/reviews`)
        .send({ outcome, reason, contentHash })
        .expect(201)
      await t.settle()
    },
  }
}
