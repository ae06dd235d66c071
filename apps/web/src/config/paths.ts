/** Every address of the application, built in one place. A project is named by its number, as on its drawings. */
const project = (number: string) => `/p/${encodeURIComponent(number)}`

export const paths = {
  signIn: (to?: string) => (to && to !== '/' ? `/in?to=${encodeURIComponent(to)}` : '/in'),
  projects: () => '/',
  cover: project,
  spec: (number: string) => `${project(number)}/spec`,
  schedule: (number: string) => `${project(number)}/schedule`,
  trace: (number: string, mark: string) => `${project(number)}/trace/${encodeURIComponent(mark)}`,
  compare: (number: string) => `${project(number)}/compare`,
  basis: (number: string) => `${project(number)}/basis`,
  redlines: (number: string) => `${project(number)}/redlines`,
  issue: (number: string) => `${project(number)}/issue`,
  handover: (number: string) => `/d/${encodeURIComponent(number)}`,
  office: () => '/office',
  help: (anchor?: string) => (anchor ? `/help#${encodeURIComponent(anchor)}` : '/help'),
  verification: () => '/help/verification',
  you: () => '/you',
}

/** What changed between two contents; `now` left out is the working copy. Each is the part of an address that names a revision. */
export const comparePath = (number: string, was: string, now?: string): string =>
  withQuery(paths.compare(number), { a: was, b: now })

/** Adds query parameters to an address; empty ones are left out. */
export const withQuery = (
  path: string,
  query: Readonly<Record<string, string | number | null | undefined>>,
): string => {
  const search = new URLSearchParams()
  for (const [key, value] of Object.entries(query))
    if (value !== null && value !== undefined && value !== '') search.set(key, String(value))
  const text = search.toString()
  return text === '' ? path : `${path}?${text}`
}
