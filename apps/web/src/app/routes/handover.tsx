import { useQuery } from '@tanstack/react-query'
import { Link, type LoaderFunctionArgs } from 'react-router-dom'
import { Frame } from '#components/layouts/frame.tsx'
import { Sheet } from '#components/layouts/sheet.tsx'
import { NumberAndTitle, TitleStrip } from '#components/layouts/title-strip.tsx'
import { paths } from '#config/paths.ts'
import { handoverQuery } from '#features/handover/api/handover.ts'
import { HandoverFiles } from '#features/handover/components/handover-files.tsx'
import { UnitsSwitch } from '#features/results/components/units-switch.tsx'
import { useSession } from '#features/session/api/session.ts'
import { Loaded } from '#components/loaded.tsx'
import { queryClient } from '#lib/query-client.ts'
import { requireParam, useProjectNumber } from '#lib/route-params.ts'
import { useAddress, useUnits } from '#lib/search-params.ts'

export const loader = ({ params, request }: LoaderFunctionArgs) =>
  queryClient.ensureQueryData(
    handoverQuery(requireParam(params, 'project'), new URL(request.url).searchParams.get('rev')),
  )

export function Component() {
  const number = useProjectNumber()
  const { user } = useSession()
  const { get } = useAddress()
  const query = useQuery(handoverQuery(number, get('rev')))
  const { units, setUnits } = useUnits(query.data?.project.units)
  const handover = query.data
  return (
    <Frame
      strip={
        <TitleStrip
          fields={[
            { caption: 'Prepared for', value: handover?.project.client || '—', room: 'wide' },
            {
              caption: 'Title',
              value: <NumberAndTitle number={number} title={handover?.project.title ?? ''} />,
              room: 'always',
              grows: true,
            },
            {
              caption: 'Status',
              value: handover?.current ? 'Issued for construction' : 'Not for construction',
              room: 'always',
            },
            {
              caption: 'Revision',
              value: handover?.current ? handover.current.revision || 'First issue' : '—',
              room: 'always',
            },
            { caption: 'Prepared by', value: handover?.project.office ?? '—', room: 'wide' },
          ]}
        />
      }
    >
      <Sheet
        title={handover ? handover.project.title : 'Handover'}
        tab={`${number} Handover`}
        actions={
          <>
            <UnitsSwitch units={units} onChoose={setUnits} />
            <Link to={paths.projects()}>Projects</Link>
            <Link to={paths.you()}>{user.name}</Link>
          </>
        }
      >
        <Loaded query={query} what="Loading the handover">
          {(data) => <HandoverFiles handover={data} units={units} />}
        </Loaded>
      </Sheet>
    </Frame>
  )
}
