import type { ProjectSummary } from '@coldfill/contract'
import { useState, type FormEvent } from 'react'
import { useSearchParams } from 'react-router-dom'
import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { SelectField, TextField } from '#components/ui/field.tsx'
import { fieldError, messageOf } from '#lib/api-error.ts'
import { formText } from '#lib/form-text.ts'
import { createProject } from '../api/projects.ts'

interface Props {
  readonly projects: readonly ProjectSummary[]
  readonly onMade: (number: string) => void
  readonly onCancel: () => void
}

/** A project begins with a spec: a blank one, an example building, or that of another project. */
export const NewProject = ({ projects, onMade, onCancel }: Props) => {
  const [search] = useSearchParams()
  const [busy, setBusy] = useState(false)
  const [error, setError] = useState<unknown>(null)
  const copyable = projects.filter((project) => project.roles.includes('consultant'))

  const submit = async (form: FormData) => {
    setBusy(true)
    setError(null)
    const start = formText(form, 'from')
    try {
      const project = await createProject({
        number: formText(form, 'number'),
        title: formText(form, 'title'),
        from: start === 'blank' || start === 'example' ? start : { copy: start.slice('copy:'.length) },
      })
      onMade(project.number)
    } catch (failure) {
      setError(failure)
      setBusy(false)
    }
  }
  const onSubmit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    void submit(new FormData(event.currentTarget))
  }
  const number = fieldError(error, '/number')
  const title = fieldError(error, '/title')

  return (
    <form aria-label="New project" onSubmit={onSubmit} className="mb-8 border-2 border-ink p-4">
      {error && !number && !title ? (
        <div className="mb-3">
          <Band tone="error" live="alert">
            {messageOf(error)}
          </Band>
        </div>
      ) : null}
      <div className="grid gap-4 desk:grid-cols-[10rem_minmax(0,1fr)_16rem]">
        <TextField
          label="Number"
          name="number"
          required
          maxLength={32}
          error={number}
          hint="As on drawings: FC-241"
          className="font-mono"
        />
        <TextField label="Title" name="title" required maxLength={120} error={title} />
        <SelectField
          label="Start from"
          name="from"
          defaultValue={search.get('new') === 'example' ? 'example' : 'blank'}
        >
          <option value="blank">A blank spec with remarks</option>
          <option value="example">An example building</option>
          {copyable.map((project) => (
            <option key={project.number} value={`copy:${project.number}`}>
              The spec of {project.number} {project.title}
            </option>
          ))}
        </SelectField>
      </div>
      <div className="mt-4 flex gap-3">
        <Button type="submit" look="main" busy={busy}>
          Make the project
        </Button>
        <Button onClick={onCancel}>Cancel</Button>
      </div>
    </form>
  )
}
