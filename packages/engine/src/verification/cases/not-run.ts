/** Published figures that are not run, with the reason: so that nothing is left out silently. */
export const casesNotRun: readonly { readonly id: string; readonly title: string; readonly reason: string }[] = [
  {
    id: 'H27',
    title: 'Gravity systems by radiation (Michigan R 408.4272, table 272A)',
    reason: 'No gravity systems are sized.',
  },
  {
    id: 'O03',
    title: 'Linear fit of the expansion of a solar fluid (course notes)',
    reason: 'The fit is not used; it turns negative below 45 °C.',
  },
  {
    id: 'P10',
    title: '119 gal heater at 80 psig incoming, limit 80 psig: no vessel',
    reason: 'There is no figure; the tests of sizing hold that it is infeasible.',
  },
  { id: 'P11', title: 'Vessel of 5 % of the storage', reason: 'A band of plausibility, no method.' },
  {
    id: 'P14',
    title: 'Limits of temperature and pressure relief valves',
    reason: 'A limit of the codes, held by a check.',
  },
  { id: 'D25', title: '28 L a person and day at 60 °C (CTE DB-HE4)', reason: 'The method is not offered.' },
  {
    id: 'N08',
    title: 'Pressure vessel by CTE DB-HS4',
    reason: 'The formula is from memory and odd in its physics, so it is not offered.',
  },
  {
    id: 'N09',
    title: 'Pressure vessel by DIN 1988-5',
    reason: 'The standard is superseded, so the method is not offered.',
  },
  {
    id: 'S04',
    title: '15/1.16 L/kW of a small heating system (UNE practice)',
    reason: 'Another estimate, 12 L/kW, is offered.',
  },
  { id: 'V04', title: '14 L/kW of existing plant', reason: 'Another estimate, 12 L/kW, is offered.' },
  {
    id: 'V05',
    title: 'Range of the content of panel radiators',
    reason: 'A range; its upper end is the documented default.',
  },
  { id: 'K02', title: 'Weight of a vessel full of water', reason: 'Worked as the example of check.full-weight.' },
  { id: 'K05', title: 'Test pressures of a 125 psi vessel', reason: 'Not computed.' },
  { id: 'K06', title: 'Scope of the stamp of a water heater', reason: 'Held by a check of the spec.' },
]
