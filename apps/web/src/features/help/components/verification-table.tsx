import type { Verification, VerificationFigure } from '@coldfill/contract'
import { SeverityMark } from '#components/ui/severity-mark.tsx'
import { Scrollable } from '#components/ui/scrollable.tsx'
import { capital } from '#lib/format.ts'
import { deviationWords, toleranceWords } from '../verification-filter.ts'

/** A check, a square or a ring, with its word: never told by colour alone. */
const Verdict = ({ verdict }: { readonly verdict: VerificationFigure['verdict'] }) => (
  <span className="inline-flex items-center gap-1.5 whitespace-nowrap">
    {verdict === 'holds' ? (
      <svg width="16" height="16" viewBox="0 0 16 16" aria-hidden="true" className="keeps-colour shrink-0">
        <path d="m2.5 8.5 3.5 4 7.5-9" className="fill-none stroke-verdigris" strokeWidth="2" />
      </svg>
    ) : (
      <SeverityMark severity={verdict === 'fails' ? 'error' : 'note'} label={false} />
    )}
    {capital(verdict)}
  </span>
)

const cell = 'border-b border-hair px-2 py-1.5 align-top'

const FigureRow = ({ figure }: { readonly figure: VerificationFigure }) => (
  <>
    <tr>
      <th
        scope="row"
        className={`${cell} pl-0 font-normal ${figure.reason ? 'border-b-0' : ''}`}
        id={`case-${figure.id}`}
      >
        {figure.title}
        {figure.title === figure.what ? null : <span className="text-pencil">: {figure.what}</span>}
        {figure.origin === 'published' ? null : <em className="text-pencil"> ({figure.origin})</em>}
      </th>
      <td className={`${cell} figures text-right font-mono ${figure.reason ? 'border-b-0' : ''}`}>
        {figure.expected || '—'}
      </td>
      <td className={`${cell} figures text-right font-mono ${figure.reason ? 'border-b-0' : ''}`}>
        {figure.computed || '—'}
      </td>
      <td className={`${cell} figures text-right whitespace-nowrap ${figure.reason ? 'border-b-0' : ''}`}>
        {deviationWords(figure.deviation)}
      </td>
      <td className={`${cell} ${figure.reason ? 'border-b-0' : ''}`}>
        {figure.deviation === null ? null : (
          <>
            <span className="figures whitespace-nowrap">{toleranceWords(figure.tolerance)}</span>{' '}
            <span className="text-pencil">{figure.because}</span>
          </>
        )}
      </td>
      <td className={`${cell} pr-0 ${figure.reason ? 'border-b-0' : ''}`}>
        <Verdict verdict={figure.verdict} />
      </td>
    </tr>
    {figure.reason ? (
      <tr>
        <td colSpan={6} className="border-b border-hair px-0 pb-2">
          <p className="max-w-[90ch] max-desk:sticky max-desk:left-0 max-desk:w-[calc(100vw-2rem)] border-l-[3px] border-l-steel bg-steel-wash px-3 py-1">
            <span className="font-semibold">Why the printed figure is wrong.</span> {figure.reason}
          </p>
        </td>
      </tr>
    ) : null}
  </>
)

/** The manual as one table, so that columns align from source to source. */
export const VerificationTable = ({ groups }: { readonly groups: Verification['groups'] }) => (
  <Scrollable label="Verification" className="print:overflow-visible">
    <table className="w-full min-w-220 table-fixed border-t-[3px] border-ink text-cell">
      <caption className="sr-only">Figures of publications, and what the program computes</caption>
      <colgroup>
        <col />
        <col className="w-28" />
        <col className="w-28" />
        <col className="w-22" />
        <col className="w-62" />
        <col className="w-29" />
      </colgroup>
      <thead>
        <tr>
          <th scope="col" className="border-b-2 border-ink px-2 py-1.5 pl-0">
            Case
          </th>
          <th scope="col" className="border-b-2 border-ink px-2 py-1.5 text-right">
            Expected
          </th>
          <th scope="col" className="border-b-2 border-ink px-2 py-1.5 text-right">
            Computed
          </th>
          <th scope="col" className="border-b-2 border-ink px-2 py-1.5 text-right">
            Deviation
          </th>
          <th scope="col" className="border-b-2 border-ink px-2 py-1.5">
            Tolerance
          </th>
          <th scope="col" className="border-b-2 border-ink px-2 py-1.5 pr-0">
            Verdict
          </th>
        </tr>
      </thead>
      {groups.map((group) => (
        <tbody key={`${group.part} ${group.source}`}>
          <tr>
            <th scope="rowgroup" colSpan={6} className="border-b border-ink pt-5 pb-1 text-body">
              <span className="block max-desk:sticky max-desk:left-0 max-desk:w-[calc(100vw-2rem)]">
                {group.source}
              </span>
            </th>
          </tr>
          {group.figures.map((figure) => (
            <FigureRow key={figure.id} figure={figure} />
          ))}
        </tbody>
      ))}
    </table>
  </Scrollable>
)
