import type { Role } from '@coldfill/contract'

/** Password of every demo sign-in. */
export const DEMO_PASSWORD = 'coldfill-demo'

export interface DemoPerson {
  readonly email: string
  readonly name: string
  readonly initials: string
  readonly administrator?: true
  readonly mayCreateProjects?: true
  /** Roles in each project of the office. */
  readonly roles: readonly Role[]
}

export interface DemoProject {
  readonly number: string
  readonly title: string
  /** Folder of the example building that it begins with; a blank spec where null. */
  readonly example: string | null
}

export interface DemoOffice {
  readonly name: string
  readonly people: readonly DemoPerson[]
  /** Whether the office begins with the example catalogue of vessels. */
  readonly catalogue?: true
  readonly projects: readonly DemoProject[]
}

/** Invented people and firms. The second office is there to show that its project is nowhere to be seen from the first. */
export const DEMO_OFFICES: readonly DemoOffice[] = [
  {
    name: 'Tarn & Vale Engineers',
    catalogue: true,
    people: [
      {
        email: 'consultant@demo.example',
        name: 'Ines Halloway',
        initials: 'IH',
        mayCreateProjects: true,
        roles: ['consultant'],
      },
      { email: 'reviewer@demo.example', name: 'Oskar Brandtvik', initials: 'OB', roles: ['reviewer'] },
      { email: 'contractor@demo.example', name: 'Petra Quillfeather', initials: 'PQ', roles: ['contractor'] },
      { email: 'admin@demo.example', name: 'Jonah Merrowby', initials: 'JM', administrator: true, roles: [] },
    ],
    projects: [
      { number: 'FC-241', title: 'Fernhollow Community Clinic', example: 'fernhollow' },
      { number: 'AC-118', title: 'Alder Court', example: 'alder-court' },
    ],
  },
  {
    name: 'Osierholm Partners',
    people: [
      {
        email: 'stranger@other.example',
        name: 'Leif Dunmarrow',
        initials: 'LD',
        mayCreateProjects: true,
        roles: ['consultant'],
      },
    ],
    projects: [{ number: 'FL-007', title: 'Ferry Lane Library', example: null }],
  },
]
