import { AuditTrail, Mail, Outbox, People } from '@coldfill/contract'
import { queryOptions } from '@tanstack/react-query'
import { api } from '#lib/api-client.ts'
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
