import { useQuery } from '@tanstack/react-query'
import { CATALOGUE_LIMIT, type OfficeCatalogue } from '@coldfill/contract'
import type { UnitSystem } from '@coldfill/units'
import { useRef, useState } from 'react'
import { Loaded } from '#components/loaded.tsx'
import { Band } from '#components/ui/band.tsx'
import { Button, buttonClass } from '#components/ui/button.tsx'
import { Choice } from '#components/ui/choice.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { Cell, HeadCell, RowHead, RuledTable } from '#components/ui/ruled-table.tsx'
import { ApiError, messageOf } from '#lib/api-error.ts'
import { clock, plural } from '#lib/format.ts'
import { useAction } from '#lib/use-action.ts'
import { catalogueQuery, exampleCatalogueAddress, removeCatalogue, uploadCatalogue } from '../api/catalogue.ts'
import { CatalogueTable } from './catalogue-table.tsx'

interface Problem {
  readonly line?: number | undefined
  readonly column?: string | undefined
  readonly message: string
}

/** Problems of a file by line. */
const Problems = ({ problems }: { readonly problems: readonly Problem[] }) => (
  <div className="max-h-72 overflow-y-auto">
    <RuledTable
      caption="Problems by line"
      head={
        <tr>
          <HeadCell figures className="w-14">
            Line
          </HeadCell>
          <HeadCell className="w-40">Column</HeadCell>
          <HeadCell>What is wrong</HeadCell>
        </tr>
      }
    >
      {problems.map(({ line, column, message }) => (
        <tr key={`${line} ${column} ${message}`}>
          <Cell figures className="font-mono">
            {line ?? ''}
          </Cell>
          <Cell>{column || '—'}</Cell>
          <Cell>{message}</Cell>
        </tr>
      ))}
    </RuledTable>
  </div>
)

const Refused = ({ error }: { readonly error: unknown }) => {
  if (error === null) return null
  const problem = error instanceof ApiError ? error.problem : null
  const lines = (problem?.errors ?? []).filter(({ line }) => line !== undefined)
  return (
    <div className="flex flex-col gap-2">
      <Band tone="error" live="alert" title={problem?.title ?? 'The file was not taken.'}>
        {messageOf(error)}
      </Band>
      {lines.length > 0 ? <Problems problems={lines} /> : null}
    </div>
  )
}

const Columns = ({ columns }: { readonly columns: OfficeCatalogue['columns'] }) => (
  <details>
    <summary className="cursor-pointer font-semibold text-steel">Columns of a catalogue file</summary>
    <p className="mt-2 max-w-[80ch] text-read">
      The first line names the columns, in any order. A unit may stand in the heading, as in{' '}
      <code className="bg-well px-0.5 font-mono text-[0.92em]">volume (gal)</code>, or in each cell, as in{' '}
      <code className="bg-well px-0.5 font-mono text-[0.92em]">132 L</code>. Columns of other names are passed over.
    </p>
    <dl className="mt-2 border-t-2 border-ink">
      {columns.map(({ heading, doc, required }) => (
        <div
          key={heading}
          className="gap-x-4 border-b border-hair py-1.5 text-cell desk:grid desk:grid-cols-[12rem_minmax(0,1fr)]"
        >
          <dt className="font-mono">{heading}</dt>
          <dd>
            {doc} {required ? null : <span className="text-pencil">May be left out.</span>}
          </dd>
        </div>
      ))}
    </dl>
  </details>
)

const Earlier = ({ earlier }: { readonly earlier: OfficeCatalogue['earlier'] }) => (
  <details>
    <summary className="cursor-pointer font-semibold text-steel">
      {plural(earlier.length, 'earlier catalogue')}, kept for the revisions that used them
    </summary>
    <div className="mt-2">
      <RuledTable
        caption="Earlier catalogues, newest first"
        className="min-w-140"
        head={
          <tr>
            <HeadCell>File</HeadCell>
            <HeadCell figures>Rows</HeadCell>
            <HeadCell>Uploaded</HeadCell>
            <HeadCell>By</HeadCell>
            <HeadCell>In force until</HeadCell>
            <HeadCell>Content</HeadCell>
          </tr>
        }
      >
        {earlier.map((one) => (
          <tr key={`${one.hash} ${one.uploadedAt}`}>
            <RowHead className="font-normal break-all">{one.fileName}</RowHead>
            <Cell figures>{one.rowCount}</Cell>
            <Cell className="figures whitespace-nowrap">{clock(one.uploadedAt)}</Cell>
            <Cell>{one.uploadedBy}</Cell>
            <Cell className="figures whitespace-nowrap">{clock(one.endedAt)}</Cell>
            <Cell className="font-mono">{one.hash.slice(0, 12)}</Cell>
          </tr>
        ))}
      </RuledTable>
    </div>
  </details>
)

const Current = ({ catalogue }: { readonly catalogue: NonNullable<OfficeCatalogue['catalogue']> }) => {
  const [units, setUnits] = useState<UnitSystem>('US')
  return (
    <section className="flex flex-col gap-3">
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
        <div>
          <h2 className="text-lead font-semibold">
            {plural(catalogue.rows.length, 'vessel')} <span className="font-normal">from {catalogue.fileName}</span>
          </h2>
          <p className="text-cell text-pencil">
            Uploaded {clock(catalogue.uploadedAt)} by {catalogue.uploadedBy}, content{' '}
            <span className="font-mono" title={catalogue.hash}>
              {catalogue.hash.slice(0, 12)}
            </span>
          </p>
        </div>
        <Choice
          label="Units"
          value={units}
          choices={[
            { value: 'US', label: 'US' },
            { value: 'SI', label: 'SI' },
          ]}
          onChoose={setUnits}
        />
      </div>
      {catalogue.problems.length > 0 ? (
        <>
          <Band tone="warning" title={`${plural(catalogue.problems.length, 'problem')} in the file.`}>
            Lines with a mistake were left out. Correct the file and upload it again.
          </Band>
          <Problems problems={catalogue.problems} />
        </>
      ) : null}
      <CatalogueTable rows={catalogue.rows} units={units} />
    </section>
  )
}

/** The vessels that the office chooses from: what is in force, and a new file in its place. */
export const Catalogue = () => {
  const query = useQuery(catalogueQuery)
  const { busy, error, run } = useAction()
  const picker = useRef<HTMLInputElement>(null)
  const [asking, setAsking] = useState(false)
  const upload = (file: File) =>
    run(async () => {
      if (file.size > CATALOGUE_LIMIT)
        throw new ApiError(413, 'catalogue_too_large', `${file.name} is larger than ${CATALOGUE_LIMIT / 1e6} MB.`)
      await uploadCatalogue(file)
    })
  return (
    <Loaded query={query} what="Loading the catalogue">
      {({ catalogue, earlier, columns }) => (
        <div className="flex flex-col gap-6">
          <div className="flex flex-col gap-3">
            {catalogue ? (
              <p className="max-w-[80ch] text-read">
                Every vessel is chosen from this table: the smallest that fits, or the least number of equal ones.
                Issued revisions keep the catalogue they were sized with.
              </p>
            ) : (
              <div className="border-t-[3px] border-ink pt-3">
                <SectionHeading>No catalogue yet</SectionHeading>
                <p className="max-w-[80ch] text-read">
                  Schedules show required values only. Upload a table of the vessels that your office specifies, as CSV
                  or as a workbook (its first sheet), and each vessel is chosen from it. The example shows the columns;
                  its makers are invented.
                </p>
              </div>
            )}
            <div className="flex flex-wrap items-center gap-2">
              <input
                ref={picker}
                type="file"
                accept=".csv,.xlsx,text/csv,application/vnd.openxmlformats-officedocument.spreadsheetml.sheet"
                aria-label="Catalogue file, CSV or XLSX"
                className="sr-only"
                tabIndex={-1}
                onChange={(event) => {
                  const file = event.target.files?.[0]
                  event.target.value = ''
                  if (file) void upload(file)
                }}
              />
              <Button look="main" busy={busy} onClick={() => picker.current?.click()}>
                {busy ? 'Reading…' : catalogue ? 'Replace by a file' : 'Upload CSV or XLSX'}
              </Button>
              <a className={buttonClass('plain')} href={exampleCatalogueAddress} download="vessels.csv">
                Download the example
              </a>
              {catalogue && !asking ? (
                <Button look="quiet" onClick={() => setAsking(true)}>
                  Take it away
                </Button>
              ) : null}
            </div>
            {asking && catalogue ? (
              <Band
                tone="warning"
                live="status"
                title="Take the catalogue away?"
                actions={
                  <>
                    <Button busy={busy} onClick={() => void run(removeCatalogue).then(() => setAsking(false))}>
                      Take it away
                    </Button>
                    <Button look="quiet" onClick={() => setAsking(false)}>
                      Keep it
                    </Button>
                  </>
                }
              >
                From then on no vessel is chosen. Issued revisions keep theirs.
              </Band>
            ) : null}
            <Refused error={error} />
          </div>
          {catalogue ? <Current catalogue={catalogue} /> : null}
          <Columns columns={columns} />
          {earlier.length > 0 ? <Earlier earlier={earlier} /> : null}
        </div>
      )}
    </Loaded>
  )
}
