import type { OfficeTitleBlock, Paper } from '@coldfill/contract'
import { useState, type FormEvent } from 'react'
import { Failure } from '#components/failure.tsx'
import { Button } from '#components/ui/button.tsx'
import { Choice } from '#components/ui/choice.tsx'
import { TextArea, TextField } from '#components/ui/field.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { useAction } from '#lib/use-action.ts'
import { saveTitleBlock } from '../api/title-block.ts'

interface Typed {
  readonly name: string
  readonly lines: string
  readonly prepared: string
  readonly checked: string
  readonly approved: string
  readonly paper: Paper
}

const typedOf = ({ name, lines, captions, paper }: OfficeTitleBlock): Typed => ({
  name,
  lines: lines.join('\n'),
  ...captions,
  paper,
})

/** Texts and paper of the office's documents. */
export const TitleBlockForm = ({ block }: { readonly block: OfficeTitleBlock }) => {
  const [typed, setTyped] = useState(() => typedOf(block))
  const { busy, error, run } = useAction()
  const kept = typedOf(block)
  const same = (Object.keys(kept) as (keyof Typed)[]).every((key) => kept[key] === typed[key])
  const set = (change: Partial<Typed>) => setTyped((before) => ({ ...before, ...change }))

  const onSubmit = async (event: FormEvent) => {
    event.preventDefault()
    const { name, lines, prepared, checked, approved, paper } = typed
    await run(() =>
      saveTitleBlock({
        name,
        lines: lines
          .split('\n')
          .map((line) => line.trim())
          .filter((line) => line !== ''),
        captions: { prepared, checked, approved },
        paper,
      }),
    )
  }
  return (
    <section>
      <SectionHeading>Texts and paper</SectionHeading>
      <form onSubmit={(event) => void onSubmit(event)} className="flex flex-col gap-4 border-t-2 border-ink pt-3">
        <div className="grid gap-4 desk:grid-cols-2">
          <TextField
            label="Name of the office, as printed"
            value={typed.name}
            onChange={(event) => set({ name: event.target.value })}
            maxLength={120}
            required
          />
          <TextArea
            label="Address and contact"
            hint="Up to four lines."
            value={typed.lines}
            onChange={(event) => set({ lines: event.target.value })}
            rows={3}
          />
        </div>
        <fieldset>
          <legend className="mb-1 text-cell font-semibold">Captions of the people</legend>
          <div className="grid gap-4 desk:grid-cols-3">
            <TextField
              label="Who issues it"
              value={typed.prepared}
              onChange={(event) => set({ prepared: event.target.value })}
              maxLength={40}
              required
            />
            <TextField
              label="Who reviewed it"
              value={typed.checked}
              onChange={(event) => set({ checked: event.target.value })}
              maxLength={40}
              required
            />
            <TextField
              label="Who issues it for construction"
              value={typed.approved}
              onChange={(event) => set({ approved: event.target.value })}
              maxLength={40}
              required
            />
          </div>
        </fieldset>
        <div className="flex flex-col gap-1">
          <span className="text-cell font-semibold">Paper</span>
          <div>
            <Choice
              label="Paper"
              value={typed.paper}
              choices={[
                { value: 'by units', label: 'By units' },
                { value: 'Letter', label: 'Letter' },
                { value: 'A4', label: 'A4' },
              ]}
              onChoose={(paper) => set({ paper })}
            />
          </div>
          <p className="text-cell text-pencil">By units: Letter where the document is in US units, A4 where in SI.</p>
        </div>
        <Failure error={error} />
        <div>
          <Button type="submit" look="main" busy={busy} why={same ? 'Nothing is changed.' : null} showWhy>
            Save
          </Button>
        </div>
      </form>
    </section>
  )
}
