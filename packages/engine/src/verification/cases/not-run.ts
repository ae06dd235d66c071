/** Published cases that have no figure to run, with where they are held: so that nothing is left out silently. */
export const casesNotRun: readonly { readonly id: string; readonly title: string; readonly reason: string }[] = [
  {
    id: 'P10',
    title: '119 gal heater at 80 psig incoming, limit 80 psig: no vessel',
    reason: 'There is no figure; the tests of sizing hold that it is infeasible.',
  },
  {
    id: 'P14',
    title: 'Limits of temperature and pressure relief valves',
    reason: 'A limit of the codes, held by the check CF-E056.',
  },
  {
    id: 'K06',
    title: 'Scope of the stamp of a water heater',
    reason: 'Yes or no, held by the check CF-E036.',
  },
]
