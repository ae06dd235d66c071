import type { People, Role } from '@coldfill/contract'
import { useState, type FormEvent } from 'react'
import { Failure } from '#components/failure.tsx'
import { Button } from '#components/ui/button.tsx'
import { CheckField, SelectField } from '#components/ui/field.tsx'
import { capital } from '#lib/format.ts'
import { useAction } from '#lib/use-action.ts'
import { setMember } from '../api/office.ts'

type Listed = People['people'][number]
const roles: readonly Role[] = ['consultant', 'reviewer', 'contractor']

const membershipOf = (people: readonly Listed[], person: string, project: string) =>
  people.find((one) => one.id === person)?.projects.find((one) => one.number === project)

/** Puts a person on a project, changes what they do there, or takes them off it. */
export const MembershipForm = ({ people }: { readonly people: readonly Listed[] }) => {
  const projects = [...new Set(people.flatMap((person) => person.projects.map((project) => project.number)))].toSorted()
  const [person, setPerson] = useState(people[0]?.id ?? '')
  const [project, setProject] = useState(projects[0] ?? '')
  const known = membershipOf(people, person, project)
  if (projects.length === 0) return null
  return (
    <section aria-labelledby="membership" className="mt-8 max-w-3xl">
      <h2 id="membership" className="mb-2 text-lead font-semibold">
        Who does what on a project
      </h2>
      <div className="grid gap-4 border-t-2 border-ink pt-3 desk:grid-cols-2">
        <SelectField label="Person" value={person} onChange={(event) => setPerson(event.target.value)}>
          {people.map((one) => (
            <option key={one.id} value={one.id}>
              {one.name}
            </option>
          ))}
        </SelectField>
        <SelectField label="Project" value={project} onChange={(event) => setProject(event.target.value)}>
          {projects.map((number) => (
            <option key={number}>{number}</option>
          ))}
        </SelectField>
      </div>
      <Roles
        key={`${person} ${project} ${JSON.stringify(known ?? null)}`}
        person={person}
        project={project}
        had={known?.roles ?? []}
        wasRequired={known?.requiredReviewer ?? false}
      />
    </section>
  )
}

interface RolesProps {
  readonly person: string
  readonly project: string
  readonly had: readonly Role[]
  readonly wasRequired: boolean
}

const Roles = ({ person, project, had, wasRequired }: RolesProps) => {
  const { busy, error, run } = useAction()
  const [has, setHas] = useState<readonly Role[]>(had)
  const [required, setRequired] = useState(wasRequired)
  const reviews = has.includes('reviewer')
  const changed =
    roles.some((role) => has.includes(role) !== had.includes(role)) || (reviews && required !== wasRequired)
  const onSubmit = (event: FormEvent) => {
    event.preventDefault()
    void run(() => setMember(project, person, { roles: [...has], requiredReviewer: reviews && required }))
  }
  return (
    <form onSubmit={onSubmit} className="mt-3 flex flex-col gap-3">
      <Failure error={error} />
      <fieldset className="flex flex-wrap gap-x-6 gap-y-1">
        <legend className="mb-1 text-cell font-semibold">Roles on {project}</legend>
        {roles.map((role) => (
          <CheckField
            key={role}
            label={capital(role)}
            checked={has.includes(role)}
            onChange={(event) => setHas(event.target.checked ? [...has, role] : has.filter((one) => one !== role))}
          />
        ))}
        <CheckField
          label="Acceptance is required"
          disabled={!reviews}
          checked={reviews && required}
          onChange={(event) => setRequired(event.target.checked)}
        />
      </fieldset>
      <div>
        <Button type="submit" look="main" busy={busy} why={changed ? null : 'Nothing differs from what holds now.'}>
          {has.length === 0 && had.length > 0 ? 'Take off the project' : 'Set the roles'}
        </Button>
      </div>
    </form>
  )
}
