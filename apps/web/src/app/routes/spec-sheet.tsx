import { revisionSegment, type Project, type Reference, type SpecDocument } from '@coldfill/contract'
import { acceptFix, pathRange, readSpec, type Range } from '@coldfill/spec'
import { useQuery, type UseQueryResult } from '@tanstack/react-query'
import { useCallback, useEffect, useEffectEvent, useMemo, useRef, useState } from 'react'
import { useNavigate } from 'react-router-dom'
import { Failure } from '#components/failure.tsx'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { resultsQuery } from '#features/results/api/results.ts'
import { UnitsSwitch } from '#features/results/components/units-switch.tsx'
import { CompareTexts } from '#features/spec/components/compare-texts.tsx'
import { Outline } from '#features/spec/components/outline.tsx'
import { SpecEditor, type SpecEditorHandle } from '#features/spec/components/spec-editor.tsx'
import { SpecBands } from '#features/spec/components/spec-bands.tsx'
import { Tray } from '#features/spec/components/tray.tsx'
import { computedValues } from '#features/spec/computed-values.ts'
import { marginEntries } from '#features/spec/margin-lines.ts'
import { mergeFindings } from '#features/spec/merge-findings.ts'
import { keptWords, sizedWords } from '#features/spec/status-words.ts'
import { useSettled } from '#features/spec/use-settled.ts'
import { useSizing } from '#features/spec/use-sizing.ts'
import { useSpecDraft } from '#features/spec/use-spec-draft.ts'
import { messageOf } from '#lib/api-error.ts'
import { clock } from '#lib/format.ts'
import { revisionPhrase } from '#lib/words.ts'
import { useAddress, useUnits } from '#lib/search-params.ts'

interface Props {
  readonly project: Project
  readonly user: string
  readonly document: SpecDocument
  readonly reference: UseQueryResult<Reference>
}

const NO_REASONS = {}
const lineRange = (line: number): Range => ({ start: { line, character: 0 }, end: { line, character: 0 } })

export const SpecSheet = ({ project, user, document, reference }: Props) => {
  const { number } = project
  const owner = useMemo(() => ({ user, project: number }), [user, number])
  const draft = useSpecDraft(document, owner)
  const { text, change, base, dirty } = draft
  const readOnly = document.readOnly !== null
  const { get } = useAddress()
  const navigate = useNavigate()
  const toTrace = useCallback((address: string) => void navigate(address), [navigate])
  const editor = useRef<SpecEditorHandle>(null)
  const [line, setLine] = useState<number | null>(null)
  const [compared, setCompared] = useState<{ readonly title: string; readonly text: string } | null>(null)

  // Sized as typed where this person may edit; else as the server has it.
  const typed = useSizing(number, text, !readOnly)
  const saved = useQuery({ ...resultsQuery(number, null), enabled: readOnly })
  const newest = project.revisions[0]
  const issued = useQuery({
    ...resultsQuery(number, newest ? revisionSegment(newest.label) : null),
    enabled: newest !== undefined && !readOnly,
  })
  const savedAnswer = useMemo(
    () => (saved.data ? { result: saved.data.result, text: document.text, at: document.savedAt } : null),
    [saved.data, document],
  )
  const latest = readOnly ? savedAnswer : typed.latest
  const good = readOnly ? savedAnswer : typed.good
  const stale = good === null || good.text !== text
  const { units, setUnits } = useUnits(good?.result.project.units)

  const settled = useSettled(text)
  const vocabulary = reference.data?.vocabulary
  const reading = useMemo(() => (vocabulary ? readSpec(settled, vocabulary) : null), [settled, vocabulary])
  const findings = useMemo(
    () => mergeFindings(reading?.findings ?? [], latest, settled, (path) => pathRange(settled, path)),
    [reading, latest, settled],
  )
  // While the text cannot be read the outline and the margin stay as they were.
  const [model, setModel] = useState(reading?.model ?? null)
  if (reading?.model && reading.model !== model) setModel(reading.model)
  const entries = useMemo(
    () =>
      marginEntries(model, good?.result ?? null, issued.data?.result ?? null, units, (system, mark) =>
        withQuery(paths.trace(number, mark), { system, units: units.toLowerCase() }),
      ),
    [model, good, issued.data, units, number],
  )

  const computed = useCallback((path: string) => computedValues(good?.result ?? null, path, units), [good, units])

  const onKey = useEffectEvent((event: KeyboardEvent) => {
    if (event.key.toLowerCase() !== 's' || !(event.ctrlKey || event.metaKey)) return
    event.preventDefault()
    if (!readOnly && dirty && !draft.saving) void draft.save()
  })
  useEffect(() => {
    const listen = (event: KeyboardEvent) => onKey(event)
    window.addEventListener('keydown', listen)
    return () => window.removeEventListener('keydown', listen)
  }, [])

  // An address may name a line or a path; it is gone to once.
  const gone = useRef(false)
  const wantedLine = Number(get('line'))
  const wantedPath = get('path')
  useEffect(() => {
    if (gone.current || !editor.current || !reading) return
    const range = wantedLine > 0 ? lineRange(wantedLine - 1) : wantedPath ? pathRange(settled, wantedPath) : null
    if (!range) return
    gone.current = true
    setTimeout(() => editor.current?.jumpTo(range), 60)
  })

  const status = sizedWords({
    text,
    goodText: good?.text ?? null,
    goodAt: good ? clock(good.at) : '',
    latestText: latest?.text ?? null,
    failure: typed.error === null ? null : messageOf(typed.error),
  })

  return (
    <Sheet
      title="Spec"
      fills
      actions={
        <>
          <span className="w-full text-cell text-pencil desk:w-auto" role="status">
            {keptWords({ ...draft, readOnly, savedAt: clock(base.savedAt), version: base.version })}
          </span>
          <UnitsSwitch units={units} onChoose={setUnits} />
          <Button
            why={dirty ? null : 'Nothing differs from the saved text.'}
            aria-pressed={compared !== null}
            onClick={() => setCompared(compared ? null : { title: `Saved version ${base.version}`, text: base.text })}
          >
            Compare
          </Button>
          <Button why={readOnly ? document.readOnly?.reason : null} onClick={() => editor.current?.format()}>
            Format
          </Button>
          <Button
            look="main"
            busy={draft.saving}
            why={readOnly ? document.readOnly?.reason : dirty ? null : 'Everything is saved.'}
            onClick={() => void draft.save()}
          >
            Save
          </Button>
        </>
      }
      bands={
        <>
          {document.readOnly ? <Band title="Read only.">{document.readOnly.reason}</Band> : null}
          <Failure error={draft.error} />
          <SpecBands draft={draft} onCompare={setCompared} />
        </>
      }
    >
      <div className="flex min-h-0 flex-1 border-t-2 border-ink">
        <div className="hidden w-52 shrink-0 zones:block">
          <Outline
            text={settled}
            findings={findings}
            entries={entries}
            stale={stale}
            onJump={(range) => editor.current?.jumpTo(range)}
          />
        </div>
        <div className="relative min-h-0 min-w-0 flex-1">
          <div className="absolute inset-0">
            <SpecEditor
              ref={editor}
              text={text}
              onChange={change}
              readOnly={readOnly}
              vocabulary={vocabulary}
              findings={findings}
              entries={entries}
              stale={stale}
              computed={computed}
              onLine={setLine}
              onTrace={toTrace}
            />
          </div>
        </div>
      </div>
      {compared ? (
        <CompareTexts left={compared} right={{ title: 'Text in the editor', text }} onClose={() => setCompared(null)} />
      ) : (
        <Tray
          text={settled}
          findings={findings}
          reasons={reference.data?.findingCodes ?? NO_REASONS}
          entries={entries}
          stale={stale}
          readOnly={readOnly}
          line={line}
          status={
            <>
              {status}
              {newest && issued.data ? ` · △ differs from ${revisionPhrase(newest.label)}` : ''}
              <span className="hidden bench:inline"> · Esc, then Tab leaves the editor</span>
            </>
          }
          onJump={(range) => editor.current?.jumpTo(range)}
          onFix={(fix) => editor.current?.fix(fix)}
          onAccept={(finding, reason) => {
            const fix = acceptFix(text, finding, reason.replaceAll(/\s+/g, ' ').trim())
            if (fix) editor.current?.fix(fix)
          }}
        />
      )}
    </Sheet>
  )
}
