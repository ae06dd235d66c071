import { AuditTrail, Mail, MemberList, Outbox, People, type SetMemberRequest } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api, projectApi } from '#lib/api-client.ts'
import { queryClient } from '#lib/query-client.ts'

export const outboxQuery = queryOptions({
  queryKey: ['office', 'outbox'],
  queryFn: async ({ signal }) => (await api.get('/api/office/outbox', Outbox, { signal })).mails,
})
export const peopleQuery = queryOptions({
  queryKey: ['office', 'people'],
  queryFn: async ({ signal }) => (await api.get('/api/office/people', People, { signal })).people,
})
export const auditQuery = queryOptions({
  queryKey: ['office', 'audit'],
  queryFn: async ({ signal }) => (await api.get('/api/office/audit', AuditTrail, { signal })).events,
})

export const resendMail = async (id: string): Promise<void> => {
  await api.post(`/api/office/outbox/${encodeURIComponent(id)}/resend`, {}, Mail)
  await queryClient.invalidateQueries({ queryKey: outboxQuery.queryKey })
}

/** Says what a person does in a project; no role ends the membership. */
export const setMember = async (project: string, person: string, request: SetMemberRequest): Promise<void> => {
  await api.put(projectApi(project, `/members/${encodeURIComponent(person)}`), request, MemberList)
  await queryClient.invalidateQueries({ queryKey: ['office'] })
  await queryClient.invalidateQueries({ queryKey: ['projects'] })
}
