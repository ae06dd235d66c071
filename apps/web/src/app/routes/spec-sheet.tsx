import type { Project, Redline, Reference, SpecDocument } from '@coldfill/contract'
import { acceptFix, pathRange, type Range } from '@coldfill/spec'
import { useQuery, type UseQueryResult } from '@tanstack/react-query'
import { useCallback, useEffect, useEffectEvent, useMemo, useRef, useState } from 'react'
import { useNavigate } from 'react-router-dom'
import { Failure } from '#components/failure.tsx'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Band } from '#components/ui/band.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { redlinesQuery } from '#features/redlines/api/redlines.ts'
import { RevisionSwitch } from '#features/results/components/revision-switch.tsx'
import { UnitsSwitch } from '#features/results/components/units-switch.tsx'
import { otherText, type CompareWith } from '#features/spec/compare-with.ts'
import { OutlineDrawer } from '#features/spec/components/outline-drawer.tsx'
import { SpecBands } from '#features/spec/components/spec-bands.tsx'
import { SpecEditor, type SpecEditorHandle } from '#features/spec/components/spec-editor.tsx'
import { Tray } from '#features/spec/components/tray.tsx'
import { computedValues } from '#features/spec/computed-values.ts'
import { marginEntries } from '#features/spec/margin-lines.ts'
import { keptWords, sizedWords } from '#features/spec/status-words.ts'
import { useFindings } from '#features/spec/use-findings.ts'
import { useSpecDraft } from '#features/spec/use-spec-draft.ts'
import { messageOf } from '#lib/api-error.ts'
import { clock } from '#lib/format.ts'
import type { Finding } from '#lib/sized-project.ts'
import { useAddress, useUnits } from '#lib/search-params.ts'
import { revisionPhrase } from '#lib/words.ts'
import { SpecActions } from './spec-actions.tsx'
import { SpecCompare } from './spec-compare.tsx'
import { useSpecResults } from './use-spec-results.ts'

interface Props {
  readonly project: Project
  readonly user: string
  readonly document: SpecDocument
  /** Which frozen revision this is; null for the working copy, or for what the server chooses. */
  readonly rev: string | null
  readonly reference: UseQueryResult<Reference>
}

const NO_REASONS = {}
const NONE: readonly Redline[] = []
const lineRange = (line: number): Range => ({ start: { line, character: 0 }, end: { line, character: 0 } })

export const SpecSheet = ({ project, user, document, rev, reference }: Props) => {
  const { number } = project
  const owner = useMemo(() => ({ user, project: number }), [user, number])
  const draft = useSpecDraft(document, owner)
  const { text, change, base, dirty } = draft
  const locked = document.readOnly?.reason ?? null
  const readOnly = locked !== null
  const { get } = useAddress()
  const navigate = useNavigate()
  const toTrace = useCallback((address: string) => void navigate(address), [navigate])
  const editor = useRef<SpecEditorHandle>(null)
  const jumpTo = useCallback((range: Range) => editor.current?.jumpTo(range), [])
  const fixIn = useCallback((fix: Finding['fixes'][number]) => editor.current?.fix(fix), [])
  const accept = useCallback((finding: Finding, reason: string) => {
    const text = editor.current?.text() ?? ''
    const fix = acceptFix(text, finding, reason.replaceAll(/\s+/g, ' ').trim())
    if (fix) editor.current?.fix(fix)
  }, [])
  const textOf = useCallback(() => editor.current?.text() ?? '', [])
  const [line, setLine] = useState<number | null>(null)
  const [outline, setOutline] = useState(false)
  const closeOutline = useCallback(() => setOutline(false), [])

  const [wanted, setCompared] = useState<CompareWith | null>(null)
  // What it stood beside may have gone: a draft that was thrown away, a conflict that is settled.
  const compared = wanted !== null && otherText(wanted, draft) !== null ? wanted : null

  const { latest, good, stale, error, issued, newest } = useSpecResults(project, document, rev, text)
  const redlines = useQuery({
    ...redlinesQuery(number, rev),
    enabled: project.revisions.length > 0 && project.sheets.includes('redlines'),
  })
  const { units, setUnits } = useUnits(good?.result.project.units)

  const vocabulary = reference.data?.vocabulary
  const showAtOnce = useCallback((found: readonly Finding[]) => editor.current?.show(found), [])
  const { settled, reading, findings } = useFindings(text, vocabulary, latest, showAtOnce)
  // While the text cannot be read the outline and the margin stay as they were.
  const [model, setModel] = useState(reading?.model ?? null)
  if (reading?.model && reading.model !== model) setModel(reading.model)
  const entries = useMemo(
    () =>
      marginEntries(model, good?.result ?? null, issued, units, (system, mark) =>
        withQuery(paths.trace(number, mark), { system, rev, units: units.toLowerCase() }),
      ),
    [model, good, issued, units, number, rev],
  )
  const computed = useCallback((path: string) => computedValues(good?.result ?? null, path, units), [good, units])
  const shown = useMemo(() => ({ findings, entries, stale, computed }), [findings, entries, stale, computed])

  const save = async () => {
    const outcome = await draft.save()
    if (outcome === 'conflict') setCompared({ with: 'theirs' })
  }
  const onKey = useEffectEvent((event: KeyboardEvent) => {
    if (event.key.toLowerCase() !== 's' || !(event.ctrlKey || event.metaKey)) return
    event.preventDefault()
    if (!readOnly && dirty && !draft.saving) void save()
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
    setTimeout(() => jumpTo(range), 60)
  })

  const status = sizedWords({
    text,
    goodText: good?.text ?? null,
    goodAt: good ? clock(good.at) : '',
    latestText: latest?.text ?? null,
    failure: error === null ? null : messageOf(error),
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
          {/* A phone needs the room for the texts. */}
          <span className={`flex flex-wrap gap-2 ${compared ? 'max-desk:hidden' : ''}`}>
            {project.revisions.length > 0 ? <RevisionSwitch project={project} /> : null}
            <UnitsSwitch units={units} onChoose={setUnits} />
          </span>
          <SpecActions
            locked={locked}
            dirty={dirty}
            saving={draft.saving}
            comparing={compared !== null}
            outline={outline}
            onOutline={() => setOutline(!outline)}
            onCompare={() => {
              // A text that may not be edited is compared with other contents, on a sheet of its own.
              if (readOnly) void navigate(withQuery(paths.compare(number), { b: rev, units: get('units') }))
              else setCompared(compared ? null : { with: (draft.conflict ?? draft.merged) ? 'theirs' : 'saved' })
            }}
            onFormat={() => editor.current?.format()}
            onSave={() => void save()}
          />
        </>
      }
      bands={
        <>
          {locked === null ? null : <Band title="Read only.">{locked}</Band>}
          <Failure error={draft.error} />
          {readOnly ? null : <SpecBands draft={draft} compared={compared} onCompare={setCompared} />}
        </>
      }
    >
      {compared ? (
        <SpecCompare
          project={project}
          draft={draft}
          compared={compared}
          onCompare={setCompared}
          readOnly={readOnly}
          findings={findings}
          good={good}
          units={units}
        />
      ) : null}
      {/* The editor stays while a comparison covers it, with its cursor, folds and history. */}
      <div className={`min-h-0 flex-1 flex-col border-t-2 border-ink desk:flex-row ${compared ? 'hidden' : 'flex'}`}>
        <OutlineDrawer
          open={outline}
          onClose={closeOutline}
          text={settled}
          findings={findings}
          entries={entries}
          stale={stale}
          redlines={redlines.data ?? NONE}
          onJump={jumpTo}
        />
        <div className="relative min-h-0 min-w-0 flex-1">
          <div className="absolute inset-0">
            <SpecEditor
              ref={editor}
              pushed={draft.pushed}
              onChange={change}
              readOnly={readOnly}
              vocabulary={vocabulary}
              shown={shown}
              onLine={setLine}
              onTrace={toTrace}
            />
          </div>
        </div>
      </div>
      {compared ? null : (
        <Tray
          textOf={textOf}
          findings={findings}
          reasons={reference.data?.findingCodes ?? NO_REASONS}
          entries={entries}
          stale={stale}
          readOnly={readOnly}
          line={line}
          status={
            <>
              {status}
              {newest && issued ? ` · △ differs from ${revisionPhrase(newest.label)}` : ''}
              <span className="hidden bench:inline"> · Esc, then Tab leaves the editor</span>
            </>
          }
          onJump={jumpTo}
          onFix={fixIn}
          onAccept={accept}
        />
      )}
    </Sheet>
  )
}
