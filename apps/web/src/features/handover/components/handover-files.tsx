import { revisionTitle, type Handover } from '@coldfill/contract'
import { formatQuantity, type UnitSystem } from '@coldfill/units'
import { FileRow } from '#components/file-row.tsx'
import { Band } from '#components/ui/band.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { Cell, HeadCell, RowHead, RuledTable } from '#components/ui/ruled-table.tsx'
import { ToneSign } from '#components/ui/state-word.tsx'
import { capital, day } from '#lib/format.ts'

type Current = NonNullable<Handover['current']>
type Setting = Current['settings'][number]['precharge']

const Settings = ({ settings, units }: { readonly settings: Current['settings']; readonly units: UnitSystem }) => {
  const shown = (setting: Setting) => (setting ? formatQuantity(setting, units) : '—')
  return (
    <RuledTable
      caption="Settings in the field"
      className="min-w-120"
      head={
        <tr>
          <HeadCell>Mark</HeadCell>
          <HeadCell>Serves</HeadCell>
          <HeadCell>Vessel</HeadCell>
          <HeadCell figures>Precharge</HeadCell>
          <HeadCell figures>Fill pressure</HeadCell>
          <HeadCell figures>Relief set</HeadCell>
        </tr>
      }
    >
      {settings.map((setting) => (
        <tr key={`${setting.system}/${setting.mark}`}>
          <RowHead className="font-mono">{setting.mark}</RowHead>
          <Cell>{setting.serves}</Cell>
          <Cell>{capital(setting.kind)}</Cell>
          <Cell figures>{shown(setting.precharge)}</Cell>
          <Cell figures>{shown(setting.fill)}</Cell>
          <Cell figures>{shown(setting.relief)}</Cell>
        </tr>
      ))}
    </RuledTable>
  )
}

const Cautions = () => (
  <section>
    <SectionHeading>Cautions</SectionHeading>
    <ul className="flex list-disc flex-col gap-1 border-t-2 border-ink pt-2 pl-5 text-read">
      <li>Isolate, depressurise and drain the vessel before its precharge is read or changed.</li>
      <li>
        Pressure vessels and hot water can injure and kill. The adopted codes, the authority having jurisdiction and the
        listing of the vessel govern.
      </li>
      <li>A relief valve is never an expansion control.</li>
      <li>Water stored at or above 60 °C (140 °F) against legionella needs tempering against scalding.</li>
    </ul>
  </section>
)

/** What the contractor builds from: the current files and the pressures to set, or the word why there are none. */
export const HandoverFiles = ({ handover, units }: { readonly handover: Handover; readonly units: UnitSystem }) => {
  const { current } = handover
  return (
    <div className="flex max-w-4xl flex-col gap-8">
      {handover.superseded ? (
        <Band tone="warning" title="The revision you asked for is superseded.">
          Do not build from it. {current ? `${revisionTitle(current.revision)} below takes its place.` : ''}
        </Band>
      ) : null}
      <div className="border-t-[3px] border-ink pt-3">
        <p className={`flex items-center gap-2 text-title font-title ${current ? 'text-verdigris' : 'text-ink'}`}>
          <ToneSign tone={current ? 'good' : 'plain'} />
          {handover.word}
        </p>
        {current ? (
          <p className="mt-1 text-read">
            {revisionTitle(current.revision)}, <span className="figures">{day(current.issuedAt)}</span>, by{' '}
            {current.issuedBy.name}, {handover.project.office}. This is the current revision.
          </p>
        ) : (
          <p className="mt-1 max-w-[70ch] text-read">
            Nothing may be built from this page until a revision is issued for construction. You get a mail when it is.
          </p>
        )}
      </div>
      {current ? (
        <>
          <section>
            <SectionHeading>Files</SectionHeading>
            <ul className="border-t-2 border-ink">
              {current.files.map((file) => (
                <FileRow key={file.name} file={file} />
              ))}
            </ul>
            {current.noPdf ? <p className="mt-2 text-cell text-pencil">There is no PDF. {current.noPdf}</p> : null}
          </section>
          <section>
            <SectionHeading note="Gauge pressures, at the vessel connection, cold">
              Settings in the field
            </SectionHeading>
            <Settings settings={current.settings} units={units} />
          </section>
          <Cautions />
        </>
      ) : null}
    </div>
  )
}
