import { createBrowserRouter } from 'react-router-dom'
import { RouteError } from '#components/route-error.tsx'
import { GhostRows } from '#components/ui/waiting.tsx'

const Opening = () => (
  <div className="p-6">
    <GhostRows what="Opening Coldfill" />
  </div>
)

export const router = createBrowserRouter([
  { path: '/in', lazy: () => import('./routes/sign-in.tsx'), ErrorBoundary: RouteError, HydrateFallback: Opening },
  {
    lazy: () => import('./routes/signed-in.tsx'),
    ErrorBoundary: RouteError,
    HydrateFallback: Opening,
    children: [
      {
        path: '/p/:project',
        lazy: () => import('./routes/project.tsx'),
        children: [
          { index: true, lazy: () => import('./routes/cover.tsx') },
          { path: 'spec', lazy: () => import('./routes/spec.tsx') },
          { path: 'schedule', lazy: () => import('./routes/schedule.tsx') },
          { path: 'trace/:mark', lazy: () => import('./routes/trace.tsx') },
          { path: 'compare', lazy: () => import('./routes/compare.tsx') },
          { path: 'basis', lazy: () => import('./routes/basis.tsx') },
          { path: 'redlines', lazy: () => import('./routes/redlines.tsx') },
          { path: 'issue', lazy: () => import('./routes/issue.tsx') },
        ],
      },
      { path: '/d/:project', lazy: () => import('./routes/handover.tsx') },
      {
        lazy: () => import('./routes/outside.tsx'),
        children: [
          { path: '/', lazy: () => import('./routes/projects.tsx') },
          { path: '/office', lazy: () => import('./routes/office.tsx') },
          { path: '/help', lazy: () => import('./routes/help.tsx') },
          { path: '/help/verification', lazy: () => import('./routes/verification.tsx') },
          { path: '/you', lazy: () => import('./routes/you.tsx') },
        ],
      },
    ],
  },
])
