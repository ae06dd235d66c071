import type { RevisionFile } from '@coldfill/contract'
import { buttonClass } from '#components/ui/button.tsx'
import { fileSize } from '#lib/format.ts'

const kinds = { schedule: 'Equipment schedule, workbook', submittal: 'Submittal, document' }

/** A file of a revision: what it is, size, fingerprint, and the way to get it. */
export const FileRow = ({ file }: { readonly file: RevisionFile }) => (
  <li className="flex flex-wrap items-start justify-between gap-x-6 gap-y-2 border-b border-hair py-2.5">
    <div className="min-w-0 flex-1 basis-72">
      <p className="font-semibold break-words">{file.name}</p>
      <p className="text-cell text-pencil">
        {kinds[file.kind]} · <span className="figures">{fileSize(file.size)}</span>
      </p>
      <p className="font-mono text-zone break-all text-pencil">
        <abbr title="fingerprint of the bytes" className="no-underline">
          SHA-256
        </abbr>{' '}
        {file.sha256}
      </p>
    </div>
    <a href={file.href} download={file.name} className={buttonClass('plain')}>
      Download {file.name}
    </a>
  </li>
)
