import { Outlet } from 'react-router-dom'
import { Frame } from '#components/layouts/frame.tsx'
import { SheetList } from '#components/layouts/sheet-list.tsx'
import { TitleStrip } from '#components/layouts/title-strip.tsx'
import { paths } from '#config/paths.ts'
import { useSession } from '#features/session/api/session.ts'

/** Pages that belong to no project. */
export function Component() {
  const { user } = useSession()
  return (
    <Frame
      list={
        <SheetList
          label="Pages"
          heading={<span className="font-mono font-semibold">Coldfill</span>}
          sheets={[
            { name: 'Projects', to: paths.projects(), end: true },
            ...(user.administrator ? [{ name: 'Office', to: paths.office() }] : []),
            { name: 'Help', to: paths.help() },
            { name: 'You', to: paths.you() },
          ]}
          others={[]}
        />
      }
      strip={
        <TitleStrip
          fields={[
            { caption: 'Office', value: user.office.name, room: 'always', grows: true },
            { caption: 'Signed in', value: user.name, to: paths.you(), room: 'always' },
          ]}
        />
      }
    >
      <Outlet />
    </Frame>
  )
}
