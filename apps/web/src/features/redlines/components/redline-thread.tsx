import type { Redline } from '@coldfill/contract'
import { useState, type FormEvent } from 'react'
import { Link } from 'react-router-dom'
import { Failure } from '#components/failure.tsx'
import { Button } from '#components/ui/button.tsx'
import { CheckField, TextArea } from '#components/ui/field.tsx'
import { Flag, WasNow } from '#components/ui/review-marks.tsx'
import { clock } from '#lib/format.ts'
import { revisionPhrase } from '#lib/words.ts'
import { useAction } from '#lib/use-action.ts'
import { anchorLink, anchorStateWords, anchorWords } from '../anchor-words.ts'
import { closeRedline, editRedline, removeRedline, reopenRedline, replyTo } from '../api/redlines.ts'

const did = { wrote: '', closed: 'closed it', reopened: 'reopened it' }

const PendingForm = ({ project, redline }: { readonly project: string; readonly redline: Redline }) => {
  const { busy, error, run } = useAction()
  const written = redline.messages[0]?.text ?? ''
  const [text, setText] = useState(written)
  const [must, setMust] = useState(redline.mustAnswer)
  const changed = text !== written || must !== redline.mustAnswer
  return (
    <form
      className="flex flex-col gap-3"
      onSubmit={(event: FormEvent) => {
        event.preventDefault()
        void run(() => editRedline(project, redline.number, { text, mustAnswer: must }))
      }}
    >
      <Failure error={error} />
      <TextArea label="Redline, pending" value={text} onChange={(event) => setText(event.target.value)} rows={4} />
      <CheckField
        label="Must be answered before issue for construction"
        checked={must}
        onChange={(event) => setMust(event.target.checked)}
      />
      <div className="flex flex-wrap gap-2">
        <Button type="submit" busy={busy} why={changed ? null : 'Nothing has changed.'}>
          Keep the change
        </Button>
        <Button look="quiet" onClick={() => void run(() => removeRedline(project, redline.number))}>
          Delete
        </Button>
      </div>
    </form>
  )
}

const Answer = ({ project, redline }: { readonly project: string; readonly redline: Redline }) => {
  const { busy, error, run } = useAction()
  const [text, setText] = useState('')
  const send = async (work: () => Promise<unknown>) => {
    if (await run(work)) setText('')
  }
  if (redline.state === 'closed') {
    return (
      <>
        <Failure error={error} />
        <Button
          busy={busy}
          why={redline.may.reopen ? null : 'Only its author, a reviewer or a consultant of the project reopens it.'}
          onClick={() => void send(() => reopenRedline(project, redline.number, text))}
        >
          Reopen
        </Button>
      </>
    )
  }
  if (!redline.may.reply && !redline.may.close) return null
  return (
    <form
      className="flex flex-col gap-2"
      onSubmit={(event: FormEvent) => {
        event.preventDefault()
        void send(() => replyTo(project, redline.number, text))
      }}
      onKeyDown={(event) => {
        if (event.key === 'Enter' && (event.ctrlKey || event.metaKey)) event.currentTarget.requestSubmit()
      }}
    >
      <Failure error={error} />
      <TextArea
        label={`Reply to redline ${redline.number}`}
        value={text}
        onChange={(event) => setText(event.target.value)}
        rows={3}
      />
      <div className="flex flex-wrap gap-2">
        <Button
          type="submit"
          look="main"
          busy={busy}
          why={!redline.may.reply ? 'You may not reply here.' : text.trim() === '' ? 'Write a reply first.' : null}
        >
          Reply
        </Button>
        <Button
          busy={busy}
          why={redline.may.close ? null : 'It is closed by who opened it or by a reviewer.'}
          onClick={() => void send(() => closeRedline(project, redline.number, text))}
        >
          {text.trim() === '' ? 'Close' : 'Close with this comment'}
        </Button>
      </div>
    </form>
  )
}

interface Props {
  readonly project: string
  readonly redline: Redline
  readonly rev: string | null
  /** Left out where the place is beside it already. */
  readonly showPlace?: boolean
}

/** One redline with its answers. */
export const RedlineThread = ({ project, redline, rev, showPlace = true }: Props) => {
  const anchorState = anchorStateWords[redline.anchorState]
  return (
    <article aria-label={`Redline ${redline.number}`} className="flex flex-col gap-3">
      <header className="flex flex-col gap-1">
        <p className="flex flex-wrap items-center gap-2">
          <Flag number={redline.number} state={redline.state} />
          {showPlace ? (
            <Link to={anchorLink(project, redline.anchor, rev)} className="font-semibold">
              {anchorWords(redline.anchor)}
            </Link>
          ) : null}
          {redline.officeOnly ? (
            <span className="border border-rule px-1 text-cell font-medium">office only</span>
          ) : null}
          {redline.mustAnswer ? (
            <span className="border border-redline px-1 text-cell font-medium text-redline">must answer</span>
          ) : null}
        </p>
        <p className="figures text-cell text-pencil">
          <span title={anchorState.says}>{anchorState.word}</span>
          {redline.quoted ? (
            <>
              {' · '}
              {redline.anchorState === 'moved' && redline.nowValue !== null ? (
                <WasNow was={redline.quoted} now={redline.nowValue} />
              ) : (
                redline.quoted
              )}
            </>
          ) : null}
          {redline.carriedFrom === null ? null : ` · carried from ${revisionPhrase(redline.carriedFrom)}`}
          {redline.waitingOn ? ` · waiting on ${redline.waitingOnYou ? 'you' : `the ${redline.waitingOn}`}` : ''}
        </p>
        {redline.proposedValue === null ? null : (
          <p className="text-cell">
            Proposed value <strong className="figures font-mono font-semibold">{redline.proposedValue}</strong>
          </p>
        )}
      </header>
      {redline.state === 'pending' && redline.may.edit ? (
        <PendingForm key={`${redline.number} ${redline.messages[0]?.text ?? ''}`} project={project} redline={redline} />
      ) : (
        <ol className="flex flex-col gap-3">
          {redline.messages.map((message, at) => (
            <li
              key={`${message.at} ${at}`}
              className={`border-l-2 pl-3 ${at === 0 ? 'border-redline' : 'border-rule'}`}
            >
              <p className="text-cell text-pencil">
                <strong className="font-semibold text-ink">{message.author.name}</strong> {did[message.did]}{' '}
                {clock(message.at)}
              </p>
              {message.text ? (
                <p className={`whitespace-pre-wrap ${at === 0 ? 'text-redline' : ''}`}>{message.text}</p>
              ) : null}
            </li>
          ))}
        </ol>
      )}
      {redline.state === 'pending' ? null : <Answer project={project} redline={redline} />}
    </article>
  )
}
