import type { Mail } from '@coldfill/contract'
import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { Failure } from '#components/failure.tsx'
import { Loaded } from '#components/loaded.tsx'
import { Button } from '#components/ui/button.tsx'
import { clock } from '#lib/format.ts'
import { useAction } from '#lib/use-action.ts'
import { outboxQuery, resendMail } from '../api/office.ts'

const stateWords: Record<Mail['state'], string> = {
  queued: 'queued',
  sent: 'sent',
  kept: 'kept here, no mail server is set up',
  failed: 'failed',
}

const MailPreview = ({ mail }: { readonly mail: Mail }) => {
  const { busy, error, run } = useAction()
  return (
    <article aria-label={mail.subject} className="flex flex-col gap-3">
      <header className="border-b border-hair pb-2">
        <h2 className="font-semibold">{mail.subject}</h2>
        <p className="text-cell">
          To {mail.to.name} &lt;{mail.to.email}&gt;
        </p>
        <p className="figures text-cell text-pencil">
          {clock(mail.createdAt)} · {mail.event} · {stateWords[mail.state]}
          {mail.attempts > 1 ? `, ${mail.attempts} attempts` : ''}
        </p>
        {mail.problem ? <p className="text-cell text-fault">{mail.problem}</p> : null}
      </header>
      <Failure error={error} />
      <pre className="font-sans text-read break-words whitespace-pre-wrap">{mail.text}</pre>
      <div>
        <Button busy={busy} onClick={() => void run(() => resendMail(mail.id))}>
          Send again
        </Button>
      </div>
    </article>
  )
}

/** Every mail the program wrote, whether or not a mail server is set up. */
export const OutboxList = () => {
  const outbox = useQuery({ ...outboxQuery, refetchInterval: 5000 })
  const [chosen, setChosen] = useState<string | null>(null)
  return (
    <Loaded query={outbox} what="Loading the outbox">
      {(mails) => {
        const mail = mails.find((one) => one.id === chosen) ?? mails[0]
        if (!mail)
          return (
            <p className="border-t-[3px] border-ink pt-2 text-pencil">
              No mail yet. Mail is written when a review is asked, a disposition is set and a revision is issued for
              construction.
            </p>
          )
        return (
          <div className="grid gap-x-8 gap-y-6 bench:grid-cols-[minmax(0,24rem)_minmax(0,1fr)]">
            <ul aria-label="Mails" className="border-t-[3px] border-ink">
              {mails.map((one) => (
                <li key={one.id} className="border-b border-hair">
                  <button
                    type="button"
                    aria-current={one.id === mail.id ? 'true' : undefined}
                    onClick={() => setChosen(one.id)}
                    className={`block w-full px-2 py-2 text-left hover:bg-steel-wash ${one.id === mail.id ? 'bg-steel-wash' : ''}`}
                  >
                    <span className="flex justify-between gap-3 text-cell">
                      <span className="truncate">{one.to.name}</span>
                      <span className="figures whitespace-nowrap text-pencil">{clock(one.createdAt)}</span>
                    </span>
                    <span className="block truncate font-medium">{one.subject}</span>
                    <span className={`block text-cell ${one.state === 'failed' ? 'text-fault' : 'text-pencil'}`}>
                      {stateWords[one.state]}
                    </span>
                  </button>
                </li>
              ))}
            </ul>
            <div className="border-t-[3px] border-ink pt-2">
              <MailPreview key={mail.id} mail={mail} />
            </div>
          </div>
        )
      }}
    </Loaded>
  )
}
