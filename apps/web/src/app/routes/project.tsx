import { useQuery } from '@tanstack/react-query'
import type { Sheet as SheetName } from '@coldfill/contract'
import { useEffect, useEffectEvent } from 'react'
import { Outlet, useLocation, useNavigate, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom'
import { Frame } from '#components/layouts/frame.tsx'
import { SheetList, type SheetLink } from '#components/layouts/sheet-list.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { projectQuery, useProject } from '#features/projects/api/projects.ts'
import { ProjectStrip } from '#features/projects/components/project-strip.tsx'
import { redlinesQuery } from '#features/redlines/api/redlines.ts'
import { PendingTray } from '#features/redlines/components/pending-tray.tsx'
import { useSession } from '#features/session/api/session.ts'
import { queryClient } from '#lib/query-client.ts'
import { requireParam, useProjectNumber } from '#lib/route-params.ts'

export const loader = ({ params }: LoaderFunctionArgs) =>
  queryClient.ensureQueryData(projectQuery(requireParam(params, 'project')))

type Drawn = Exclude<SheetName, 'handover'>
const sheets: readonly { readonly sheet: Drawn; readonly name: string }[] = [
  { sheet: 'cover', name: 'Cover' },
  { sheet: 'spec', name: 'Spec' },
  { sheet: 'schedule', name: 'Schedule' },
  { sheet: 'basis', name: 'Basis' },
  { sheet: 'redlines', name: 'Redlines' },
  { sheet: 'issue', name: 'Issue' },
]

export function Component() {
  const number = useProjectNumber()
  const project = useProject(number)
  const session = useSession()
  const { pathname } = useLocation()
  const navigate = useNavigate()
  const [search] = useSearchParams()
  const redlines = useQuery({
    ...redlinesQuery(number, search.get('rev')),
    enabled: project.sheets.includes('redlines'),
  })
  const kept = { units: search.get('units'), rev: search.get('rev') }

  const links: SheetLink[] = sheets.flatMap(({ sheet, name }, at) =>
    project.sheets.includes(sheet)
      ? [
          {
            number: at,
            name,
            to: withQuery(paths[sheet](number), kept),
            end: sheet === 'cover',
            badge:
              sheet === 'redlines' && project.openRedlines > 0 ? (
                <span className="keeps-colour bg-redline px-1 font-mono text-[10px] font-semibold text-sheet">
                  {project.openRedlines}
                  <span className="sr-only"> open</span>
                </span>
              ) : null,
          },
        ]
      : [],
  )
  if (project.sheets.includes('handover')) links.push({ name: 'Handover', to: paths.handover(number) })
  const others: SheetLink[] = [
    { name: 'Projects', to: paths.projects(), end: true },
    ...(session.user.administrator ? [{ name: 'Office', to: paths.office() }] : []),
    { name: 'Help', to: paths.help() },
    { name: session.user.name, to: paths.you() },
  ]
  const here = sheets.findLastIndex(
    ({ sheet }) =>
      pathname === paths[sheet](number) ||
      pathname.startsWith(`${paths[sheet](number)}/`) ||
      // A comparison belongs to the spec, and the trace of a vessel to its schedule.
      (sheet === 'spec' && pathname === paths.compare(number)) ||
      (sheet === 'schedule' && pathname.startsWith(paths.trace(number, ''))),
  )

  const onKey = useEffectEvent((event: KeyboardEvent) => {
    if (!event.altKey || event.ctrlKey || event.metaKey || event.shiftKey) return
    const link = /^Digit[1-9]$/.test(event.code) ? links[Number(event.code.slice(5)) - 1] : undefined
    if (!link) return
    event.preventDefault()
    void navigate(link.to)
  })
  useEffect(() => {
    const listen = (event: KeyboardEvent) => onKey(event)
    window.addEventListener('keydown', listen)
    return () => window.removeEventListener('keydown', listen)
  }, [])

  return (
    <Frame
      list={
        <SheetList
          label="Sheets"
          heading={<span className="font-mono font-semibold">{project.number}</span>}
          sheets={links}
          others={others}
        />
      }
      tray={<PendingTray project={number} redlines={redlines.data ?? []} />}
      strip={<ProjectStrip project={project} sheet={`${Math.max(here, 0)} of ${sheets.length - 1}`} />}
    >
      <Outlet />
    </Frame>
  )
}
