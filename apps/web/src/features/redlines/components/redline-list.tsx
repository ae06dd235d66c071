import type { Redline } from '@coldfill/contract'
import { Flag } from '#components/ui/review-marks.tsx'
import { anchorStateWords, anchorWords } from '../anchor-words.ts'

interface Props {
  readonly redlines: readonly Redline[]
  readonly chosen: number | null
  readonly onChoose: (number: number) => void
}

export const RedlineList = ({ redlines, chosen, onChoose }: Props) => (
  <ul aria-label="Redlines" className="border-t-[3px] border-ink">
    {redlines.map((redline) => (
      <li key={redline.number} className="border-b border-hair">
        <button
          type="button"
          aria-current={redline.number === chosen ? 'true' : undefined}
          onClick={() => onChoose(redline.number)}
          className={`flex w-full gap-2.5 px-2 py-2 text-left hover:bg-steel-wash ${redline.number === chosen ? 'bg-steel-wash' : ''}`}
        >
          <Flag number={redline.number} state={redline.state} />
          <span className="min-w-0 flex-1">
            <span className="flex flex-wrap justify-between gap-x-2 text-cell">
              <span className="font-semibold">{anchorWords(redline.anchor)}</span>
              <span className="text-pencil">
                {redline.anchorState === 'pinned' ? '' : anchorStateWords[redline.anchorState].word}
              </span>
            </span>
            <span className="block truncate">{redline.messages[0]?.text ?? ''}</span>
            <span className="block text-cell text-pencil">
              {redline.author.name}
              {redline.state === 'open' && redline.waitingOn
                ? ` · waiting on ${redline.waitingOnYou ? 'you' : `the ${redline.waitingOn}`}`
                : ''}
              {redline.mustAnswer ? ' · must answer' : ''}
              {redline.officeOnly ? ' · office only' : ''}
            </span>
          </span>
        </button>
      </li>
    ))}
  </ul>
)
