import { useQuery } from '@tanstack/react-query'
import { Loaded } from '#components/loaded.tsx'
import { Cell, HeadCell, RuledTable } from '#components/ui/ruled-table.tsx'
import { clock } from '#lib/format.ts'
import { auditQuery } from '../api/office.ts'

export const AuditTrailTable = () => {
  const audit = useQuery(auditQuery)
  return (
    <Loaded query={audit} what="Loading the audit trail">
      {(events) =>
        events.length === 0 ? (
          <p className="border-t-[3px] border-ink pt-2 text-pencil">Nothing has happened yet.</p>
        ) : (
          <RuledTable
            caption="Audit trail, newest first"
            className="min-w-160"
            head={
              <tr>
                <HeadCell>When</HeadCell>
                <HeadCell>Who</HeadCell>
                <HeadCell>What</HeadCell>
                <HeadCell>Project</HeadCell>
                <HeadCell>Detail</HeadCell>
              </tr>
            }
          >
            {events.map((event) => (
              <tr key={event.id}>
                <Cell className="figures whitespace-nowrap">{clock(event.at)}</Cell>
                <Cell className="whitespace-nowrap">{event.who}</Cell>
                <Cell>{event.action}</Cell>
                <Cell className="font-mono">{event.project ?? '—'}</Cell>
                <Cell className="max-w-[50ch] break-words">{event.detail}</Cell>
              </tr>
            ))}
          </RuledTable>
        )
      }
    </Loaded>
  )
}
