import type { Anchor, Permissions } from '@coldfill/contract'
import { useEffect, useRef, useState, type FormEvent } from 'react'
import { Failure } from '#components/failure.tsx'
import { Button } from '#components/ui/button.tsx'
import { CheckField, TextArea, TextField } from '#components/ui/field.tsx'
import { formText } from '#lib/form-text.ts'
import { useAction } from '#lib/use-action.ts'
import { anchorWords } from '../anchor-words.ts'
import { createRedline } from '../api/redlines.ts'

interface Props {
  readonly project: string
  readonly anchor: Anchor
  /** The value as it is seen, with its unit. */
  readonly quoted: string
  readonly permissions: Pick<Permissions, 'redline' | 'officeRedline'>
  readonly onDone: () => void
}

/** Writes a redline on a cell, a row or an assumption. It stays pending until the review is sent; one for the office is open at once. */
export const RedlineComposer = ({ project, anchor, quoted, permissions, onDone }: Props) => {
  const { busy, error, run } = useAction()
  const [text, setText] = useState('')
  const mayChoose = permissions.redline.allowed && permissions.officeRedline.allowed
  const [office, setOffice] = useState(!permissions.redline.allowed)
  const form = useRef<HTMLFormElement>(null)
  useEffect(() => form.current?.querySelector('textarea')?.focus(), [])

  const submit = async (data: FormData) => {
    const proposed = formText(data, 'proposed').trim()
    const done = await run(() =>
      createRedline(project, {
        anchor,
        quoted,
        text,
        mustAnswer: data.get('must') === 'on',
        officeOnly: office,
        proposedValue: proposed === '' ? null : proposed,
      }),
    )
    if (done) onDone()
  }
  const onSubmit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    void submit(new FormData(event.currentTarget))
  }

  return (
    <form
      ref={form}
      aria-label="New redline"
      onSubmit={onSubmit}
      onKeyDown={(event) => {
        if (event.key === 'Enter' && (event.ctrlKey || event.metaKey)) form.current?.requestSubmit()
        if (event.key === 'Escape') onDone()
      }}
      className="flex flex-col gap-3 border-l-[3px] border-redline pl-3"
    >
      <p className="text-cell">
        <span className="font-semibold">{anchorWords(anchor)}</span>
        {quoted ? <span className="figures ml-2 font-mono">{quoted}</span> : null}
      </p>
      <Failure error={error} />
      <TextArea
        label="Redline"
        name="text"
        required
        value={text}
        onChange={(event) => setText(event.target.value)}
        rows={4}
      />
      {anchor.type === 'row' ? null : (
        <TextField label="Proposed value" name="proposed" hint="With its unit, where you propose one" />
      )}
      {mayChoose ? (
        <CheckField label="Office only" checked={office} onChange={(event) => setOffice(event.target.checked)} />
      ) : null}
      {office ? (
        <p className="text-cell text-pencil">
          Office only: the consultants and the administrator read it, nobody else, and no document has it.
        </p>
      ) : (
        <CheckField label="Must be answered before issue for construction" name="must" />
      )}
      <div className="flex flex-wrap gap-2">
        <Button type="submit" look="main" busy={busy} why={text.trim() === '' ? 'Write what is to be answered.' : null}>
          {office ? 'Write for the office' : 'Add to pending'}
        </Button>
        <Button onClick={onDone}>Cancel</Button>
      </div>
    </form>
  )
}
